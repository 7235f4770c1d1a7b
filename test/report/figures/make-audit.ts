import type {
  Audit,
  DatedLabel,
  Implied,
  ImpliedDate,
  Limit,
  Outcome,
  SightlineAudit,
  SweepStep,
  Track,
  Window,
} from '../../../src/audit/audit.ts'
import { formatYearRange } from '../../../src/quantity/format-year.ts'

/**
 * Audits made by hand for the figures' tests. The sets, tracks and labels are shapes chosen to be drawn, not
 * results: only `premiseAudit` uses printed figures, those of the worked case of the method (asserted 9700 to
 * 9500 BCE, independent 800 to 500 BCE, azimuth 57.9077°, limits 23.2′, 23.3′ and 25.8′).
 */
export type Sets = readonly (readonly [number, number])[]

export interface Shape {
  outcome?: Outcome
  asserted?: readonly [number, number]
  others?: readonly (readonly [label: string, from: number, to: number])[]
  window?: readonly [number, number]
  assumed?: number | null
  plausible?: { low_arcmin: number; high_arcmin: number; stated: boolean }
  steps?: readonly SweepStep[]
  noTarget?: Sets
  limits?: readonly Partial<Limit>[]
  lineDeg?: { value: number; sd: number }
  tracks?: readonly Track[]
  implied?: readonly Implied[]
  measuredLength?: boolean
  /** What the sightline has otherwise than a June solstice sunrise. */
  sightline?: Partial<SightlineAudit>
}

const SWEPT = Array.from({ length: 90 }, (_, i) => 0.5 * 600 ** (i / 89))
/** The tolerances of a sweep: round ones, and 90 from 0.5′ to 5°, evenly spaced in their logarithm. */
export const TOLERANCES: readonly number[] = [...new Set([0, 1, 2, 5, 10, 20, 30, 60, 120, ...SWEPT])].sort(
  (a, b) => a - b,
)

export function makeShapedAudit(shape: Shape = {}): Audit {
  const window = windowOf(shape.window ?? [-20_000, 2026])
  const asserted = dated('asserted date', ...(shape.asserted ?? ([-9700, -9500] as const)))
  const others = (shape.others ?? [['radiocarbon', -800, -500] as const]).map((row) => dated(...row))
  const measured = shape.measuredLength ?? true
  const line = shape.lineDeg ?? { value: 57.9077, sd: 1 / 60 }
  return {
    datestone: '0.1.0',
    made_on: '2026-06-01',
    file: 'thornmere.yaml',
    input_sha256: '0'.repeat(64),
    attachments: [],
    claim: {},
    statement:
      'The east pillar of the Thornmere court marked midsummer sunrise exactly, so it was built then.',
    source: null,
    structure: { name: 'Thornmere court', latitude_deg: 41.27, longitude_deg: 23.1, elevation_m: 0 },
    asserted,
    other_dates: others,
    assumed_precision_arcmin: shape.assumed === undefined ? 0 : shape.assumed,
    plausible: shape.plausible ?? { low_arcmin: 10, high_arcmin: 60, stated: true },
    window,
    outcome: shape.outcome ?? 'premise',
    summary: [],
    findings: [],
    assumptions: [],
    sightlines: [{ ...sightlineOf(line), ...shape.sightline }],
    plan: { north: null, points: [], lines: [] },
    placements: [],
    tracks: shape.tracks ?? [trackOf('vondrak2011', line, 0), trackOf('laskar2004', line, 1)],
    implied: shape.implied ?? [impliedOf(crossings(line.value))],
    checks: [],
    reproduction: [],
    sweep: {
      window,
      marker: { distance_m: 100, measured },
      steps: shape.steps ?? stepsFrom(() => [[window.from, window.to]]),
      no_target: shape.noTarget ?? [],
    },
    second_window: { window, half_bit_arcmin: null, steps: [] },
    limits: (shape.limits ?? []).map((limit) => ({ ...NO_LIMIT, ...limit })),
    budget: [],
    budget_check: null,
    alternatives: [],
    chance: null,
    today: [],
    warnings: [],
    references: [],
  }
}

/** A sweep of which the 95 % sets are given, and the 68 % sets too or as the middle 70 % of each part. */
export function stepsFrom(
  sets95: (tolerance: number) => Sets,
  sets68?: (tolerance: number) => Sets,
): SweepStep[] {
  return TOLERANCES.map((tolerance) => stepAt(tolerance, sets95(tolerance), sets68?.(tolerance)))
}

export function stepAt(tolerance: number, sets95: Sets, sets68: Sets = sets95.map(middlePart)): SweepStep {
  return {
    tolerance_arcmin: tolerance,
    tolerance_cm: 10_000 * Math.tan((tolerance / 60) * (Math.PI / 180)),
    tolerance_sun_widths: tolerance / 32.4,
    in_table: false,
    sets68,
    sets95,
    open_low: false,
    open_high: false,
    bits: 1,
    ratios: [],
  }
}

/** Between sets known at some tolerances: straight in the logarithm of the tolerance, part by part. */
export function between(anchors: readonly (readonly [tolerance: number, sets: Sets])[]): (t: number) => Sets {
  return (tolerance) => {
    const after = anchors.findIndex(([at]) => at >= tolerance)
    const [t1, s1] = anchors[after < 0 ? anchors.length - 1 : after]!
    if (after <= 0 || t1 === tolerance) return s1
    const [t0, s0] = anchors[after - 1]!
    if (s0.length !== s1.length) return s0
    const share = Math.log(Math.max(tolerance, 0.4) / Math.max(t0, 0.4)) / Math.log(t1 / Math.max(t0, 0.4))
    const mix = (a: number, b: number) => a + (b - a) * share
    return s0.map(([a, b], part): [number, number] => [mix(a, s1[part]![0]), mix(b, s1[part]![1])])
  }
}

