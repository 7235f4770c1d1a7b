import type { Claim, Direction, Sightline } from '../claim/claim.ts'
import { wrap360 } from '../quantity/degrees.ts'
import { isUnstated } from '../quantity/unstated.ts'
import { type Air, STANDARD_LAPSE_K_PER_KM, standardPressureHpa, standardTemperatureC } from '../site/air.ts'
import { lineDirection } from '../site/line-direction.ts'
import { refractionScatterArcmin } from '../site/refraction-scatter.ts'
import { DEFAULTS } from './defaults.ts'
import { settleTarget } from './settle-target.ts'
import type { Refraction, SightlineInputs } from './sightline-inputs.ts'
import { statedOr } from './stated-or.ts'

/** Fills every gap of one sightline of a claim with its default. */
export function settleSightline(claim: Claim, sightline: Sightline): SightlineInputs {
  const line = lineOf(claim, sightline)
  return {
    name: sightline.name,
    target: settleTarget(sightline.target),
    latitudeDeg: claim.structure.latitudeDeg,
    ...line,
    refraction: refractionOf(claim),
    refractionShiftArcmin: 0,
    refractionSdArcmin: statedOr(
      claim.atmosphere.refractionUncertaintyArcmin,
      refractionScatterArcmin(line.horizonDeg),
    ),
    model: 'vondrak2011',
  }
}

type Line = Pick<
  SightlineInputs,
  | 'measures'
  | 'measuredDeg'
  | 'measuredSdDeg'
  | 'northSdDeg'
  | 'axis'
  | 'lengthM'
  | 'horizonDeg'
  | 'horizonSdDeg'
>

function lineOf(claim: Claim, { direction, horizonDeg: horizon }: Sightline): Line {
  if (direction.by === 'altitude') {
    const { value, sd } = direction.altitudeDeg
    const measuredSdDeg = statedOr(sd, DEFAULTS.altitudeSdDeg)
    return {
      measures: 'altitude',
      measuredDeg: value,
      measuredSdDeg,
      northSdDeg: 0,
      axis: null,
      lengthM: null,
      horizonDeg: value,
      horizonSdDeg: measuredSdDeg,
    }
  }
  return {
    measures: 'azimuth',
    ...azimuthOf(claim, direction),
    horizonDeg: isUnstated(horizon) ? 0 : horizon.value,
    horizonSdDeg: isUnstated(horizon)
      ? DEFAULTS.unknownHorizonSdDeg
      : statedOr(horizon.sd, DEFAULTS.horizonSdDeg),
  }
}

function azimuthOf(
  claim: Claim,
  direction: Exclude<Direction, { by: 'altitude' }>,
): Pick<SightlineInputs, 'measuredDeg' | 'measuredSdDeg' | 'northSdDeg' | 'axis' | 'lengthM'> {
  if (direction.by === 'azimuth') {
    return {
      measuredDeg: wrap360(direction.azimuthDeg.value),
      measuredSdDeg: statedOr(direction.azimuthDeg.sd, DEFAULTS.azimuthSdDeg),
      northSdDeg: 0,
      axis: null,
      lengthM: null,
    }
  }
  const line = lineDirection(surveyed(claim, direction.from), surveyed(claim, direction.to))
  return {
    measuredDeg: line.azimuthDeg,
    measuredSdDeg: line.sdDeg,
    northSdDeg: northSdDeg(claim),
    axis: [direction.from, direction.to].sort().join('\n'),
    lengthM: line.lengthM,
  }
}

/** The reader of the claim file has made sure that the point exists. */
function surveyed(claim: Claim, name: string) {
  const point = claim.points.get(name)
  if (point === undefined) throw new Error(`a claim without errors names no missing point: ${name}`)
  return { eastM: point.eastM, northM: point.northM, sdM: statedOr(point.uncertaintyM, DEFAULTS.pointSdM) }
}

/** A claim that says nothing of north offers its plan as true; one that says `unknown` is given a compass. */
export function northSdDeg({ north }: Claim): number {
  if (north === 'omitted') return 0
  if (north === 'unknown') return DEFAULTS.northSdDeg.compass
  return statedOr(north.uncertaintyDeg, DEFAULTS.northSdDeg[north.from])
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
