import { execFileSync, spawnSync } from 'node:child_process'
import { mkdtempSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { describe } from 'vitest'

/** Debian's packages poppler-utils and qpdf read the PDF as a stranger would. */
type Tool = 'qpdf' | 'pdftotext' | 'pdffonts' | 'pdfinfo'

function isInstalled(tool: Tool): boolean {
  return spawnSync(tool, ['--version']).error === undefined
}

/** Tests that need these tools: left out with the reason where one is missing, but never on a build server. */
export function describeWith(tools: readonly Tool[], name: string, body: () => void): void {
  const missing = tools.filter((tool) => !isInstalled(tool))
  const mayBeLeftOut = missing.length > 0 && !process.env.CI
  const reason = mayBeLeftOut ? ` (left out: ${missing.join(', ')} not installed)` : ''
  describe.skipIf(mayBeLeftOut)(`${name}${reason}`, body)
}

export function fileOf(bytes: Uint8Array): string {
  const path = join(mkdtempSync(join(tmpdir(), 'datestone-')), 'report.pdf')
  writeFileSync(path, bytes)
  return path
}

export function run(tool: Tool, ...args: string[]): string {
  return execFileSync(tool, args, { encoding: 'utf8', maxBuffer: 1e8 })
}

/** The text of each page, laid out as on paper. */
export function pageTexts(path: string): string[] {
  return run('pdftotext', '-layout', path, '-').split('\f').slice(0, -1)
}

/** The text as the structure has it, which is what a screen reader reads: no running heads, cell by cell. */
export function structureText(path: string): string {
  const lines = run('pdfinfo', '-struct-text', path).split('\n')
  return lines.map((line) => /^\s*"(.*)"$/.exec(line)?.[1] ?? '').join('')
}

export type PdfObject = Record<string, unknown>

/** All objects of a file by their reference, such as `12 0 R`; strings carry qpdf's prefix `u:`. */
export function objectsOf(path: string): Map<string, PdfObject> {
  const json = JSON.parse(run('qpdf', '--json=2', '--json-key=qpdf', path))
  const entries = Object.entries(json.qpdf[1] as Record<string, { value?: unknown }>)
  return new Map(
    entries.flatMap(([key, object]) => {
      const isDictionary = typeof object.value === 'object' && object.value !== null
      return isDictionary ? [[key.replace('obj:', ''), object.value as PdfObject]] : []
    }),
  )
}
