/** The outcome of reading a quantity from a text. Offsets count UTF-16 units inside that text. */
export type Reading<T> =
  | { ok: true; value: T; warnings?: readonly Misread[] }
  | { ok: false; misread: Misread }

/** Why a text could not be read as a quantity, and what to write instead; the fields are as in `Problem`. */
export interface Misread {
  code: string
  message: string
  expected: string | null
  suggestion: string | null
  offset: number
  length: number
}
