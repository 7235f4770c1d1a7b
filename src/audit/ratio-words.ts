/** Steps of the strength of evidence, as Kass & Raftery 1995 (J. Am. Stat. Assoc. 90, 773) word them. */
const STEPS = [
  { from: 150, words: 'very strong' },
  { from: 20, words: 'strong' },
  { from: 3, words: 'positive' },
  { from: 1, words: 'barely worth a mention' },
]

/** A factor that prints as 1.0. */
const EVEN = Math.log(1.05)

/**
 * A Bayes factor in words, and which of the two dates it is for.
 *
 * @param ln Natural logarithm of the factor for the asserted date; null where neither date has any weight.
 */
export function ratioWords(ln: number | null, against: string): string {
  if (ln === null) return 'neither date fits at all'
  if (Math.abs(ln) < EVEN) return 'even'
  const size = Math.abs(ln)
  const step = STEPS.find(({ from }) => size >= Math.log(from)) ?? STEPS.at(-1)!
  return `${step.words}, for ${ln > 0 ? 'the asserted date' : against}`
}
