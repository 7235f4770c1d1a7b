import { existsSync } from 'node:fs'
import { createRequire } from 'node:module'
import { fileURLToPath } from 'node:url'
import { type Face, FONT_FACES, type FontSource } from './font-faces.ts'

export type FontFiles = Readonly<Record<Face, string>>

/**
 * Where the font files are: in `fonts/` beside the built program, or, run from source, in the packages they
 * come from. Throws where a file is in neither place: the installation is broken.
 */
export function fontFiles(): FontFiles {
  const faces = Object.entries(FONT_FACES) as [Face, FontSource][]
  return Object.fromEntries(faces.map(([face, source]) => [face, locate(source)])) as Record<Face, string>
}

function locate(source: FontSource): string {
  const besideProgram = fileURLToPath(new URL(`./fonts/${source.file}`, import.meta.url))
  if (existsSync(besideProgram)) return besideProgram
  try {
    const { resolve } = createRequire(import.meta.url)
    return resolve(`${source.package}/${source.folder}/${source.file}`)
  } catch {
    throw new Error(`The font file ${source.file} is missing from ${besideProgram}; install datestone again.`)
  }
}
