import { findStar as find } from '../sky/find-star.ts'

/** What the reader of claim files asks about a star's name: its HR number, or what may have been meant. */
export function findStar(text: string): { hr: number } | { suggestions: readonly string[] } {
  const found = find(text)
  return found.star === null ? { suggestions: found.suggestions } : { hr: found.star.hr }
}
