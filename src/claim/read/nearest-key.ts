import { nearMiss } from '../../quantity/near-miss.ts'

/** The key a misspelt one most likely means, also where it is only a word of it or its beginning: `date`, `lat`. */
export function nearestKey(typed: string, keys: readonly string[]): string | null {
  const close = nearMiss(typed, keys, 2)
  if (close !== null || typed.length < 3) return close
  const lower = typed.toLowerCase()
  const candidates = keys.filter((key) => key.startsWith(lower) || key.split('_').includes(lower))
  return candidates.length === 1 ? (candidates[0] ?? null) : null
}
