/** A point of a line that runs on in x, with what goes along with it in proportion. */
export interface EnvelopePoint {
  x: number
  y: number
  along: number
}

type Polyline = readonly EnvelopePoint[]

/**
 * The lower envelope of lines that overlap each other only near their ends, as one line in order of x.
 *
 * @param lines Each with x that grows or stays; each begins where those before it have come to, or earlier.
 */
export function lowerEnvelope(lines: readonly Polyline[]): EnvelopePoint[] {
  const envelope: EnvelopePoint[] = []
  for (const line of lines) {
    let overlap = envelope.length - 1
    while (overlap > 0 && envelope[overlap]!.x > line[0]!.x) overlap--
    const tail = envelope.splice(Math.max(0, overlap))
    // Where the line begins below that very point, the envelope comes down to it there.
    if (tail.length > 0 && tail[0]!.x <= line[0]!.x) push(envelope, tail[0]!)
    for (const point of lowerOfTwo(tail, line)) push(envelope, point)
  }
  return envelope
}

/** Where only one of the two is, that one; where both are, the lower; where they cross, the crossing twice. */
function lowerOfTwo(first: Polyline, second: Polyline): EnvelopePoint[] {
  if (first.length < 2) return [...first, ...second]
  const lower: EnvelopePoint[] = []
  let x = Math.min(first[0]!.x, second[0]!.x)
  let [i, k] = [0, 0]
  for (;;) {
    i = edgeAt(first, i, x)
    k = edgeAt(second, k, x)
    const a = x >= first[i]!.x && i < first.length - 1
    const b = x >= second[k]!.x && k < second.length - 1
    if (!a && !b) return lower
    const end = Math.min(nextX(first, i, x), nextX(second, k, x))
    if (a && b) pushLower(lower, first, i, second, k, x, end)
    else if (a) pushBoth(lower, pointAt(first, i, x), pointAt(first, i, end))
    else pushBoth(lower, pointAt(second, k, x), pointAt(second, k, end))
    x = end
  }
}

function pushLower(
  lower: EnvelopePoint[],
  first: Polyline,
  i: number,
  second: Polyline,
  k: number,
  x: number,
  end: number,
): void {
  const [a0, a1] = [pointAt(first, i, x), pointAt(first, i, end)]
  const [b0, b1] = [pointAt(second, k, x), pointAt(second, k, end)]
  const before = a0.y - b0.y
  const after = a1.y - b1.y
  if (before <= 0 && after <= 0) pushBoth(lower, a0, a1)
  else if (before >= 0 && after >= 0) pushBoth(lower, b0, b1)
  else {
    const middle = x + (before / (before - after)) * (end - x)
    const [a, b] = [pointAt(first, i, middle), pointAt(second, k, middle)]
    pushBoth(lower, ...(before < 0 ? ([a0, a] as const) : ([b0, b] as const)))
    pushBoth(lower, ...(before < 0 ? ([b, b1] as const) : ([a, a1] as const)))
  }
}

function pushBoth(line: EnvelopePoint[], from: EnvelopePoint, to: EnvelopePoint): void {
  push(line, from)
  push(line, to)
}

function push(line: EnvelopePoint[], point: EnvelopePoint): void {
  const last = line.at(-1)
  if (last?.x !== point.x || last.y !== point.y || last.along !== point.along) line.push(point)
}

/** The last edge that begins at an x or before it. */
function edgeAt(line: Polyline, from: number, x: number): number {
  let i = from
  while (i < line.length - 1 && line[i + 1]!.x <= x) i++
  return i
}

/** Where the line next changes after an x: its beginning, the end of an edge, or never. */
function nextX(line: Polyline, i: number, x: number): number {
  if (line[i]!.x > x) return line[i]!.x
  return line[i + 1]?.x ?? Infinity
}

function pointAt(line: Polyline, i: number, x: number): EnvelopePoint {
  const from = line[i]!
  const to = line[i + 1]!
  if (x === from.x) return from
  if (x === to.x) return to
  const share = (x - from.x) / (to.x - from.x)
  return {
    x,
    y: from.y + share * (to.y - from.y),
    along: from.along + share * (to.along - from.along),
  }
}
