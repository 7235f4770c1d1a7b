/** A stretch of values that only grow, or only fall. */
interface Run {
  first: number
  last: number
  low: number
  high: number
  falls: boolean
}

/** Where values listed in order pass a level. */
export interface MonotoneRuns {
  /**
   * Calls for each passing, in order, with the index before it, the share of the way to the next index, and whether
   * the values fall there. A level that the values only touch is passed twice or not at all.
   */
  passings: (level: number, found: (index: number, share: number, falls: boolean) => void) => void
  /** The values at which passings come or go, in order of size. */
  turns: readonly number[]
}

/** Cuts a list of values into runs that only grow or only fall, so that a level is found in each by bisection. */
export function monotoneRuns(values: Float64Array): MonotoneRuns {
  const runs = runsOf(values)
  const passings: MonotoneRuns['passings'] = (level, found) => {
    for (const { first, last, low, high, falls } of runs) {
      if (level < low || level >= high) continue
      const index = indexBefore(values, level, first, last, falls)
      found(index, (level - values[index]!) / (values[index + 1]! - values[index]!), falls)
    }
  }
  const ends = runs.flatMap(({ low, high }) => [low, high])
  return { passings, turns: [...new Set(ends)].sort((a, b) => a - b) }
}

function runsOf(values: Float64Array): Run[] {
  const runs: Run[] = []
  for (let i = 1; i < values.length; i++) {
    const [from, to] = [values[i - 1]!, values[i]!]
    // A value listed twice cuts no run.
    if (from === to) continue
    const falls = to < from
    const run = runs.at(-1)
    if (run?.falls !== falls) {
      runs.push({ first: i - 1, last: i, low: Math.min(from, to), high: Math.max(from, to), falls })
    } else {
      run.last = i
      if (falls) run.low = to
      else run.high = to
    }
  }
  return runs
}

/** The last index of a run before its values reach a level. */
function indexBefore(
  values: Float64Array,
  level: number,
  first: number,
  last: number,
  falls: boolean,
): number {
  let [before, after] = [first, last]
  while (after - before > 1) {
    const middle = (before + after) >> 1
    const isBefore = falls ? values[middle]! > level : values[middle]! <= level
    if (isBefore) before = middle
    else after = middle
  }
  return before
}
