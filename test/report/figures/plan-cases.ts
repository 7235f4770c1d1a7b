import type { Audit, Placement, PlanPoint, SightlineAudit } from '../../../src/audit/audit.ts'
import { planParts } from '../../../src/report/figures/plan-parts.ts'
import { makeShapedAudit } from './make-audit.ts'

/**
 * Surveys made by hand for the figure of the plan: shapes to be drawn, not results. Distances and azimuths of the
 * points follow from their coordinates.
 */
export interface PlanLineShape {
  name: string
  azimuthDeg: number | null
  /** Clockwise from the azimuth, for the angle between two lines. */
  angleDeg?: number
  from?: number
  to?: number
  second?: number
  lengthM?: number
  sdDeg?: number
  /** The line less the target at each date, arcminutes; null where it stood nowhere. */
  offsets: readonly (number | null)[]
  /** Half of the directions that the target passes in each date, arcminutes. */
  halves?: readonly number[]
  measures?: SightlineAudit['measures']
}

export interface PlanShape {
  points?: readonly PlanPoint[]
  lines: readonly PlanLineShape[]
  northSdDeg?: number
  plausible?: Audit['plausible']
  dates?: readonly (readonly [kind: Placement['kind'], label: string, printed: string])[]
}

const DATES = [
  ['asserted', 'asserted date', '9701 to 9501 BCE'],
  ['independent', 'radiocarbon', '801 to 501 BCE'],
  ['today', 'today', '2026 CE'],
] as const

export function makePlanAudit(shape: PlanShape): Audit {
  const base = makeShapedAudit(shape.plausible === undefined ? {} : { plausible: shape.plausible })
  const [first] = base.sightlines
  const dates = shape.dates ?? DATES
  const lengths = new Set(shape.lines.map(({ lengthM }) => lengthM))
  const [length] = lengths
  const isMeasured = lengths.size === 1 && length !== undefined
  return {
    ...base,
    sightlines: shape.lines.map((line) => sightlineOf(first!, line)),
    plan: {
      north: shape.northSdDeg === undefined ? null : { words: 'by compass', sd_deg: shape.northSdDeg },
      points: shape.points ?? [],
      lines: shape.lines.map((line) => ({
        sightline: line.name,
        from: line.from ?? null,
        to: line.to ?? null,
        azimuth_deg: line.azimuthDeg,
        span: line.angleDeg === undefined ? null : { to: line.second ?? null, angle_deg: line.angleDeg },
        length_m: line.lengthM ?? null,
      })),
    },
    other_dates: dates
      .filter(([kind]) => kind === 'independent')
      .map(([, label, printed]) => ({ label, printed, text: printed, from: 0, to: 0 })),
    placements: shape.lines.flatMap((line) => placementsOf(line, dates)),
    sweep: { ...base.sweep, marker: { distance_m: isMeasured ? length : 100, measured: isMeasured } },
  }
}

function sightlineOf(base: SightlineAudit, line: PlanLineShape): SightlineAudit {
  const measured = { value: measuredDeg(line), sd: line.sdDeg ?? 2 / 60 }
  const isAngle = line.angleDeg !== undefined
  return {
    ...base,
    name: line.name,
    measures: line.measures ?? (isAngle ? 'angle' : 'azimuth'),
    tolerance_scale: isAngle ? Math.SQRT2 : 1,
    azimuth_deg: isAngle ? null : measured,
    angle_deg: isAngle ? measured : null,
    length_m: line.lengthM ?? null,
  }
}

function placementsOf(line: PlanLineShape, dates: NonNullable<PlanShape['dates']>): Placement[] {
  return dates.map(([kind, label, printed], index) => {
    const offset = line.offsets[index] ?? null
    const direction = offset === null ? null : measuredDeg(line) - offset / 60
    const half = (line.halves?.[index] ?? 0) / 60
    return {
      ...{ sightline: line.name, kind, label, printed, year: 0, from: 0, to: 0, disc: null },
      direction_deg: direction,
      direction_range_deg: direction === null ? null : ([direction - half, direction + half] as const),
      offset_arcmin: offset,
      offset_sd_arcmin: offset === null ? null : 2.5,
      offset_cm: offset === null || line.angleDeg !== undefined ? null : cmAt(offset, line),
    }
  })
}

