import { expect } from 'vitest'
import type { Reading } from '../../src/quantity/reading.ts'

/** What a test says about a text that cannot be read. `marked` is the stretch of the text the problem points at. */
export interface ExpectedMisread {
  code: string
  marked: string
  suggestion: string | null
}

/** Checks that a text was refused for the reason given, at the place given. */
export function expectMisread(text: string, reading: Reading<unknown>, expected: ExpectedMisread): void {
  expect(reading.ok, `\`${text}\` was read`).toBe(false)
  if (reading.ok) return
  const { code, offset, length, suggestion } = reading.misread
  expect({ code, marked: text.slice(offset, offset + length), suggestion }).toEqual(expected)
}

/** The value that was read, or the reason why none was. */
export function readOrReason<T>(reading: Reading<T>): T | string {
  return reading.ok ? reading.value : reading.misread.message
}
