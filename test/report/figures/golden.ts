import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs'

/**
 * Holds a text against the file `golden/<name>`. Where they differ, the text is written beside it with
 * `-changed` in its name, to be looked at; `UPDATE_GOLDEN=1` in the environment takes it over as the new golden.
 */
export function differsFromGolden(name: string, actual: string): string | null {
  const path = new URL(`golden/${name}`, import.meta.url).pathname
  const changed = path.replace(/(\.\w+)$/, '-changed$1')
  if (process.env.UPDATE_GOLDEN === '1') writeFileSync(path, actual)
  if (existsSync(path) && readFileSync(path, 'utf8') === actual) {
    rmSync(changed, { force: true })
    return null
  }
  writeFileSync(changed, actual)
  return `${name} differs from its golden file: look at ${name.replace(/(\.\w+)$/, '-changed$1')}`
}
