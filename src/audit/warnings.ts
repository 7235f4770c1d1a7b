import type { Claim, EllipsoidName, Sightline } from '../claim/claim.ts'
import { nearestOffset } from '../inference/comparison.ts'
import { DEG, wrap180, wrap360 } from '../quantity/degrees.ts'
import { formatArcmin } from '../quantity/format-angle.ts'
import { formatYearRange } from '../quantity/format-year.ts'
import { listed, listedShort } from '../quantity/listed.ts'
import { isUnstated } from '../quantity/unstated.ts'
import { bennettRefractionArcmin } from '../site/bennett.ts'
import { skylineWidthDeg } from '../site/skyline.ts'
import { OBLIQUITY_MODELS } from '../sky/obliquity-models.ts'
import { ORBIT_SPAN } from '../sky/orbit.ts'
import type { DatedLabel, Implied, Sweep } from './audit.ts'
import { middle } from './dated-label.ts'
import { DEFAULTS } from './defaults.ts'
import { isUnsteady } from './is-unsteady.ts'
import { jointLines } from './joint-lines.ts'
import { refractionAtHorizon } from './refraction-at.ts'
import type { SettledClaim } from './settle-claim.ts'
import { sightOf } from './sight-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { targetModel } from './targets/target-model.ts'

/** What is doubtful about an audit but was computed all the same; shown in the report. */
export function listWarnings(
  claim: Claim,
  settled: SettledClaim,
  implied: readonly Implied[],
  sweep: Sweep,
  readingWarnings: readonly string[],
): string[] {
  const { dates, lines } = settled
  return [
    ...readingWarnings,
    ...(isOfSun(lines) ? beyondOrbit(dates.asserted) : []),
    ...beyondFormula(claim, dates.asserted),
    ...bearingTaken(claim, lines[0]!),
    ...claim.sightlines.flatMap((sightline, i) => mixedDatums(claim, sightline, lines[i]!)),
    ...lines.flatMap(refractionParts),
    ...new Set(lines.flatMap((line) => targetModel(line).warnings)),
    ...lines.flatMap((line) => [
      ...impossibleHorizon(claim, line),
      ...hopeless(line),
      ...nearMeridian(line, dates),
      ...beyondProfile(line, dates),
      ...reversed(line, dates),
    ]),
    ...(isOfSun(lines) ? datesBeyondOrbit(implied) : []),
    ...unreached(sweep),
    ...leftOut(lines),
    ...(lines.length > 1 ? [SEVERAL] : []),
  ]
}

const SEVERAL =
  'Several lines are read together: they share the errors of north and of the obliquity, and lines between the same two points their build error; otherwise each is taken to have been built and surveyed with errors of its own, also where two lines share one end.'

/** An angle of lines that are read by themselves too. */
function leftOut(lines: readonly SightlineInputs[]): string[] {
  const joint = jointLines(lines)
  return lines
    .filter((line) => !joint.includes(line))
    .map(
      ({ name }) =>
        `Line ${name} is an angle of which a line stands in the claim already: it is told of by itself, and left out where lines are read together, so that nothing counts twice.`,
    )
}

function beyondOrbit({ printed, from, to }: DatedLabel) {
  if (ORBIT_SPAN.from <= from && to <= ORBIT_SPAN.to) return []
  const span = formatYearRange(ORBIT_SPAN.from, ORBIT_SPAN.to)
  return [
    `The table of the Earth’s orbit covers ${span}; for ${printed} a mean size of the Sun is used, 15.99′ ± 0.27′.`,
  ]
}

/** A formula carried past the range it is good for. */
function beyondFormula({ formula }: Claim, { printed, from, to }: DatedLabel) {
  if (isUnstated(formula) || !('model' in formula)) return []
  const { label, range } = OBLIQUITY_MODELS[formula.model]
  if (range.from <= from && to <= range.to) return []
  return [
    `The claim’s formula, ${label}, is used for ${printed}, outside ${formatYearRange(range.from, range.to)} (${range.basis}).`,
  ]
}