function middlePart([from, to]: readonly [number, number]): [number, number] {
  return [from + (to - from) * 0.15, to - (to - from) * 0.15]
}

const NO_LIMIT: Limit = {
  against: null,
  overlaps: false,
  ratio_3_arcmin: null,
  ratio_3_steady: null,
  other_date_in_95_arcmin: null,
  half_bit_arcmin: null,
  ratio_3_cm: null,
  other_date_in_95_cm: null,
  half_bit_cm: null,
  ratio_3_reason: null,
  other_date_in_95_reason: null,
  half_bit_reason: null,
}

function dated(label: string, from: number, to: number): DatedLabel {
  const printed = formatYearRange(from, to)
  return { label, text: printed, printed, from, to }
}

function windowOf([from, to]: readonly [number, number]): Window {
  return { from, to, printed: formatYearRange(from, to), stated: true }
}

function sightlineOf(line: { value: number; sd: number }): SightlineAudit {
  return {
    name: 'midsummer',
    body: 'sun',
    measures: 'azimuth',
    tolerance_scale: 1,
    event: 'June solstice sunrise',
    target: 'June solstice sunrise, upper limb on the horizon',
    azimuth_deg: line,
    angle_deg: null,
    survey: [],
    altitude_deg: { value: 1.5, sd: 0.033 },
    refraction_arcmin: { value: 20.3, sd: 2 },
    solstices: null,
    refraction_check: null,
    skyline: null,
    semidiameter_arcmin: { value: 16.31, sd: 0.01 },
    centre_altitude_deg: { value: 0.9, sd: 0.05 },
    declination_deg: { value: 24.2, sd: 0.05 },
    air: null,
    length_m: 100,
    direction_at_asserted_deg: 57.9077,
    offset_at_asserted_arcmin: 0,
    offset_at_asserted_sd_arcmin: 2.5,
    closest_in_asserted: { year: -9600, offset_arcmin: 0, sd_arcmin: 2.5 },
    drift: null,
    notes: [
      'Around the solstice the Sun’s place on the horizon stays within 1′ of its extreme for 9.3 days.',
    ],
    sweep: null,
  }
}

const LEAST = 7390
const PERIOD = 41_000

/** A wave of 41,000 years with its least azimuth about 7400 BCE, as the obliquity has it; `late` shifts it a little. */
export function trackOf(model: string, line: { value: number; sd: number }, late: number): Track {
  const azimuth = (year: number) => azimuthOf(year) + late * 0.03 * Math.max(0, (-4000 - year) / 14_000) ** 2
  return courseOf(model, line, azimuth)
}

/** A track by any course of directions, over the years that all tracks have, or over part of them. */
export function courseOf(
  model: string,
  line: { value: number; sd: number },
  direction: (year: number) => number | null,
  {
    from = -30_000,
    to = 12_100,
    sd = 2.5,
    ...rest
  }: Partial<Track> & { from?: number; to?: number; sd?: number } = {},
): Track {
  const years = Array.from({ length: Math.round((to - from) / 50) + 1 }, (_, i) => from + 50 * i)
  const directions = years.map(direction)
  return {
    sightline: 'midsummer',
    model,
    years,
    branch: 0,
    branch_words: null,
    direction_deg: directions.map((deg) => (deg === null ? null : ((deg % 360) + 360) % 360)),
    sd_arcmin: directions.map((deg) => (deg === null ? null : sd)),
    line_deg: line,
    ...rest,
  }
}

function azimuthOf(year: number): number {
  return 59.3 - 1.45 * Math.cos(((year + LEAST) / PERIOD) * 2 * Math.PI)
}

/** The years from 30,001 BCE to 12,026 CE in which that wave meets a line. */
export function crossings(lineDeg: number): number[] {
  const half = (Math.acos((59.3 - lineDeg) / 1.45) * PERIOD) / (2 * Math.PI)
  return [-2, -1, 0, 1, 2]
    .flatMap((turn) => [turn * PERIOD - LEAST - half, turn * PERIOD - LEAST + half])
    .filter((year) => year >= -30_000 && year <= 12_026)
}

export function impliedOf(years: readonly number[], approach: Implied['nearest_approach'] = null): Implied {
  const dates = years.map(
    (year): ImpliedDate => ({
      year,
      low95: year - 800,
      high95: year + 800,
      in_window: year >= -20_000 && year <= 2026,
      future: year > 2026,
    }),
  )
  return { sightline: 'midsummer', model: 'vondrak2011', dates, nearest_approach: approach }
}

/** Where a course of directions crosses a line, to the year; directions less than 90° off it. */
export function yearsOnLine(direction: (year: number) => number | null, lineDeg: number): number[] {
  const offset = (year: number) => {
    const deg = direction(year)
    return deg === null ? null : ((((deg - lineDeg) % 360) + 540) % 360) - 180
  }
  const years = Array.from({ length: 42_100 }, (_, i) => i - 30_000)
  return years.filter((year) => {
    const [before, after] = [offset(year), offset(year + 1)]
    if (before === null || after === null || Math.abs(before) > 90) return false
    return before === 0 || before * after < 0
  })
}

/** Stretches about some years, each so long to either side; those that touch are one. */
export function stretchesAbout(
  years: readonly number[],
  half: number,
  [from, to]: readonly [number, number],
): Sets {
  const merged: [number, number][] = []
  for (const year of years.toSorted((a, b) => a - b)) {
    const [low, high] = [Math.max(from, year - half), Math.min(to, year + half)]
    if (high <= low) continue
    const last = merged.at(-1)
    if (last !== undefined && low <= last[1]) last[1] = Math.max(last[1], high)
    else merged.push([low, high])
  }
  return merged
}
