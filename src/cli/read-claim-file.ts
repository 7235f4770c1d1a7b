import { createHash } from 'node:crypto'
import { readFileSync, type Stats, statSync } from 'node:fs'
import { readFile } from 'node:fs/promises'
import { dirname, join } from 'node:path'
import { MAGNETIC_DATES } from '../audit/magnetic-dates.ts'
import { findStar } from '../audit/star-names.ts'
import type { Claim } from '../claim/claim.ts'
import { formatProblem, positionOf } from '../claim/format-problem.ts'
import { LONGEST_TABLE } from '../claim/longest-table.ts'
import { readClaim } from '../claim/read-claim.ts'
import type { BesideReader } from '../claim/reading-help.ts'
import type { Problem } from '../quantity/problem.ts'
import { type Console, EXIT } from './console.ts'
import { fileTrouble, meaningOf, troubleLine } from './file-trouble.ts'

/** No longer text is read: a character has up to three bytes of UTF-8, or four and counts as two; a byte order mark has three. */
const MOST_BYTES = 3 * (LONGEST_TABLE + 1)

/** A claim file has a hundred thousand characters at most, which is told at its place where it is not much longer. */
const MOST_CLAIM_BYTES = 20_000_000

export interface ClaimFile {
  claim: Claim
  sha256: string
  warnings: readonly string[]
}

/** Reads a claim file and tells its problems; an exit status where it cannot be used. */
export async function readClaimFile(path: string, console: Console): Promise<ClaimFile | { status: number }> {
  let bytes: Buffer
  try {
    const trouble = troubleOf(statSync(path), MOST_CLAIM_BYTES, 'too long for a claim file')
    if (trouble !== null) {
      console.stderr.write(troubleLine('read', path, trouble))
      return { status: EXIT.fileTrouble }
    }
    bytes = await readFile(path)
  } catch (error) {
    console.stderr.write(fileTrouble(error, 'read', path))
    return { status: EXIT.fileTrouble }
  }
  const text = textOf(bytes)
  const help = { findStar, readBeside: readerBeside(path), magneticDates: MAGNETIC_DATES }
  const { claim, problems } = readClaim(text, help)
  for (const problem of problems) console.stderr.write(`${formatProblem(problem, text, path, console)}\n`)
  if (claim === null) return { status: EXIT.claimHasErrors }
  return {
    claim,
    sha256: sha256Of(bytes),
    warnings: problems.filter(({ severity }) => severity === 'warning').map(warningOf),
  }
}

/** Reads files in the folder of a claim file, for the reader of claims. */
function readerBeside(claimPath: string): BesideReader {
  return (path) => {
    const place = join(dirname(claimPath), path)
    try {
      const tooLong = `and a table has at most ${LONGEST_TABLE} characters`
      const trouble = troubleOf(statSync(place), MOST_BYTES, tooLong)
      if (trouble !== null) return { trouble }
      const bytes = readFileSync(place)
      return { text: textOf(bytes), sha256: sha256Of(bytes) }
    } catch (error) {
      return { trouble: meaningOf(error) }
    }
  }
}

/** Why a file is not read at all, or null: a pipe or a device might be read without end; of a folder the system says so. */
function troubleOf(found: Stats, mostBytes: number, tooLong: string): string | null {
  if (!found.isFile()) return found.isDirectory() ? null : 'it is not a plain file'
  return found.size > mostBytes ? `it is ${found.size} bytes long, ${tooLong}` : null
}

function textOf(bytes: Buffer): string {
  return new TextDecoder('utf-8', { ignoreBOM: false }).decode(bytes)
}

function sha256Of(bytes: Buffer): string {
  return createHash('sha256').update(bytes).digest('hex')
}

function warningOf({ path, message, beside, offset }: Problem): string {
  const place = beside === undefined ? path : `${beside.path}, line ${positionOf(beside.text, offset).line}`
  return place === null ? message : `${place}: ${message}`
}