/** A printed azimuth that is no azimuth but the bearing by the plan's or the grid's own north. */
function bearingTaken({ claimed }: Claim, { bearingDeg, measuredDeg }: SightlineInputs): string[] {
  const { azimuthDeg: printed } = claimed
  if (printed === null || bearingDeg === null) return []
  const from = (deg: number) => Math.abs(wrap180(printed.value - deg))
  if (from(bearingDeg) > 2 * printed.half || from(measuredDeg) <= 2 * printed.half) return []
  const turn = formatArcmin(Math.abs(wrap180(measuredDeg - bearingDeg)) * 60)
  return [
    `The azimuth that the source prints, ${printed.text}, is the line’s bearing by the survey’s own north, ${turn} off true north: it seems not to have been turned.`,
  ]
}

/** So far apart two datums commonly lie, metres. */
const DATUM_SHIFT_M = 100
/** Ellipsoids whose datums agree with WGS84 to metres. */
const MODERN: readonly EllipsoidName[] = ['WGS84', 'GRS80']

/** A line from a place on an old datum to one by latitude and longitude. */
function mixedDatums({ grid, points }: Claim, { direction }: Sightline, { name, lengthM }: SightlineInputs) {
  if (direction.by !== 'points' || grid?.by !== 'projection' || lengthM === null) return []
  const kinds = [direction.from, direction.to].map((point) => points.get(point)?.by)
  const isMixed = kinds.includes('grid') && !kinds.every((kind) => kind === 'grid')
  if (!isMixed || MODERN.includes(grid.projection.ellipsoid)) return []
  const turn = formatArcmin((Math.atan2(DATUM_SHIFT_M, lengthM) / DEG) * 60)
  return [
    `Line ${name} joins a place on ${grid.name} to one on WGS84. The two datums may lie some ${DATUM_SHIFT_M} m apart, which turns this line by up to ${turn}; that is not taken into account: give both ends in one of them.`,
  ]
}

/** The ray trace and Bennett’s formula part by about 1′ on the horizon; more than that wants a word. */
function refractionParts(line: SightlineInputs) {
  const { refraction, horizonDeg } = line
  if (refraction.by === 'claim' || horizonDeg < 0) return []
  const { temperatureC, pressureHpa } = refraction.air
  const difference =
    refractionAtHorizon(line).arcmin - bennettRefractionArcmin(horizonDeg, temperatureC, pressureHpa)
  if (Math.abs(difference) <= 2) return []
  return [
    `Line ${line.name}: the ray-traced refraction and Bennett’s formula part by ${formatArcmin(Math.abs(difference))} in this air.`,
  ]
}

/** No horizon lies lower than the sea's, seen from the height (1.76′ √H, the navigator's figure, with room to spare). */
function impossibleHorizon({ structure }: Claim, { name, measures, horizonDeg }: SightlineInputs) {
  const heightM = isUnstated(structure.elevationM) ? 0 : structure.elevationM
  const dipArcmin = 1.76 * Math.sqrt(Math.max(0, heightM) + LOWEST_LAND_M)
  if (measures === 'altitude' || horizonDeg * 60 > -dipArcmin) return []
  return [
    `Line ${name}: a horizon ${formatArcmin(-horizonDeg * 60)} below the level lies lower than any sea seen from that height; its refraction means nothing.`,
  ]
}

/** Room for land below sea level. */
const LOWEST_LAND_M = 450

/** A direction known to no better than this tells nothing, and the formulas for small errors no longer hold. */
const HOPELESS_DEG = 15

function hopeless({ name, measuredSdDeg, northSdDeg }: SightlineInputs): string[] {
  const sd = Math.hypot(measuredSdDeg, northSdDeg)
  if (sd <= HOPELESS_DEG) return []
  const size = sd > 180 ? 'any angle at all' : `± ${Math.round(sd)}°`
  return [
    `Line ${name}: by the uncertainties stated its direction is known to ${size}; it tells nothing. Is a unit wrong?`,
  ]
}

