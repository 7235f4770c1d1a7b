import { readFileSync } from 'node:fs'
import type { Audit } from '../../src/audit/audit.ts'
import { makeAudit } from '../../src/audit/make-audit.ts'
import { findStar } from '../../src/audit/star-names.ts'
import { readClaim } from '../../src/claim/read-claim.ts'

export const NOW = new Date('2026-12-01T12:00:00Z')

/** The audit of a claim file's text; throws with the problems where the text has errors. */
export function auditOf(text: string, now = NOW): Audit {
  const { claim, problems } = readClaim(text, { findStar })
  if (claim === null) throw new Error(problems.map(({ message }) => message).join('\n'))
  return makeAudit(claim, {
    version: 'test',
    file: 'claim.yaml',
    sha256: '0'.repeat(64),
    now,
    readingWarnings: [],
  })
}

export function auditOfSample(name: string): Audit {
  return auditOf(readFileSync(new URL(`../../samples/${name}.yaml`, import.meta.url), 'utf8'))
}

/** A claim file with the given lines put over a plain one. */
export function claimText(changes: Readonly<Record<string, string | null>> = {}): string {
  const lines: Record<string, string | null> = {
    claim: 'The line marks midsummer sunrise.',
    structure: '{name: Test place, latitude: 50° N, elevation: 100 m}',
    sightlines: '{one: {azimuth: 50°32′ ± 2′, horizon: 30′ ± 1′}}',
    target: '{body: sun, event: june solstice, at: rising, disc: upper limb}',
    asserted_date: '2000 BCE ± 100',
    ...changes,
  }
  return Object.entries(lines)
    .filter(([, value]) => value !== null)
    .map(([key, value]) => `${key}: ${value}\n`)
    .join('')
}
