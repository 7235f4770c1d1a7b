import type { Audit } from '../../audit/audit.ts'

/** The words for a claim with one sightline, or those for several: `the line tells`, `the lines tell`. */
export function lineOrLines({ sightlines }: Audit, singular: string, plural: string): string {
  return sightlines.length > 1 ? plural : singular
}
