import { execFile } from 'node:child_process'
import { existsSync } from 'node:fs'
import { mkdtemp, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { delimiter, join } from 'node:path'
import { promisify } from 'node:util'

/** Chromium's path; null where it is not installed. */
export const CHROMIUM: string | null =
  (process.env.PATH ?? '')
    .split(delimiter)
    .map((folder) => join(folder, 'chromium'))
    .find((path) => existsSync(path)) ?? null

const QUIET = [
  '--headless',
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--disable-dev-shm-usage',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
]

/** The page as it stands once its scripts have run; no network is asked for anything. */
export async function pageAfterScripts(html: string): Promise<string> {
  if (CHROMIUM === null) throw new Error('there is no chromium on PATH')
  const folder = await mkdtemp(join(tmpdir(), 'datestone-page-'))
  try {
    const page = join(folder, 'page.html')
    await writeFile(page, html)
    const own = [`--user-data-dir=${join(folder, 'profile')}`, '--virtual-time-budget=10000', '--dump-dom']
    const { stdout } = await promisify(execFile)(CHROMIUM, [...QUIET, ...own, `file://${page}`], {
      maxBuffer: 64 * 1024 * 1024,
      timeout: 60_000,
    })
    return stdout
  } finally {
    await rm(folder, { recursive: true, force: true, maxRetries: 5 })
  }
}
