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
}

/**
 * Cuts a list of values into runs that only grow or only fall, so that a level is found in each by bisection. Of all
 * the runs only those that hold the level are looked at: a query takes the time of its passings, each times the
 * logarithm of the number of runs.
 */
export function monotoneRuns(values: Float64Array): MonotoneRuns {
  const runs = runsOf(values)
  const layers = layersOver(runs)
  const passings: MonotoneRuns['passings'] = (level, found) => {
    visitHolding(layers, level, layers.length - 1, 0, (run) => {
      const { first, last, falls } = runs[run]!
      const index = indexBefore(values, level, first, last, falls)
      found(index, (level - values[index]!) / (values[index + 1]! - values[index]!), falls)
    })
  }
  return { passings }
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

/** From where to where the values go in each run, or in each two neighbours of the layer below. */
interface Layer {
  lows: Float64Array
  highs: Float64Array
}

/** The runs' own layer first; the last has one entry, for all of them. */
function layersOver(runs: readonly Run[]): Layer[] {
  const layers: Layer[] = [
    { lows: Float64Array.from(runs, ({ low }) => low), highs: Float64Array.from(runs, ({ high }) => high) },
  ]
  for (let layer = layers[0]!; layer.lows.length > 1; layer = layers.at(-1)!) {
    const { lows, highs } = layer
    const halves = { length: Math.ceil(lows.length / 2) }
    layers.push({
      lows: Float64Array.from(halves, (_, i) => Math.min(...lows.subarray(2 * i, 2 * i + 2))),
      highs: Float64Array.from(halves, (_, i) => Math.max(...highs.subarray(2 * i, 2 * i + 2))),
    })
  }
  return layers
}

/**
 * Goes down to the runs that hold a level, in order. Each run begins where the one before it ended, so that neighbours
 * that reach from below a level to above it have a run between them that holds it: no way down leads to nothing.
 */
function visitHolding(
  layers: readonly Layer[],
  level: number,
  depth: number,
  entry: number,
  visit: (run: number) => void,
): void {
  const { lows, highs } = layers[depth]!
  // Written so that an entry past the end of the layer, which is undefined, holds nothing.
  if (!(level >= lows[entry]! && level < highs[entry]!)) return
  if (depth === 0) visit(entry)
  else {
    visitHolding(layers, level, depth - 1, 2 * entry, visit)
    visitHolding(layers, level, depth - 1, 2 * entry + 1, visit)
  }
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
