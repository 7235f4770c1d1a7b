import type { MisreadCode } from './misread-codes.ts'
import type { Misread, Reading } from './reading.ts'

/** Where in a text, in UTF-16 units. */
export interface Stretch {
  offset: number
  length: number
}

/** What to tell besides what is wrong. A suggestion takes the place of exactly the marked stretch. */
export interface Advice {
  expected?: string | null
  suggestion?: string | null
}

/** A failed reading, for `return misread(…)`. */
export function misread(code: MisreadCode, message: string, at: Stretch, advice: Advice = {}) {
  return { ok: false as const, misread: describeMisread(code, message, at, advice) }
}

/** What is wrong with a text and where; by itself it serves as a warning. */
export function describeMisread(
  code: MisreadCode,
  message: string,
  { offset, length }: Stretch,
  { expected = null, suggestion = null }: Advice = {},
): Misread {
  return { code, message, expected, suggestion, offset, length: Math.max(1, length) }
}

/** The stretch of a text without the space around it; all of a text that is nothing but space. */
export function trimmedStretch(text: string): Stretch {
  const { length } = text.trim()
  return length === 0 ? { offset: 0, length: text.length } : { offset: text.search(/\S/), length }
}

/** A reading of a piece of a text, with its offsets counted in the whole text. */
export function shiftReading<T>(reading: Reading<T>, by: number): Reading<T> {
  const moved = (m: Misread): Misread => ({ ...m, offset: m.offset + by })
  if (!reading.ok) return { ok: false, misread: moved(reading.misread) }
  if (reading.warnings === undefined) return reading
  return { ...reading, warnings: reading.warnings.map(moved) }
}

/** The same reading with its value turned into another; problems stay as they are. */
export function mapReading<T, U>(reading: Reading<T>, turn: (value: T) => U): Reading<U> {
  return reading.ok ? { ...reading, value: turn(reading.value) } : reading
}
