import type { Claim, Direction, Horizon, Sightline } from '../claim/claim.ts'
import { wrap360 } from '../quantity/degrees.ts'
import { isUnstated, type Unstated } from '../quantity/unstated.ts'
import { type Air, STANDARD_LAPSE_K_PER_KM, standardPressureHpa, standardTemperatureC } from '../site/air.ts'
import { refractionScatterArcmin } from '../site/refraction-scatter.ts'
import { firstVisibility } from '../sky/first-visibility.ts'
import { DEFAULTS } from './defaults.ts'
import { settleHorizon } from './settle-horizon.ts'
import { settleTarget } from './settle-target.ts'
import type { Refraction, SettledTarget, SightlineInputs } from './sightline-inputs.ts'
import { statedOr } from './stated-or.ts'
import { endsOf, turnByParts } from './survey/ends.ts'
import { surveyedLine } from './survey/surveyed-line.ts'
import { surveyedSpan } from './survey/surveyed-span.ts'

/** Fills every gap of one sightline of a claim with its default. */
export function settleSightline(claim: Claim, sightline: Sightline): SightlineInputs {
  const { direction } = sightline
  const target = settleTarget(sightline.target)
  switch (direction.by) {
    case 'altitude':
      return onMeridian(claim, sightline, direction, target)
    case 'azimuth': {
      const azimuth = {
        measuredDeg: wrap360(direction.azimuthDeg.value),
        measuredSdDeg: statedOr(direction.azimuthDeg.sd, DEFAULTS.azimuthSdDeg),
        northSdDeg: 0,
        northOf: null,
        axis: null,
        ends: null,
        bearingDeg: null,
        survey: [],
        lengthM: null,
      }
      return alongHorizon(claim, sightline, azimuth, target)
    }
    case 'points':
      return alongHorizon(claim, sightline, betweenPoints(claim, direction), target)
    case 'span':
      return betweenSolstices(claim, sightline, direction, target)
  }
}

type Line = Pick<
  SightlineInputs,
  | 'measuredDeg'
  | 'measuredSdDeg'
  | 'northSdDeg'
  | 'northOf'
  | 'axis'
  | 'ends'
  | 'bearingDeg'
  | 'survey'
  | 'lengthM'
>

/** What all lines of a claim have alike. */
function common(claim: Claim, name: string, horizonDeg: number) {
  return {
    name,
    latitudeDeg: claim.structure.latitudeDeg,
    horizonShiftDeg: 0,
    pair: null,
    refraction: refractionOf(claim),
    refractionShiftArcmin: 0,
    refractionSdArcmin: statedOr(
      claim.atmosphere.refractionUncertaintyArcmin,
      refractionScatterArcmin(horizonDeg),
    ),
    isRefractionSdStated: !isUnstated(claim.atmosphere.refractionUncertaintyArcmin),
    model: 'vondrak2011' as const,
  }
}

function onMeridian(
  claim: Claim,
  { name }: Sightline,
  { altitudeDeg }: Extract<Direction, { by: 'altitude' }>,
  target: SettledTarget,
): SightlineInputs {
  const { value, sd } = altitudeDeg
  const measuredSdDeg = statedOr(sd, DEFAULTS.altitudeSdDeg)
  return {
    ...common(claim, name, value),
    target,
    measures: 'altitude',
    measuredDeg: value,
    measuredSdDeg,
    northSdDeg: 0,
    northOf: null,
    axis: null,
    ends: null,
    bearingDeg: null,
    survey: [],
    lengthM: null,
    horizonDeg: value,
    horizonSdDeg: measuredSdDeg,
    horizon: { from: 'altitude', words: 'as measured', distanceM: null, nodes: null },
  }
}

function alongHorizon(
  claim: Claim,
  { name, horizon, direction }: Sightline,
  line: Line,
  target: SettledTarget,
): SightlineInputs {
  const met = settleHorizon(claim, horizon, direction, line.measuredDeg)
  const seenDeg = seenAtDeg(target, met.horizonDeg)
  return { ...common(claim, name, seenDeg), target, measures: 'azimuth', ...line, ...met }
}

/** Apparent altitude at which a target is seen: a star may be so well above the horizon. */
function seenAtDeg(target: SettledTarget, horizonDeg: number): number {
  if (target.body !== 'star') return horizonDeg
  const { star, sighted } = target
  if (sighted.by === 'altitude') return sighted.deg
  return Math.max(horizonDeg, firstVisibility(star.magnitude, sighted.rule)?.altitudeDeg ?? horizonDeg)
}