/** As the crow flies. */
function cmAt(arcmin: number, { lengthM }: PlanLineShape): number {
  return 200 * (lengthM ?? 100) * Math.sin((Math.abs(arcmin) / 60 / 2) * (Math.PI / 180))
}

function measuredDeg({ azimuthDeg, angleDeg }: PlanLineShape): number {
  return angleDeg === undefined ? (azimuthDeg ?? 0) : Math.abs(angleDeg)
}

export function point(name: string, east: number, north: number, more: Partial<PlanPoint> = {}): PlanPoint {
  return { name, east_m: east, north_m: north, sd_m: 0.05, width_m: null, form: null, ...more }
}

/** From the first point to each of the others: azimuth and length by plane trigonometry. */
function sights(points: readonly PlanPoint[], offsets: readonly PlanLineShape['offsets'][]): PlanLineShape[] {
  return points.slice(1).map(({ name, east_m, north_m }, index) => ({
    name: `line to ${name}`,
    azimuthDeg: ((Math.atan2(east_m, north_m) * 180) / Math.PI + 360) % 360,
    lengthM: Math.hypot(east_m, north_m),
    from: 0,
    to: index + 1,
    offsets: offsets[index % offsets.length]!,
    halves: [0.5, 2],
  }))
}

/** The worked case: 84.65 m east and 53.09 m north, 57.9053° and 99.92 m. */
export function onePlan(): Audit {
  return makePlanAudit({
    points: [point('hearthstone', 0, 0), point('east-pillar', 84.65, 53.09)],
    lines: [
      {
        ...{ name: 'midsummer', azimuthDeg: 57.9053, from: 0, to: 1, lengthM: 99.92 },
        ...{ offsets: [-1.8, -36.5, -65.4], halves: [0.4, 1.5, 0] },
      },
    ],
  })
}

/** Three lines from one spot, a few degrees apart. */
export function calendarPlan(): Audit {
  const points = [
    point('threshold', 0, 0),
    point('first', 41.1, 30.23),
    point('second', 43.95, 26.85),
    point('third', 49.2, 16.55),
  ]
  const offsets = [
    [-2.4, -34.2, -45.9],
    [-11.3, -28.6, -38],
    [-35.1, -12.6, -13.1],
  ]
  return makePlanAudit({ points, lines: sights(points, offsets), northSdDeg: 0.5 })
}

/** Six lines all round, one of them to a peak far off, one through a gap, names too long for their places. */
export function roundPlan(): Audit {
  const points = [
    point('centre stone', 0, 0),
    point('north marker of the outer bank', -20, 60),
    point('east', 55, 10, { width_m: 1.5, form: 'post' }),
    point('south-east heel stone', 40, -42),
    point('south-west', -44, -38, { sd_m: 6 }),
    point('west gap', -61, 4, { width_m: 6, form: 'gap' }),
    point('peak', 5000, 6000),
  ]
  const offsets = [
    [-2, -30, -60],
    [-5, -20, 40],
    [-8, -10, -90],
    [-11, 0, 20],
    [-14, 10, 5],
    [3, -20, -44],
  ]
  return makePlanAudit({ points, lines: sights(points, offsets), northSdDeg: 2 })
}

/** Bare azimuths on either side of north; the asserted date is degrees off one of them. */
export function northPlan(): Audit {
  return makePlanAudit({
    lines: [
      { name: 'wall', azimuthDeg: 359.9, offsets: [-12, 5, -70], halves: [9, 20, 0] },
      { name: 'shaft', azimuthDeg: 0.6, offsets: [440, -20, null] },
    ],
    plausible: { low_arcmin: 3, high_arcmin: 15, stated: true },
  })
}

/** Out and back along one axis; of two points at one end only centimetres lie between. */
export function axisPlan(): Audit {
  return makePlanAudit({
    points: [
      point('sighting notch', 0, 0),
      point('edge of the notch', 0.02, 0),
      point('pillar', -70, -3, { sd_m: 1.2 }),
    ],
    lines: [
      {
        ...{ name: 'out', azimuthDeg: 267.546, from: 0, to: 2, lengthM: 70.06, sdDeg: 2 },
        offsets: [5, -20, 5],
      },
      {
        ...{ name: 'back', azimuthDeg: 87.53, from: 2, to: 1, lengthM: 70.08, sdDeg: 2 },
        offsets: [-4, -4, -4],
      },
    ],
  })
}

