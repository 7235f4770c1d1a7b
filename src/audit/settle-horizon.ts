import type { Claim, Direction, Horizon } from '../claim/claim.ts'
import { formatDegrees } from '../quantity/format-angle.ts'
import { formatCm } from '../quantity/format-length.ts'
import type { Measured } from '../quantity/measured.ts'
import { isUnstated, type Unstated } from '../quantity/unstated.ts'
import { horizonFromDistance } from '../site/horizon-from-distance.ts'
import { seaDip } from '../site/sea-dip.ts'
import { skylineAltitude, skylineOf } from '../site/skyline.ts'
import { TERRESTRIAL_REFRACTION } from '../site/terrestrial-refraction.ts'
import { DEFAULTS } from './defaults.ts'
import type { SettledHorizon, SightlineInputs } from './sightline-inputs.ts'
import { statedOr } from './stated-or.ts'
import { pointNamed, pointSdM } from './survey/place-of-point.ts'
import { surveyedLine } from './survey/surveyed-line.ts'

type HorizonInputs = Pick<SightlineInputs, 'horizonDeg' | 'horizonSdDeg' | 'horizon'>

/**
 * The horizon where a line meets the sky: its apparent altitude there with its standard deviation, and the skyline to
 * both sides where a profile has it.
 *
 * @param azimuthDeg Of the line; null for one of unknown direction, which no profile can be read at.
 */
export function settleHorizon(
  claim: Claim,
  horizon: Horizon | Unstated,
  direction: Direction,
  azimuthDeg: number | null,
): HorizonInputs {
  if (isUnstated(horizon)) {
    return settled({ deg: 0, sdDeg: DEFAULTS.unknownHorizonSdDeg }, 'level', 'taken as level')
  }
  switch (horizon.by) {
    case 'altitude': {
      const { value, sd } = horizon.altitudeDeg
      return settled({ deg: value, sdDeg: statedOr(sd, DEFAULTS.horizonSdDeg) }, 'altitude', 'as measured')
    }
    case 'distance':
      return byDistance(horizon.distanceM, horizon.riseM)
    case 'point':
      return ofPoint(claim, horizon.point, direction)
    case 'sea': {
      const { value, sd } = horizon.eyeM
      const words = `the sea’s, seen from ${formatCm(value * 100)} above it`
      return settled(seaDip(value, statedOr(sd, DEFAULTS.eyeSdM)), 'sea', words)
    }
    case 'profile':
      return ofProfile(horizon, azimuthDeg)
  }
}

function settled(
  { deg, sdDeg }: { deg: number; sdDeg: number },
  from: SettledHorizon['from'],
  words: string,
  distanceM: number | null = null,
): HorizonInputs {
  return { horizonDeg: deg, horizonSdDeg: sdDeg, horizon: { from, words, distanceM, nodes: null } }
}

function byDistance(distance: Measured, rise: Measured): HorizonInputs {
  const altitude = horizonFromDistance({
    distanceM: distance.value,
    distanceSdM: statedOr(distance.sd, DEFAULTS.distanceSdShare * distance.value),
    heightDifferenceM: rise.value,
    heightDifferenceSdM: statedOr(rise.sd, DEFAULTS.riseSdM),
  })
  return settled(altitude, 'distance', distanceWords(distance.value, rise.value), distance.value)
}

/** A point of the survey as the skyline: its height above that of the line's first point, over the distance between. */
function ofPoint(claim: Claim, name: string, direction: Direction): HorizonInputs {
  if (direction.by !== 'points') throw new Error('a point is the horizon of a line between points only')
  const [eye, skyline] = [pointNamed(claim, direction.from), pointNamed(claim, name)]
  if (eye.upM === null || skyline.upM === null) throw new Error('a point without height is no horizon')
  const { lengthM } = surveyedLine(claim, direction.from, name)
  const sdM = Math.hypot(pointSdM(eye), pointSdM(skyline))
  const rise = skyline.upM - eye.upM
  const altitude = horizonFromDistance({
    distanceM: lengthM,
    distanceSdM: sdM,
    heightDifferenceM: rise,
    heightDifferenceSdM: sdM,
  })
  return settled(altitude, 'point', `that of ${name}, ${distanceWords(lengthM, rise)}`, lengthM)
}

function distanceWords(distanceM: number, riseM: number): string {
  const side = riseM < 0 ? 'below' : 'above'
  return `${formatCm(distanceM * 100)} off and ${formatCm(Math.abs(riseM) * 100)} ${side} the eye, with the Earth’s curvature and a refraction coefficient of ${TERRESTRIAL_REFRACTION.coefficient}`
}

function ofProfile(horizon: Extract<Horizon, { by: 'profile' }>, azimuthDeg: number | null): HorizonInputs {
  const nodes = horizon.nodes.map((node) => ({ ...node, sdDeg: statedOr(node.sdDeg, DEFAULTS.horizonSdDeg) }))
  const skyline = skylineOf(nodes)
  const [first, last] = [nodes[0]!, nodes.at(-1)!]
  const reach = `${formatDegrees(first.azimuthDeg, 'minute')} to ${formatDegrees(last.azimuthDeg, 'minute')}`
  const words = `from the skyline in ${horizon.file}, ${nodes.length} points from ${reach}`
  const at = azimuthDeg === null ? null : skylineAltitude(skyline, azimuthDeg)
  // A line that the profile does not reach is told of in the warnings; the profile's mean stands in for its altitude.
  const mean = nodes.reduce((sum, { altitudeDeg }) => sum + altitudeDeg, 0) / nodes.length
  const altitude = at ?? { deg: mean, sdDeg: DEFAULTS.unknownHorizonSdDeg }
  return {
    ...settled(altitude, 'profile', words),
    horizon: { from: 'profile', words, distanceM: null, nodes },
  }
}
