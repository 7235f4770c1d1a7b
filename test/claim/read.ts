import { readClaim } from '../../src/claim/read-claim.ts'
import { findStar } from './find-star.ts'

/** Reads a claim file with the few stars that the tests know. */
export function read(text: string): ReturnType<typeof readClaim> {
  return readClaim(text, { findStar })
}
