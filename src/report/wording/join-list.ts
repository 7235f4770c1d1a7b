/** Joins words for a sentence: `a`, `a and b`, `a, b and c`. */
export function joinList(words: readonly string[]): string {
  return words.length < 2 ? (words[0] ?? '') : `${words.slice(0, -1).join(', ')} and ${words.at(-1)}`
}
