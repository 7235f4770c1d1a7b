/**
 * The known word nearest to what was typed, or null where none is near enough to be meant: at most one slip in
 * three letters, or as many as `most`, but always one.
 */
export function nearMiss(
  typed: string,
  known: readonly string[],
  most = Number.POSITIVE_INFINITY,
): string | null {
  const wanted = foldWord(typed)
  const reach = Math.max(1, Math.min(most, Math.floor(wanted.length / 3)))
  let best: { word: string; distance: number } | null = null
  for (const word of known) {
    const distance = editDistance(wanted, foldWord(word))
    if (distance <= reach && (best === null || distance < best.distance)) best = { word, distance }
  }
  return best?.word ?? null
}

/** A word as it is compared with others: without case, spaces, hyphens and underscores. */
export function foldWord(word: string): string {
  return word.toLowerCase().replace(/[\s_-]+/g, '')
}

/** Insertions, deletions, substitutions and swaps of neighbours that turn one word into the other. */
function editDistance(a: string, b: string): number {
  let beforeLast: number[] = []
  let last = Array.from({ length: b.length + 1 }, (_, column) => column)
  for (let row = 1; row <= a.length; row++) {
    const current = [row]
    for (let column = 1; column <= b.length; column++) {
      const isSame = a[row - 1] === b[column - 1]
      const isSwap = a[row - 1] === b[column - 2] && a[row - 2] === b[column - 1]
      current[column] = Math.min(
        last[column]! + 1,
        current[column - 1]! + 1,
        last[column - 1]! + (isSame ? 0 : 1),
        isSwap ? beforeLast[column - 2]! + 1 : Number.POSITIVE_INFINITY,
      )
    }
    beforeLast = last
    last = current
  }
  return last[b.length]!
}
