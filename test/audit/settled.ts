import type { Audit } from '../../src/audit/audit.ts'
import { makeAudit } from '../../src/audit/make-audit.ts'
import { settleSightline } from '../../src/audit/settle-sightline.ts'
import type { SightlineInputs } from '../../src/audit/sightline-inputs.ts'
import { findStar } from '../../src/audit/star-names.ts'
import type { Claim } from '../../src/claim/claim.ts'
import { readClaim } from '../../src/claim/read-claim.ts'
import { MAGNETIC_MODEL_SPAN } from '../../src/site/magnetic-declination.ts'
import { type Files, readerOf } from '../claim/read.ts'
import { NOW } from './audit-of.ts'

/** A claim file's text as a claim, with the files that stand beside it; throws with the problems where it has errors. */
export function claimOf(text: string, files: Files = {}): Claim {
  const help = { findStar, readBeside: readerOf(files), magneticDates: MAGNETIC_MODEL_SPAN }
  const { claim, problems } = readClaim(text, help)
  if (claim === null) throw new Error(problems.map(({ message }) => message).join('\n'))
  return claim
}

/** The lines of a claim with every gap filled. */
export function settledLines(text: string, files: Files = {}): SightlineInputs[] {
  const claim = claimOf(text, files)
  return claim.sightlines.map((sightline) => settleSightline(claim, sightline))
}

/** The only line of a claim. */
export function settledLine(text: string, files: Files = {}): SightlineInputs {
  const [line, ...others] = settledLines(text, files)
  if (line === undefined || others.length > 0) throw new Error('want a claim of one line')
  return line
}

/** The audit of a claim file with the files that stand beside it. */
export function auditWith(text: string, files: Files = {}, now = NOW): Audit {
  const context = { version: 'test', file: 'claim.yaml', sha256: '0'.repeat(64), now, readingWarnings: [] }
  return makeAudit(claimOf(text, files), context)
}

/** A profile of a skyline as a file, from its azimuths and altitudes, degrees, and one standard deviation. */
export function profileOf(nodes: readonly (readonly [number, number])[], sdDeg: number): string {
  const rows = nodes.map(([azimuth, altitude]) => `${azimuth.toFixed(6)},${altitude.toFixed(6)},${sdDeg}`)
  return ['azimuth,altitude,uncertainty', ...rows, ''].join('\n')
}
