import { readdirSync, readFileSync } from 'node:fs'
import { join, posix, relative } from 'node:path'
import { fileURLToPath } from 'node:url'
import { describe, expect, test } from 'vitest'

const SRC = fileURLToPath(new URL('../src', import.meta.url))

/** Which rooms each room may import from, besides its own files. */
const MAY_IMPORT: Readonly<Record<string, readonly string[]>> = {
  quantity: [],
  claim: ['quantity'],
  sky: ['quantity'],
  site: ['quantity'],
  inference: ['quantity', 'sky', 'site'],
  audit: ['quantity', 'claim', 'sky', 'site', 'inference'],
  report: ['quantity', 'audit'],
  cli: ['quantity', 'claim', 'audit', 'report', 'version.ts'],
}

/** What a page in a browser needs: no Node API in these. */
const FOR_BROWSERS = ['quantity', 'sky', 'site', 'inference', 'audit', 'report/figures']

interface Import {
  file: string
  from: string
  typesOnly: boolean
}

const FILES = readdirSync(SRC, { recursive: true, encoding: 'utf8' })
  .filter((path) => path.endsWith('.ts'))
  .map((path) => relative('.', path).replaceAll('\\', '/'))

const IMPORTS: readonly Import[] = FILES.flatMap((file) => {
  const text = readFileSync(join(SRC, file), 'utf8')
  const statements = text.matchAll(
    /(?:import|export)\s+(type\s+)?[^'"`;]*?from\s+'([^']+)'|import\(\s*'([^']+)'\s*\)/g,
  )
  return Array.from(statements, ([, types, stated, lazy]) => ({
    file,
    from: (stated ?? lazy)!,
    typesOnly: types !== undefined,
  }))
})

/** `quantity` for `quantity/read-angle.ts`; the file itself at the top. */
function roomOf(path: string): string {
  return path.split('/')[0]!
}

function targetOf({ file, from }: Import): string {
  return posix.normalize(posix.join(posix.dirname(file), from))
}

describe('the import rule', () => {
  test('finds imports at all', () => {
    expect(IMPORTS.length).toBeGreaterThan(300)
  })

  test.each(Object.entries(MAY_IMPORT))('%s', (room, allowed) => {
    const strays = IMPORTS.filter(({ file, from }) => roomOf(file) === room && from.startsWith('.'))
      .map((held) => `${held.file} -> ${targetOf(held)}`)
      .filter((arrow) => {
        const target = roomOf(arrow.split(' -> ')[1]!)
        return target !== room && !allowed.includes(target)
      })
    expect(strays).toEqual([])
  })

  test('report takes only types from the audit', () => {
    const values = IMPORTS.filter(
      (held) => roomOf(held.file) === 'report' && roomOf(targetOf(held)) === 'audit' && !held.typesOnly,
    )
    expect(values.map(({ file, from }) => `${file} -> ${from}`)).toEqual([])
  })

  test('every folder is a room of the rule', () => {
    const folders = new Set(FILES.filter((file) => file.includes('/')).map(roomOf))
    expect([...folders].sort()).toEqual(Object.keys(MAY_IMPORT).sort())
  })

  test('nothing that a page in a browser needs uses Node', () => {
    const strays = IMPORTS.filter(
      ({ file, from }) =>
        FOR_BROWSERS.some((room) => file.startsWith(`${room}/`)) && from.startsWith('node:'),
    )
    expect(strays.map(({ file, from }) => `${file} -> ${from}`)).toEqual([])
    for (const file of FILES.filter((path) => FOR_BROWSERS.some((room) => path.startsWith(`${room}/`)))) {
      expect(readFileSync(join(SRC, file), 'utf8'), file).not.toMatch(
        /\b(process|Buffer|__dirname|require)\b[.(]/,
      )
    }
  })
})
