import type { Claim, LocalPoint, Point } from '../../claim/claim.ts'

/** The one point of a claim's plan that is known on the Earth too, with its name; null where there is none. */
export function tieOf({
  points,
}: Claim): { name: string; point: Point & LocalPoint; place: NonNullable<LocalPoint['tie']> } | null {
  for (const [name, point] of points) {
    if (point.by === 'plan' && point.tie !== null) return { name, point, place: point.tie }
  }
  return null
}
