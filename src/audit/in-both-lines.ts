import type { SightlineInputs } from './sightline-inputs.ts'

/** A change made to a line; where it is an angle, to both of its lines as well. */
export function inBothLines(
  line: SightlineInputs,
  change: (line: SightlineInputs) => SightlineInputs,
): SightlineInputs {
  const changed = change(line)
  const { pair } = line
  return pair === null
    ? changed
    : { ...changed, pair: { june: change(pair.june), december: change(pair.december) } }
}
