import type { Problem } from '../../quantity/problem.ts'

/** An error in a template at a place in its text. */
export function problemAt(
  place: { offset: number; length: number },
  code: string,
  message: string,
  hint: { expected?: string | null; suggestion?: string | null } = {},
): Problem {
  return {
    severity: 'error',
    code,
    message,
    expected: hint.expected ?? null,
    suggestion: hint.suggestion ?? null,
    path: null,
    offset: place.offset,
    length: Math.max(1, place.length),
  }
}
