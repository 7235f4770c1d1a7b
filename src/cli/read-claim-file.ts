import { createHash } from 'node:crypto'
import { readFile } from 'node:fs/promises'
import { findStar } from '../audit/star-names.ts'
import type { Claim } from '../claim/claim.ts'
import { formatProblem } from '../claim/format-problem.ts'
import { readClaim } from '../claim/read-claim.ts'
import type { Problem } from '../quantity/problem.ts'
import { type Console, EXIT } from './console.ts'
import { fileTrouble } from './file-trouble.ts'

export interface ClaimFile {
  claim: Claim
  sha256: string
  warnings: readonly string[]
}

/** Reads a claim file and tells its problems; an exit status where it cannot be used. */
export async function readClaimFile(path: string, console: Console): Promise<ClaimFile | { status: number }> {
  let bytes: Buffer
  try {
    bytes = await readFile(path)
  } catch (error) {
    console.stderr.write(fileTrouble(error, 'read', path))
    return { status: EXIT.fileTrouble }
  }
  const text = new TextDecoder('utf-8', { ignoreBOM: false }).decode(bytes)
  const { claim, problems } = readClaim(text, { findStar })
  for (const problem of problems) console.stderr.write(`${formatProblem(problem, text, path, console)}\n`)
  if (claim === null) return { status: EXIT.claimHasErrors }
  return {
    claim,
    sha256: createHash('sha256').update(bytes).digest('hex'),
    warnings: problems.filter(({ severity }) => severity === 'warning').map(warningOf),
  }
}

function warningOf({ path, message }: Problem): string {
  return path === null ? message : `${path}: ${message}`
}
