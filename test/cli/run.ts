import { mkdtemp, readdir, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { onTestFinished } from 'vitest'
import { runCli } from '../../src/cli.ts'

export const NOW = new Date('2026-12-01T12:00:00Z')

/** Runs the program with these words and returns what it said. */
export async function run(...argv: string[]): Promise<{ status: number; stdout: string; stderr: string }> {
  const said = { stdout: '', stderr: '' }
  const sink = (name: keyof typeof said) => ({
    write: (text: string) => {
      said[name] += text
    },
  })
  const status = await runCli(argv, {
    stdout: sink('stdout'),
    stderr: sink('stderr'),
    color: false,
    now: NOW,
  })
  return { status, ...said }
}

/** A new empty folder that goes away after the test. */
export async function newFolder(): Promise<string> {
  const folder = await mkdtemp(join(tmpdir(), 'datestone-'))
  onTestFinished(() => rm(folder, { recursive: true, force: true }))
  return folder
}

export async function filesIn(folder: string): Promise<string[]> {
  return (await readdir(folder)).sort()
}
