/**
 * Something wrong with a text that was read, at its place. `error`: what was read cannot be used.
 * `warning`: doubtful, but used; it is shown in the report as well.
 */
export interface Problem {
  severity: 'error' | 'warning'
  /** A stable kebab-case name of the kind of problem, such as `tolerance-without-unit`. */
  code: string
  /** What is wrong, in one sentence, with the offending value in backticks. */
  message: string
  /** What was expected instead, or null. */
  expected: string | null
  /** What to write in the place of exactly the marked stretch, or null where it cannot be guessed; `a or b` where two are likely. */
  suggestion: string | null
  /** Path of the field, such as `sightlines.midsummer.horizon`, or null outside any field. */
  path: string | null
  /** Offset of the first character in the text, in UTF-16 units, from 0. */
  offset: number
  /** Length of the marked stretch, in UTF-16 units; at least 1. */
  length: number
  /** Where it stands in a file beside the one that was read: `offset` and `length` are of this file's text. */
  beside?: FileBeside
}

/** A file that the text names. */
export interface FileBeside {
  /** As the text writes it, relative to the folder of the text's own file. */
  path: string
  text: string
  /** Offset in the text of the place that names it. */
  namedAt: number
}