function betweenPoints(claim: Claim, direction: Extract<Direction, { by: 'points' }>): Line {
  const line = surveyedLine(claim, direction.from, direction.to)
  const ends = endsOf(claim, direction)
  return {
    measuredDeg: wrap360(line.azimuthDeg + turnByParts(ends, line.lengthM)),
    measuredSdDeg: line.sdDeg,
    northSdDeg: line.northSdDeg,
    northOf: line.northOf,
    axis: axisOf(direction.from, direction.to),
    ends,
    bearingDeg: line.bearingDeg,
    survey: line.steps,
    lengthM: line.lengthM,
  }
}

/** The angle between two lines, each of which is a line to one solstice with its own horizon. */
function betweenSolstices(
  claim: Claim,
  { name }: Sightline,
  { span, horizons }: Extract<Direction, { by: 'span' }>,
  target: SettledTarget,
): SightlineInputs {
  if (target.body !== 'sun at both solstices') throw new Error('a span is held against both solstices')
  const { at, disc } = target
  const angle = span.by === 'angle' ? statedAngle(span.angleDeg) : surveyedSpan(claim, span)
  const side = (solstice: 'june' | 'december') => {
    const own = { body: 'sun' as const, event: { name: `${solstice} solstice` as const }, at, disc }
    const leg = span.by === 'points' ? legOf(claim, span.from, span[solstice]) : NO_LEG
    return sideOfSpan(claim, name, horizons[solstice], leg, own)
  }
  const pair = { june: side('june'), december: side('december') }
  const horizonDeg = (pair.june.horizonDeg + pair.december.horizonDeg) / 2
  return {
    ...common(claim, name, horizonDeg),
    pair,
    target,
    measures: 'angle',
    measuredDeg: angle.angleDeg,
    measuredSdDeg: angle.sdDeg,
    northSdDeg: 0,
    northOf: null,
    axis: span.by === 'points' ? [span.from, span.june, span.december].join('\n') : null,
    ends: null,
    bearingDeg: null,
    survey: [],
    lengthM: null,
    horizonDeg,
    horizonSdDeg: Math.hypot(pair.june.horizonSdDeg, pair.december.horizonSdDeg) / 2,
    horizon: { from: 'altitude', words: 'one for each of its lines', distanceM: null, nodes: null },
  }
}

function statedAngle({ value, sd }: { value: number; sd: number | Unstated }) {
  return { angleDeg: value, sdDeg: statedOr(sd, DEFAULTS.azimuthSdDeg) }
}

/** One line of an angle. A skyline profile is read by its direction, which only points give. */
interface Leg {
  axis: string | null
  azimuthDeg: number | null
}

const NO_LEG: Leg = { axis: null, azimuthDeg: null }

function legOf(claim: Claim, from: string, to: string): Leg {
  return { axis: axisOf(from, to), azimuthDeg: surveyedLine(claim, from, to).azimuthDeg }
}

/** Names two points, whichever way round. */
function axisOf(from: string, to: string): string {
  return [from, to].sort().join('\n')
}

function sideOfSpan(
  claim: Claim,
  name: string,
  horizon: Horizon | Unstated,
  { axis, azimuthDeg }: Leg,
  target: SettledTarget,
): SightlineInputs {
  const line = {
    measuredDeg: azimuthDeg ?? 0,
    measuredSdDeg: 0,
    northSdDeg: 0,
    northOf: null,
    axis,
    ends: null,
    bearingDeg: null,
    survey: [],
    lengthM: null,
  }
  const direction: Direction = { by: 'azimuth', azimuthDeg: { value: azimuthDeg ?? 0, sd: 0 } }
  const met = settleHorizon(claim, horizon, direction, azimuthDeg)
  return { ...common(claim, name, met.horizonDeg), target, measures: 'azimuth', ...line, ...met }
}

function refractionOf(claim: Claim): Refraction {
  const given = claim.atmosphere.refractionArcmin
  return isUnstated(given) ? { by: 'ray trace', air: airOf(claim) } : { by: 'claim', arcmin: given }
}

/** The claim's air, with the standard atmosphere of its height for what it does not give. */
export function airOf({ atmosphere, structure }: Claim): Air {
  const heightM = statedOr(structure.elevationM, DEFAULTS.elevationM)
  return {
    heightM,
    temperatureC: statedOr(atmosphere.temperatureC, standardTemperatureC(heightM)),
    pressureHpa: statedOr(atmosphere.pressureHpa, standardPressureHpa(heightM)),
    humidity: statedOr(atmosphere.humidity, DEFAULTS.humidity),
    lapseKPerKm: statedOr(atmosphere.lapseKPerKm, STANDARD_LAPSE_K_PER_KM),
  }
}
