/** A label on an axis: where its middle is wanted, and how much of the axis it takes. */
export interface Wanted {
  at: number
  size: number
}

interface Block {
  sum: number
  count: number
}

/**
 * Moves labels along one axis so that none overlaps another: in the order they are wanted, as near to their
 * places as the others allow (least squares, by pooling neighbours that collide), and between `from` and `to`.
 * Gives the middles in the order of the input. Labels too many for the stretch run over its far end.
 */
export function placeAlong(wanted: readonly Wanted[], from: number, to: number): number[] {
  const order = wanted.map((_, index) => index).sort((a, b) => wanted[a]!.at - wanted[b]!.at || a - b)
  const sorted = order.map((index) => wanted[index]!)
  const before = middlesWhenPacked(sorted)
  const total = sorted.reduce((sum, label) => sum + label.size, 0)
  const highest = Math.max(from, to - total)
  // With the packed middles taken off, "no overlap" is "not descending".
  const shifts = nonDescending(sorted.map((label, rank) => label.at - before[rank]!))
  const middles = new Array<number>(wanted.length)
  order.forEach((index, rank) => {
    middles[index] = before[rank]! + Math.min(highest, Math.max(from, shifts[rank]!))
  })
  return middles
}

function middlesWhenPacked(labels: readonly Wanted[]): number[] {
  let edge = 0
  return labels.map(({ size }) => {
    edge += size
    return edge - size / 2
  })
}

/** The non-descending sequence nearest to the values in the sense of least squares. */
function nonDescending(values: readonly number[]): number[] {
  const blocks: Block[] = []
  for (const value of values) {
    blocks.push({ sum: value, count: 1 })
    while (blocks.length > 1 && mean(blocks.at(-2)!) > mean(blocks.at(-1)!)) {
      const last = blocks.pop()!
      const previous = blocks.pop()!
      blocks.push({ sum: previous.sum + last.sum, count: previous.count + last.count })
    }
  }
  return blocks.flatMap((block) => new Array<number>(block.count).fill(mean(block)))
}

function mean({ sum, count }: Block): number {
  return sum / count
}
