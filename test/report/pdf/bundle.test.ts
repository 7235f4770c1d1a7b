import { execFileSync } from 'node:child_process'
import { mkdtempSync, readdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { beforeAll, expect, test } from 'vitest'
import { FONT_FACES } from '../../../src/report/fonts/font-faces.ts'
import { writePdf } from '../../../src/report/pdf/write-pdf.ts'
import { sampleTree } from './sample-tree.ts'

const root = fileURLToPath(new URL('../../..', import.meta.url))
let dist: string

/** A program with nothing but the PDF in it, built, then moved away from the packages it was built from. */
beforeAll(() => {
  const folder = mkdtempSync(join(tmpdir(), 'datestone-bundle-'))
  const entry = join(folder, 'stub.ts')
  writeFileSync(
    entry,
    `import { writeFileSync } from 'node:fs'
    declare const DATESTONE_VERSION: string
    console.log(DATESTONE_VERSION)
    const { writePdf } = await import(${JSON.stringify(join(root, 'src/report/pdf/write-pdf.ts'))})
    const { sampleTree } = await import(${JSON.stringify(join(root, 'test/report/pdf/sample-tree.ts'))})
    const createdOn = new Date('2026-06-21T12:00:00Z')
    writeFileSync(process.argv[2]!, await writePdf(sampleTree(), { createdOn, warn: console.log }))`,
  )
  execFileSync(process.execPath, [join(root, '.build/bundle.mjs'), join(folder, 'built'), entry])
  const away = mkdtempSync(join(tmpdir(), 'datestone-away-'))
  writeFileSync(join(away, 'package.json'), '{ "type": "module" }')
  dist = join(away, 'dist')
  renameSync(join(folder, 'built'), dist)
})

test('the built program writes the same file as the source, with no package at hand', async () => {
  const out = join(dist, 'report.pdf')
  const printed = execFileSync(process.execPath, [join(dist, 'stub.js'), out], { encoding: 'utf8' })
  const { version } = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8'))
  expect(printed).toBe(`${version}\n`)
  const createdOn = new Date('2026-06-21T12:00:00Z')
  const fromSource = await writePdf(sampleTree(), { createdOn, warn: () => {} })
  expect(Buffer.compare(readFileSync(out), fromSource)).toBe(0)
})

test('the fonts that are used are beside it with their licences, and no others', () => {
  const files = readdirSync(join(dist, 'fonts'))
  const faces = Object.values(FONT_FACES).map(({ file }) => file)
  expect(files.filter((file) => file.endsWith('.ttf')).sort()).toEqual(faces.sort())
  const licences = files.filter((file) => !file.endsWith('.ttf'))
  expect(licences).toHaveLength(new Set(Object.values(FONT_FACES).map((face) => face.package)).size)
  const texts = licences.map((file) => readFileSync(join(dist, 'fonts', file), 'utf8'))
  expect(texts.filter((text) => text.includes('SIL OPEN FONT LICENSE'))).toHaveLength(3)
  expect(texts.filter((text) => text.includes('Bitstream Vera'))).toHaveLength(1)
})

test('the packages in it are named with their licences', () => {
  const licences = readFileSync(join(dist, 'LICENCES.txt'), 'utf8')
  expect(licences).toMatch(/^pdfkit 0\.20\.2 \(MIT\)$/m)
  expect(licences).toContain('Copyright (c) 2014 Devon Govett')
})

const hasPdfkit = (file: string) => readFileSync(join(dist, file), 'utf8').includes('switchToPage(')

test('pdfkit is not read before a PDF is written', () => {
  const staticImports = (file: string): string[] => {
    const code = readFileSync(join(dist, file), 'utf8')
    const imported = [...code.matchAll(/^(?:import|\} from|import .* from)\s*"\.\/([^"]+)"/gm)].map(
      (match) => match[1]!,
    )
    return [file, ...imported.flatMap(staticImports)]
  }
  const writer = readdirSync(dist).find((file) => file.startsWith('write-pdf-'))!
  for (const file of [...staticImports('stub.js'), ...staticImports(writer)]) {
    expect([file, hasPdfkit(file)]).toEqual([file, false])
  }
  expect(hasPdfkit(readdirSync(dist).find((file) => file.startsWith('pdfkit'))!)).toBe(true)
})
