import { DEG } from '../../src/quantity/degrees.ts'
import type { Air } from '../../src/site/air.ts'

const EARTH_RADIUS_M = 6_378_120
const TROPOPAUSE_M = 11_000
const TOP_M = 80_000
const STEP_M = 150
const DRY_PER_K = 8314.32 / 28.9644
const WATER_PER_K = 8314.32 / 18.0152

/** Radius, zenith distance of the ray, pressure, and the bend so far. */
type State = readonly [radius: number, zenithDistance: number, pressure: number, bend: number]

/**
 * Refraction by another way than the program's: the ray is walked step by step (Runge–Kutta) while the pressure is
 * found from the weight of the air below, dry and wet, instead of from closed formulas. The physics is that of
 * Hohenkerk & Sinclair 1985 (NAO Technical Note 63); arcminutes.
 */
export function traceRay(apparentAltitudeDeg: number, air: Air, latitudeDeg: number): number {
  const slopes = equations(air, latitudeDeg)
  let state: State = [EARTH_RADIUS_M + air.heightM, (90 - apparentAltitudeDeg) * DEG, air.pressureHpa, 0]
  while (state[0] < EARTH_RADIUS_M + TOP_M) state = step(state, slopes)
  return (state[3] / DEG) * 60
}

function step(state: State, slopes: (state: State) => State): State {
  const moved = (by: State, length: number) => state.map((x, i) => x + length * by[i]!) as unknown as State
  const first = slopes(state)
  const second = slopes(moved(first, STEP_M / 2))
  const third = slopes(moved(second, STEP_M / 2))
  const fourth = slopes(moved(third, STEP_M))
  return state.map(
    (x, i) => x + (STEP_M / 6) * (first[i]! + 2 * second[i]! + 2 * third[i]! + fourth[i]!),
  ) as unknown as State
}

function equations(air: Air, latitudeDeg: number): (state: State) => State {
  const ground = air.temperatureC + 273.15
  const gravity = 9.784 * (1 - 0.0026 * Math.cos(2 * latitudeDeg * DEG) - 2.8e-7 * air.heightM)
  const perPressure = ((287.604 + 1.6288 / 0.574 ** 2 + 0.0136 / 0.574 ** 4) * 1e-6 * 273.15) / 1013.25
  const vapourAtGround = vapourPressure(air)
  return ([radius, zenithDistance, pressure]) => {
    const height = radius - EARTH_RADIUS_M
    const lapse = height < TROPOPAUSE_M ? -air.lapseKPerKm / 1000 : 0
    const temperature = ground - (air.lapseKPerKm / 1000) * (Math.min(height, TROPOPAUSE_M) - air.heightM)
    const vapour = height < TROPOPAUSE_M ? vapourAtGround * (temperature / ground) ** 18.36 : 0
    const density = ((pressure - vapour) / DRY_PER_K + vapour / WATER_PER_K) / temperature
    const pressureSlope = -gravity * density
    const vapourSlope = (18.36 * vapour * lapse) / temperature
    const refractivity = (perPressure * pressure - 11.2684e-6 * vapour) / temperature
    const slope =
      (perPressure * pressureSlope - 11.2684e-6 * vapourSlope - refractivity * lapse) / temperature
    const bend = (-slope / (1 + refractivity)) * Math.sin(zenithDistance)
    const upwards = Math.cos(zenithDistance)
    return [upwards, bend - Math.sin(zenithDistance) / radius, pressureSlope * upwards, bend]
  }
}

/** Gill 1982, as Hohenkerk & Sinclair quote it; hPa. */
function vapourPressure({ temperatureC: t, pressureHpa, humidity }: Air): number {
  const overWater = 10 ** ((0.7859 + 0.03477 * t) / (1 + 0.00412 * t))
  const saturated = overWater * (1 + pressureHpa * (4.5e-6 + 6e-10 * t * t))
  return (humidity * saturated) / (1 - ((1 - humidity) * saturated) / pressureHpa)
}
