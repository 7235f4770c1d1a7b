import type { SightlineInputs } from './sightline-inputs.ts'

/**
 * The lines that are read together. An angle is the difference of two lines: where one of these stands in the claim by
 * itself, or in an angle before it, its survey and its building would count twice, and the angle is left out.
 */
export function jointLines(lines: readonly SightlineInputs[]): SightlineInputs[] {
  const single = lines.flatMap(({ pair, axis }) => (pair === null && axis !== null ? [axis] : []))
  const taken = new Set(single)
  return lines.filter((line) => {
    const legs = legsOf(line)
    if (legs.some((leg) => taken.has(leg))) return false
    for (const leg of legs) taken.add(leg)
    return true
  })
}

/** The two lines of an angle, by the points that they run between; none of other lines, and of an angle as measured. */
function legsOf({ pair }: SightlineInputs): string[] {
  return pair === null ? [] : [pair.june.axis, pair.december.axis].filter((axis) => axis !== null)
}
