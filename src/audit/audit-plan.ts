import type { Claim, Point } from '../claim/claim.ts'
import type { Plan, PlanLine, PlanPoint } from './audit.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { metresOnEarth } from './survey/line-on-earth.ts'
import { northOfPlan } from './survey/north-of-plan.ts'
import { pointSdM, turned } from './survey/place-of-point.ts'
import { surveyedLine } from './survey/surveyed-line.ts'

/** The points that a claim's lines use, and the lines, seen from above with true north up. */
export function auditPlan(claim: Claim, lines: readonly SightlineInputs[]): Plan {
  const used = namesUsed(claim)
  const origin = used[0] === undefined ? null : claim.points.get(used[0])!
  const points = used.flatMap((name) => planPoint(claim, origin!, name))
  const names = points.map(({ name }) => name)
  return {
    north: northOf(claim),
    points,
    lines: lines.flatMap((line, i) => planLine(claim, line, claim.sightlines[i]!.direction, names)),
  }
}

/** In the order of the file. */
function namesUsed({ points, sightlines }: Claim): string[] {
  const used = new Set(
    sightlines.flatMap(({ direction }) => {
      if (direction.by === 'points') return [direction.from, direction.to]
      if (direction.by !== 'span' || direction.span.by !== 'points') return []
      return [direction.span.from, direction.span.june, direction.span.december]
    }),
  )
  return [...points.keys()].filter((name) => used.has(name))
}

function northOf(claim: Claim): Plan['north'] {
  const isUsed = claim.sightlines.some(
    ({ direction }) =>
      direction.by === 'points' &&
      [direction.from, direction.to].some((name) => claim.points.get(name)?.by === 'plan'),
  )
  if (!isUsed) return null
  const { found, sdDeg } = northOfPlan(claim)
  return { words: found, sd_deg: sdDeg }
}

/** Nothing for a point that nothing joins to the first one, such as one on a plan without a tie. */
function planPoint(claim: Claim, origin: Point, name: string): PlanPoint[] {
  const point = claim.points.get(name)!
  const place = fromOrigin(claim, origin, point)
  if (place === null) return []
  return [
    {
      name,
      east_m: place.eastM,
      north_m: place.northM,
      sd_m: pointSdM(point),
      width_m: point.breadth?.widthM ?? null,
      form: point.breadth?.form ?? null,
    },
  ]
}

function fromOrigin(claim: Claim, origin: Point, point: Point): { eastM: number; northM: number } | null {
  if (point === origin) return { eastM: 0, northM: 0 }
  if (origin.by === 'plan' && point.by === 'plan') {
    const onPlan = { eastM: point.eastM - origin.eastM, northM: point.northM - origin.northM }
    return turned(onPlan, northOfPlan(claim).turnDeg)
  }
  const metres = metresOnEarth(claim, origin, point)
  if (metres !== null) return metres
  // Neither is on the Earth: both are on a grid of which only the convergence is known, or on the plan and a grid.
  if (origin.by !== 'grid' || point.by !== 'grid' || claim.grid?.by !== 'convergence') return null
  const onGrid = { eastM: point.eastingM - origin.eastingM, northM: point.northingM - origin.northingM }
  return turned(onGrid, claim.grid.convergenceDeg.value)
}

function planLine(
  claim: Claim,
  line: SightlineInputs,
  direction: Claim['sightlines'][number]['direction'],
  names: readonly string[],
): PlanLine[] {
  const row = {
    sightline: line.name,
    from: null,
    to: null,
    azimuth_deg: null,
    span: null,
    length_m: line.lengthM,
  }
  switch (direction.by) {
    case 'altitude':
      return []
    case 'azimuth':
      return [{ ...row, azimuth_deg: line.measuredDeg }]
    case 'points': {
      const [from, to] = [indexIn(names, direction.from), indexIn(names, direction.to)]
      return [{ ...row, from, to, azimuth_deg: line.measuredDeg }]
    }
    case 'span': {
      const { span } = direction
      const clockwise = isClockwise(line) ? line.measuredDeg : -line.measuredDeg
      if (span.by === 'angle') return [{ ...row, span: { to: null, angle_deg: clockwise } }]
      const [from, to] = [indexIn(names, span.from), indexIn(names, span.june)]
      const { azimuthDeg } = surveyedLine(claim, span.from, span.june)
      const december = { to: indexIn(names, span.december), angle_deg: clockwise }
      return [{ ...row, from, to, azimuth_deg: azimuthDeg, span: december }]
    }
  }
}

function indexIn(names: readonly string[], name: string): number | null {
  const index = names.indexOf(name)
  return index === -1 ? null : index
}

/** From June to December sunrise moves clockwise, sunset the other way. */
function isClockwise({ target }: SightlineInputs): boolean {
  return target.body === 'sun at both solstices' && target.at === 'rising'
}
