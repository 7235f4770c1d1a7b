import { expect } from 'vitest'

/** Asserts that two numbers differ by no more than a tolerance in a named unit; NaN always fails. */
export function expectWithin(
  got: number,
  want: number,
  tolerance: number,
  unit: string,
  name: string | number = '',
): void {
  const message = `${name}: want ${want}, got ${got}, tolerance ${tolerance} ${unit}`
  expect(Math.abs(got - want), message).toBeLessThanOrEqual(tolerance)
}
