/**
 * The same plain value with every string in it made one safe line: white space and line ends become single
 * spaces, ends are trimmed, control characters and halves of surrogate pairs are left out. Letters, marks
 * (those of direction too) and punctuation stay as they are.
 */
export function cleanStrings<T>(value: T): T {
  if (typeof value === 'string') return cleanString(value) as T
  if (Array.isArray(value)) return value.map(cleanStrings) as T
  if (typeof value !== 'object' || value === null) return value
  return Object.fromEntries(Object.entries(value).map(([key, entry]) => [key, cleanStrings(entry)])) as T
}

function cleanString(text: string): string {
  return text
    .replace(/[ \t\r\n\v\f\u0085\u2028\u2029]+/g, ' ')
    .replace(/[\p{Cc}\p{Surrogate}]/gu, '')
    .trim()
}
