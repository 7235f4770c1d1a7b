import { mkdir, rename, rm, writeFile } from 'node:fs/promises'
import { basename, dirname, join } from 'node:path'

export interface OutputFile {
  path: string
  data: string | Uint8Array
}

/**
 * Writes files whole or not at all: each under a temporary name beside its place first, then all renamed into place.
 * What goes wrong before the renaming leaves nothing behind. Throws the system's error.
 */
export async function writeFiles(files: readonly OutputFile[]): Promise<void> {
  const staged = files.map((file, i) => ({ ...file, temporary: temporaryName(file.path, i) }))
  try {
    for (const { path, temporary, data } of staged) {
      await mkdir(dirname(path), { recursive: true })
      await writeFile(temporary, data, { flag: 'wx' })
    }
    for (const { path, temporary } of staged) await rename(temporary, path)
  } catch (error) {
    await Promise.all(staged.map(({ temporary }) => rm(temporary, { force: true })))
    throw error
  }
}

function temporaryName(path: string, index: number): string {
  return join(dirname(path), `.${basename(path)}.${process.pid}-${index}.part`)
}
