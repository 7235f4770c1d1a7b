import { type Flag, type PlacedFlag, placeFlags, placeOnSides, rowCount, type Side } from './place-flags.ts'

/**
 * Places labels as `placeFlags` does. Where they are too many for its search, those on the left hang to the left and
 * the others to the right, as far as the bounds allow; of all ways to part them so, one with the fewest rows.
 */
export function placeInHalves(flags: readonly Flag[], from: number, to: number): PlacedFlag[] {
  const placed = placeFlags(flags, from, to)
  if (placed.every(({ side }) => side !== null)) return placed
  const borders = [from, ...flags.map(({ x }) => x)]
  const ways = borders
    .map((border) => placeOnSides(flags, sidesAt(border, flags, from, to), from, to))
    .filter((way) => way !== null)
    .sort((a, b) => rowCount(a) - rowCount(b))
  return ways[0] ?? placed
}

function sidesAt(border: number, flags: readonly Flag[], from: number, to: number): Side[] {
  const room = { left: ({ x }: Flag) => x - from, right: ({ x }: Flag) => to - x }
  return flags.map((flag): Side => {
    const [wanted, other]: [Side, Side] = flag.x <= border ? ['left', 'right'] : ['right', 'left']
    return room[wanted](flag) >= flag.width + ROOM ? wanted : other
  })
}

/** Between a label and its pole, and a little more. */
const ROOM = 4
