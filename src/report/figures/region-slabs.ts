/** A stretch along the vertical, from its lesser to its greater coordinate. */
export type Span = readonly [number, number]

/** A piece of the region between two columns, and the spans it wholly continues, if any. */
export interface Slab {
  left: Span
  right: Span
  continues: number | null
  reaches: number | null
}

/** The pieces between two neighbouring columns, from what spans of the one overlap which of the other. */
export function slabsBetween(left: readonly Span[], right: readonly Span[]): Slab[] {
  return groupsThatMeet(left, right).flatMap((group) => {
    if (group.right.length === 0) return group.left.map((index) => ending(left, index))
    if (group.left.length === 0) return group.right.map((index) => beginning(right, index))
    return slabsOfGroup(group, left, right)
  })
}

function ending(left: readonly Span[], index: number): Slab {
  const point = middle(left[index]!)
  return { left: left[index]!, right: [point, point], continues: index, reaches: null }
}

function beginning(right: readonly Span[], index: number): Slab {
  const point = middle(right[index]!)
  return { left: [point, point], right: right[index]!, continues: null, reaches: index }
}

interface Group {
  left: number[]
  right: number[]
}

/** Which spans of the two sides hang together, each with those it overlaps. */
function groupsThatMeet(left: readonly Span[], right: readonly Span[]): Group[] {
  const all = [
    ...left.map((span, index) => ({ span, index, side: 'left' as const })),
    ...right.map((span, index) => ({ span, index, side: 'right' as const })),
  ].sort((a, b) => a.span[0] - b.span[0])
  const groups: Group[] = []
  let reach = Number.NEGATIVE_INFINITY
  for (const { span, index, side } of all) {
    if (span[0] > reach || groups.length === 0) groups.push({ left: [], right: [] })
    groups.at(-1)![side].push(index)
    reach = Math.max(reach, span[1])
  }
  return groups
}

/**
 * Within a group every gap of one side lies inside a span of the other, so each gap closes in a point there and
 * the pieces between the gaps follow each other on both sides.
 */
function slabsOfGroup(group: Group, left: readonly Span[], right: readonly Span[]): Slab[] {
  const cuts = [
    ...gaps(group.left, left).map((gap) => ({ left: gap, right: pointOf(gap) })),
    ...gaps(group.right, right).map((gap) => ({ left: pointOf(gap), right: gap })),
  ].sort((a, b) => middle(a.left) - middle(b.left))
  const ends = { left: outerEnds(group.left, left), right: outerEnds(group.right, right) }
  return Array.from({ length: cuts.length + 1 }, (_, piece) => {
    const before = cuts[piece - 1]
    const after = cuts[piece]
    const leftSpan: Span = [before?.left[1] ?? ends.left[0], after?.left[0] ?? ends.left[1]]
    const rightSpan: Span = [before?.right[1] ?? ends.right[0], after?.right[0] ?? ends.right[1]]
    return {
      left: leftSpan,
      right: rightSpan,
      continues: wholeSpan(leftSpan, left),
      reaches: wholeSpan(rightSpan, right),
    }
  })
}

function gaps(indices: readonly number[], spans: readonly Span[]): Span[] {
  return indices.slice(1).map((index, rank): Span => [spans[indices[rank]!]![1], spans[index]![0]])
}

function outerEnds(indices: readonly number[], spans: readonly Span[]): Span {
  return [spans[indices[0]!]![0], spans[indices.at(-1)!]![1]]
}

function wholeSpan(piece: Span, spans: readonly Span[]): number | null {
  const index = spans.findIndex((span) => span[0] === piece[0] && span[1] === piece[1])
  return index < 0 ? null : index
}

function pointOf(gap: Span): Span {
  return [middle(gap), middle(gap)]
}

export function middle([low, high]: Span): number {
  return (low + high) / 2
}
