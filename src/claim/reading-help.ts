import type { StarFinder } from './star-finder.ts'

/**
 * Reads a file beside the claim file by the path that the claim writes: its text, what is not UTF-8 as U+FFFD, and the
 * SHA-256 of its bytes; or why it cannot be read, such as `there is no such file or folder`.
 */
export type BesideReader = (path: string) => { text: string; sha256: string } | { trouble: string }

/** What reading a claim needs to know that its text does not tell. */
export interface ReadingHelp {
  findStar: StarFinder
  /** Without it a claim that names other files cannot be read. */
  readBeside?: BesideReader
  /**
   * The first and last moment, as ISO 8601 writes them, for which the declination of a compass is computed. Without it
   * a claim has to state the declination.
   */
  magneticDates?: { from: string; to: string }
}
