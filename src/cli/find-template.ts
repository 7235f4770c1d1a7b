import { existsSync } from 'node:fs'
import { readFile } from 'node:fs/promises'
import { fileURLToPath } from 'node:url'
import { nearMiss } from '../quantity/near-miss.ts'
import { builtInTemplateNames } from '../report/built-in-templates.ts'
import type { TemplateSource } from './audit-file.ts'
import { fileTrouble } from './file-trouble.ts'

/** The package's `templates/`, seen from the built program and from this source file. */
const FOLDERS = ['../templates/', '../../templates/']

/** A template by its name, which comes with the package, or by its path. Throws the system's error. */
export async function findTemplate(nameOrPath: string): Promise<TemplateSource> {
  const path = builtInTemplateNames.includes(nameOrPath) ? builtInPath(nameOrPath) : nameOrPath
  return { text: await readFile(path, 'utf8'), path }
}

/** One line for stderr about a template that could not be read, with the built-in one that may be meant. */
export function templateTrouble(error: unknown, nameOrPath: string): string {
  const trouble = fileTrouble(error, 'read', nameOrPath)
  const near =
    (error as NodeJS.ErrnoException).code === 'ENOENT' ? nearMiss(nameOrPath, builtInTemplateNames) : null
  return near === null
    ? trouble
    : trouble.replace(/\n$/, `; did you mean the built-in template \`${near}\`?\n`)
}

function builtInPath(name: string): string {
  const places = FOLDERS.map((folder) => fileURLToPath(new URL(`${folder}${name}.md`, import.meta.url)))
  return places.find((path) => existsSync(path)) ?? places[0]!
}
