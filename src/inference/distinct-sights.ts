import type { Sight } from './sight.ts'

/** Years in which two targets that are not one and the same part in their direction, or in what they miss. */
const PROBES = [-9000, -4000, -1000, 1500]

/** Lines without those that stand there twice: between the same points, the same way round, for the same target. */
export function distinctSights(sights: readonly Sight[]): readonly Sight[] {
  return sights.filter((sight, i) => !sights.slice(0, i).some((other) => isSame(sight, other)))
}

function isSame(a: Sight, b: Sight): boolean {
  return (
    a.axis !== null && a.axis === b.axis && a.measuredDeg === b.measuredDeg && coursesOf(a) === coursesOf(b)
  )
}

function coursesOf({ branches }: Sight): string {
  return JSON.stringify(
    PROBES.map((year) =>
      branches.map(({ predict, shortfallDeg }) => [predict(year), shortfallDeg?.(year) ?? null]),
    ),
  )
}