/** The angle between the lines to two pegs, opening clockwise. */
export function anglePlan(): Audit {
  return makePlanAudit({
    points: [point('stone', 0, 0), point('June peg', 40, 30), point('December peg', 42, -27)],
    lines: [
      {
        ...{ name: 'span', azimuthDeg: 53.13, angleDeg: 69.606, from: 0, to: 1, second: 2, lengthM: 50 },
        offsets: [-6, 20, 44],
      },
    ],
  })
}

/** An angle opening the other way that has no direction of its own. */
export function bareAnglePlan(): Audit {
  return makePlanAudit({
    lines: [{ name: 'span', azimuthDeg: null, angleDeg: -69.4, offsets: [-6, 20, 44] }],
  })
}

/** A target that is never seen, tolerances from exact to as wide as the view. */
export function neverPlan(): Audit {
  return makePlanAudit({
    points: [point('a', 0, 0), point('b', 14, 6)],
    lines: [
      { ...{ name: 'x', azimuthDeg: 66.8, from: 0, to: 1, lengthM: 15.2 }, offsets: [null, null, null] },
    ],
    plausible: { low_arcmin: 0, high_arcmin: 600, stated: true },
  })
}

/** Everything on the line and no tolerance at all; names in other scripts. */
export function exactPlan(): Audit {
  return makePlanAudit({
    points: [point('神殿の入口', -120, -80), point('медный столб у восточных ворот', -60, -50)],
    lines: [
      {
        ...{ name: '冬至の日の出', azimuthDeg: 63.435, from: 0, to: 1, lengthM: 67.08, sdDeg: 0 },
        offsets: [0, 0, 0.001],
      },
    ],
    plausible: { low_arcmin: 0, high_arcmin: 0, stated: false },
    dates: [
      ['asserted', 'asserted date', '9701 to 9501 BCE'],
      ['independent', '放射性炭素年代測定による年代', '801 to 501 BCE'],
      ['today', 'today', '2026 CE'],
    ],
  })
}

/** Five independent dates, several of them near the asserted one. */
export function datesPlan(): Audit {
  const names = ['hearth', 'post', 'coin hoard beneath the threshold', 'pottery', 'dendrochronology']
  return makePlanAudit({
    points: [point('a', 0, 0), point('b', -60, 30)],
    lines: [
      {
        ...{ name: 'pair', azimuthDeg: 296.565, from: 0, to: 1, lengthM: 67.08 },
        offsets: [10, 12, 13, 14, 60, -20, 90],
        halves: [1, 2, 2, 3, 5, 3, 0],
      },
    ],
    dates: [
      ['asserted', 'asserted date', '9701 to 9501 BCE'],
      ...names.map((name, index) => ['independent', name, `${800 - 100 * index} BCE`] as const),
      ['today', 'today', '2026 CE'],
    ],
  })
}

/** Five lines of it: as many as one figure holds. */
function fivePlan(): Audit {
  const round = roundPlan()
  return { ...round, plan: { ...round.plan, lines: round.plan.lines.slice(0, 5) } }
}

/** A plan whose claim does not say where its north points. */
export function untoldPlan(): Audit {
  const audit = calendarPlan()
  return { ...audit, plan: { ...audit.plan, north: { words: 'not said; taken as true', sd_deg: 0 } } }
}

export const PLAN_CASES: Readonly<Record<string, () => Audit>> = {
  one: onePlan,
  calendar: calendarPlan,
  five: fivePlan,
  round: () => planParts(roundPlan())[0]!,
  'round-2': () => planParts(roundPlan())[1]!,
  untold: untoldPlan,
  north: northPlan,
  axis: axisPlan,
  angle: anglePlan,
  'bare-angle': bareAnglePlan,
  never: neverPlan,
  exact: exactPlan,
  dates: datesPlan,
}
