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

/** A stretch, in x, of one edge of a line. */
interface Piece {
  line: Polyline
  edge: number
  from: number
  to: number
}

/** Where only one of the two is, that one; where both are, the lower; where they cross, the crossing twice. */
function lowerOfTwo(first: Polyline, second: Polyline): EnvelopePoint[] {
  if (first.length < 2) return [...first, ...second]
  const pieces: Piece[] = []
  let x = Math.min(first[0]!.x, second[0]!.x)
  let [i, k] = [0, 0]
  for (;;) {
    i = edgeAt(first, i, x)
    k = edgeAt(second, k, x)
    const a = x >= first[i]!.x && i < first.length - 1
    const b = x >= second[k]!.x && k < second.length - 1
    if (!a && !b) return pointsOf(pieces)
    const end = Math.min(nextX(first, i, x), nextX(second, k, x))
    const ofFirst = { line: first, edge: i, from: x, to: end }
    const ofSecond = { line: second, edge: k, from: x, to: end }
    if (a && b) addLower(pieces, ofFirst, ofSecond)
    else add(pieces, a ? ofFirst : ofSecond)
    x = end
  }
}

/** Of two pieces over the same stretch. */
function addLower(pieces: Piece[], first: Piece, second: Piece): void {
  const { from, to } = first
  const apart = (x: number) => pointAt(first, x).y - pointAt(second, x).y
  const [before, after] = [apart(from), apart(to)]
  if (before <= 0 && after <= 0) add(pieces, first)
  else if (before >= 0 && after >= 0) add(pieces, second)
  else {
    const middle = from + (before / (before - after)) * (to - from)
    const [lower, then] = before < 0 ? [first, second] : [second, first]
    add(pieces, { ...lower, to: middle })
    add(pieces, { ...then, from: middle })
  }
}

/** An edge goes on as one: where a line that lies above it has its points, it gets none, or they would pile up. */
function add(pieces: Piece[], piece: Piece): void {
  const last = pieces.at(-1)
  if (last?.line === piece.line && last.edge === piece.edge && last.to === piece.from) last.to = piece.to
  else pieces.push(piece)
}

function pointsOf(pieces: readonly Piece[]): EnvelopePoint[] {
  const points: EnvelopePoint[] = []
  for (const piece of pieces) {
    push(points, pointAt(piece, piece.from))
    push(points, pointAt(piece, piece.to))
  }
  return points
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

function pointAt({ line, edge }: Piece, x: number): EnvelopePoint {
  const from = line[edge]!
  const to = line[edge + 1]!
  if (x === from.x) return from
  if (x === to.x) return to
  const share = (x - from.x) / (to.x - from.x)
  return {
    x,
    y: from.y + share * (to.y - from.y),
    along: from.along + share * (to.along - from.along),
  }
}
