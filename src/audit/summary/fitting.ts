/** Words that a finding has at most. */
const MOST_WORDS = 150

/** Of a finding told in several ways, the fullest that has at most 150 words; the last where none has. */
export function fitting(ways: readonly (readonly string[])[]): string[] {
  const wordsOf = (paragraphs: readonly string[]) => paragraphs.join(' ').split(/\s+/).length
  return [...(ways.find((paragraphs) => wordsOf(paragraphs) <= MOST_WORDS) ?? ways.at(-1) ?? [])]
}