/** Where direction turns too fast with altitude for a straight sum of errors. */
function nearMeridian(line: SightlineInputs, { asserted }: SettledClaim['dates']) {
  if (!isUnsteady(line, middle(asserted))) return []
  if (line.pair !== null) {
    return [
      `Line ${line.name}: one of its two solstices is met close to the meridian or over a broken skyline, where direction does not answer errors in proportion. The weights of an angle take it as if it did; they are not to be trusted here.`,
    ]
  }
  if (line.horizon.nodes !== null) {
    return [
      `Line ${line.name} meets its target where the skyline is broken: a small error of altitude or a few centuries take the gleam from one summit or notch to the next. The weights are integrated over the errors there; single dates and the budget are not to be trusted.`,
    ]
  }
  return [
    `Line ${line.name} meets its target close to the meridian, where a small error of altitude turns the direction far: its dates hang on that error. The weights are integrated over the altitude there; single dates and the budget are not to be trusted.`,
  ]
}

/** Where the skyline to the target's side is not known any more. */
function beyondProfile(line: SightlineInputs, dates: SettledClaim['dates']): string[] {
  const { pair } = line
  if (pair !== null) {
    return [
      ...beyondProfile({ ...pair.june, name: `${line.name} (June)` }, dates),
      ...beyondProfile({ ...pair.december, name: `${line.name} (December)` }, dates),
    ]
  }
  const { asserted, others } = dates
  const { nodes } = line.horizon
  if (nodes === null) return []
  const [first, width] = [nodes[0]!.azimuthDeg, skylineWidthDeg(nodes)]
  const isOutside = (azimuthDeg: number) => wrap360(azimuthDeg - first) > width
  const sight = sightOf(line)
  const missed = [asserted, ...others].filter((date) => {
    const direction = nearestOffset(sight, middle(date))?.directionDeg
    return direction !== undefined && isOutside(direction)
  })
  const places = [
    ...(isOutside(line.measuredDeg) ? ['the line itself'] : []),
    ...missed.map(({ printed }) => `the place of the target in ${printed}`),
  ]
  if (places.length === 0) return []
  return [
    `Line ${line.name}: the skyline profile does not reach ${listed(places)}; beyond its ends the skyline is taken to go on level, ± ${formatArcmin(DEFAULTS.unknownHorizonSdDeg * 60)}.`,
  ]
}

/** A line that points the opposite way most likely has its ends, or rising and setting, exchanged. */
function reversed(line: SightlineInputs, { asserted }: SettledClaim['dates']) {
  const offset = nearestOffset(sightOf(line), middle(asserted))
  if (line.measures !== 'azimuth' || offset === null || Math.abs(offset.offsetDeg) < 90) return []
  return [
    `Line ${line.name} points away from its target, ${Math.round(Math.abs(offset.offsetDeg))}° off: are its ends exchanged, or rising and setting?`,
  ]
}

/** Dates found where the Sun's size is no longer tabulated. */
function datesBeyondOrbit(implied: readonly Implied[]) {
  const isBeyond = implied.some(({ dates }) =>
    dates.some(({ year }) => year < ORBIT_SPAN.from || year > ORBIT_SPAN.to),
  )
  if (!isBeyond) return []
  const span = formatYearRange(ORBIT_SPAN.from, ORBIT_SPAN.to)
  return [
    `Dates outside ${span} rest on a mean size of the Sun, 15.99′ ± 0.27′, since the table of the Earth’s orbit ends there.`,
  ]
}

/** Years in which a target is not to be seen at its altitude. */
function unreached({ no_target }: Sweep) {
  if (no_target.length === 0) return []
  const stretches = listedShort(
    no_target.map(([from, to]) => formatYearRange(from, to)),
    4,
  )
  return [
    `In ${stretches} the target does not come to that altitude; these years have no weight, or only what errors of altitude give them.`,
  ]
}

function isOfSun(lines: readonly SightlineInputs[]): boolean {
  return lines.some(({ target }) => target.body === 'sun' || target.body === 'sun at both solstices')
}
