import type { Claim, Sightline } from '../claim/claim.ts'
import { wrap360 } from '../quantity/degrees.ts'
import { isUnstated } from '../quantity/unstated.ts'
import { type Air, STANDARD_LAPSE_K_PER_KM, standardPressureHpa, standardTemperatureC } from '../site/air.ts'
import { lineDirection } from '../site/line-direction.ts'
import { refractionScatterArcmin } from '../site/refraction-scatter.ts'
import { DEFAULTS } from './defaults.ts'
import type { Refraction, SightlineInputs } from './sightline-inputs.ts'

/** A stated value, or the default that stands in for it. */
export function statedOr<T>(value: T | 'omitted' | 'unknown', fallback: T): T {
  return isUnstated(value) ? fallback : (value as T)
}

/** Fills every gap of one sightline of a claim with its default. */
export function settleSightline(claim: Claim, sightline: Sightline): SightlineInputs {
  const { horizonDeg: horizon, target } = sightline
  const horizonDeg = isUnstated(horizon) ? 0 : horizon.value
  return {
    name: sightline.name,
    event: target.event,
    at: target.at,
    disc: statedOr(target.disc, { part: DEFAULTS.disc }),
    latitudeDeg: claim.structure.latitudeDeg,
    ...directionOf(claim, sightline),
    horizonDeg,
    horizonSdDeg: isUnstated(horizon)
      ? DEFAULTS.unknownHorizonSdDeg
      : statedOr(horizon.sd, DEFAULTS.horizonSdDeg),
    refraction: refractionOf(claim),
    refractionSdArcmin: statedOr(
      claim.atmosphere.refractionUncertaintyArcmin,
      refractionScatterArcmin(horizonDeg),
    ),
    model: 'vondrak2011',
  }
}

type Direction = Pick<SightlineInputs, 'azimuthDeg' | 'azimuthSdDeg' | 'northSdDeg' | 'lengthM'>

function directionOf(claim: Claim, { direction }: Sightline): Direction {
  if (direction.by === 'azimuth') {
    return {
      azimuthDeg: wrap360(direction.azimuthDeg.value),
      azimuthSdDeg: statedOr(direction.azimuthDeg.sd, DEFAULTS.azimuthSdDeg),
      northSdDeg: 0,
      lengthM: null,
    }
  }
  const line = lineDirection(surveyed(claim, direction.from), surveyed(claim, direction.to))
  return {
    azimuthDeg: line.azimuthDeg,
    azimuthSdDeg: line.sdDeg,
    northSdDeg: northSdDeg(claim),
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
