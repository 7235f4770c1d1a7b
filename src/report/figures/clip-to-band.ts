type Point = readonly [x: number, y: number]

/** The parts of a polyline that lie between two heights, cut where it crosses them. */
export function clipToBand(points: readonly Point[], top: number, bottom: number): Point[][] {
  const parts: Point[][] = []
  let open: Point[] | null = null
  points.forEach((point, index) => {
    const before = points[index - 1]
    if (before === undefined) {
      if (isIn(point, top, bottom)) open = [point]
      return
    }
    const piece = pieceInside(before, point, top, bottom)
    if (piece === null) {
      if (open !== null) parts.push(open)
      open = null
      return
    }
    const [start, end] = piece
    if (open === null) open = [start]
    open.push(end)
    if (!isIn(point, top, bottom)) {
      parts.push(open)
      open = null
    }
  })
  return (open === null ? parts : [...parts, open]).filter((part) => part.length > 1)
}

function isIn([, y]: Point, top: number, bottom: number): boolean {
  return top <= y && y <= bottom
}

function pieceInside(from: Point, to: Point, top: number, bottom: number): [Point, Point] | null {
  const rise = to[1] - from[1]
  if (rise === 0) return isIn(from, top, bottom) ? [from, to] : null
  const shares = [(top - from[1]) / rise, (bottom - from[1]) / rise].sort((a, b) => a - b) as [number, number]
  const first = Math.max(0, shares[0])
  const last = Math.min(1, shares[1])
  if (first >= last) return null
  const at = (share: number): Point => {
    if (share === 0) return from
    if (share === 1) return to
    return [from[0] + share * (to[0] - from[0]), from[1] + share * rise]
  }
  return [at(first), at(last)]
}
