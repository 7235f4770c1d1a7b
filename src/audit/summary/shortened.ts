/** So many words of a name or a label are told in the finding; the tables have all of them. */
const MOST_WORDS = 5

/** A name of few words as it is; of more the first ones: `radiocarbon dates of charred seeds…`. */
export function shortened(name: string): string {
  const words = name.trim().split(/\s+/)
  return words.length <= MOST_WORDS ? name : `${words.slice(0, MOST_WORDS).join(' ')}…`
}
