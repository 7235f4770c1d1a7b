import { readClaim } from '../../src/claim/read-claim.ts'
import type { BesideReader } from '../../src/claim/reading-help.ts'
import { findStar } from './find-star.ts'

/** Files beside a claim file by their paths, as the tests hold them. */
export type Files = Readonly<Record<string, string>>

/** Reads a claim file with the few stars that the tests know, the files given, and a span of dates for compasses. */
export function read(text: string, files: Files = {}): ReturnType<typeof readClaim> {
  return readClaim(text, {
    findStar,
    readBeside: readerOf(files),
    magneticDates: { from: '2014-12-15T07:00:00.000Z', to: '2029-11-13T03:00:00.000Z' },
  })
}

/** In place of a digest the reader gives the number of characters. */
export function readerOf(files: Files): BesideReader {
  return (path) => {
    const text = files[path]
    if (text === undefined) return { trouble: 'there is no such file or folder' }
    return { text, sha256: `sha256 of ${text.length}` }
  }
}
