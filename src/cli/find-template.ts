import { existsSync } from 'node:fs'
import { readFile } from 'node:fs/promises'
import { fileURLToPath } from 'node:url'
import { builtInTemplateNames } from '../report/built-in-templates.ts'
import type { TemplateSource } from './audit-file.ts'

/** The package's `templates/`, seen from the built program and from this source file. */
const FOLDERS = ['../templates/', '../../templates/']

/** A template by its name, which comes with the package, or by its path. Throws the system's error. */
export async function findTemplate(nameOrPath: string): Promise<TemplateSource> {
  const path = builtInTemplateNames.includes(nameOrPath) ? builtInPath(nameOrPath) : nameOrPath
  return { text: await readFile(path, 'utf8'), path }
}

function builtInPath(name: string): string {
  const places = FOLDERS.map((folder) => fileURLToPath(new URL(`${folder}${name}.md`, import.meta.url)))
  return places.find((path) => existsSync(path)) ?? places[0]!
}
