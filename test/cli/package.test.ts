import { execFileSync } from 'node:child_process'
import { cpSync, readFileSync } from 'node:fs'
import { mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { claimSchema } from '../../src/index.ts'
import { filesIn } from './run.ts'

const root = fileURLToPath(new URL('../..', import.meta.url))
const manifest = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8'))

describe('the package', () => {
  let folder = ''
  const built = (name: string) => readFileSync(join(folder, 'dist', name), 'utf8')

  beforeAll(async () => {
    folder = await mkdtemp(join(tmpdir(), 'datestone-package-'))
    execFileSync(process.execPath, [join(root, '.build/bundle.mjs'), join(folder, 'dist')])
    for (const place of ['templates', 'samples'])
      cpSync(join(root, place), join(folder, place), { recursive: true })
    // The package's own type: without it Node would have to guess that the files are modules.
    cpSync(join(root, 'package.json'), join(folder, 'package.json'))
  }, 60_000)
  afterAll(() => rm(folder, { recursive: true, force: true }))

  test('runs where no other package is installed, and asks for types alone', async () => {
    const args = ['dist/bin.js', 'audit', 'samples/thornmere.yaml', '--as', 'pdf,md,json', '--out', 'out']
    execFileSync(process.execPath, args, { cwd: folder })
    expect(await filesIn(join(folder, 'out'))).toEqual([
      'thornmere.audit-horizon.svg',
      'thornmere.audit-plan.svg',
      'thornmere.audit-premise.svg',
      'thornmere.audit-track.svg',
      'thornmere.audit.json',
      'thornmere.audit.md',
      'thornmere.audit.pdf',
    ])
    expect(Object.keys(manifest.dependencies).filter((name) => !name.startsWith('@types/'))).toEqual([])
  })

  test('is built before it is packed', () => {
    expect(manifest.scripts.prepack).toMatch(/run .*build$/)
    expect(manifest.files).toContain('dist')
  })

  test('brings the claim schema as a file', () => {
    expect(manifest.exports['./claim.schema.json']).toBe('./dist/claim.schema.json')
    expect(JSON.parse(built('claim.schema.json'))).toEqual(claimSchema)
  })

  test('brings the licence of each package in it, and its holder', () => {
    const sections = built('LICENCES.txt').split(/\n(?=\S+ \d+\.\d+\.\d+\S* \(.+\)\n-+\n)/)
    expect(sections.length).toBeGreaterThan(20)
    for (const section of sections.slice(1)) {
      expect(section).toMatch(
        /Permission (?:is hereby granted|to use, copy)|Apache License|Redistribution and use/,
      )
      expect(section).toMatch(/copyright/i)
    }
    expect(sections.filter((section) => /^(dfa|fontkit) /.test(section)).join()).toMatch(
      /Copyright \(c\) Devon Govett[\s\S]*Copyright \(c\) Devon Govett/,
    )
  })
})
