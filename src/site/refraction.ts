import { DEG } from '../quantity/degrees.ts'
import type { Air } from './air.ts'
import { vapourPressureHpa } from './vapour-pressure.ts'

/** Mean radius of the Earth, height of the tropopause above sea level and top of the atmosphere, metres (H&S 1985). */
const EARTH_RADIUS_M = 6_378_120
const TROPOPAUSE_M = 11_000
const TOP_M = 80_000
/** Below the lowest ground the index goes on at the gradient it has there: no ray that anybody sees comes so low. */
const LOWEST_M = -500

/** Molar gas constant per kmol, molar masses of dry air and of water vapour (H&S 1985). */
const GAS_CONSTANT = 8314.32
const DRY_AIR = 28.9644
const WATER = 18.0152
/**
 * What each hPa of water vapour in place of air takes from (n − 1) T, K/hPa: the 5.5e−8 per torr at 0 °C of the IUGG's
 * resolution of 1963 (H&S 1985). Birch & Downs 1994 find 6 % less at 20 °C: 0.02′ on the horizon in saturated air.
 */
const VAPOUR_REFRACTIVITY = 11.2684e-6
/** Exponent of the fall of water vapour pressure with temperature (H&S 1985). */
const VAPOUR_EXPONENT = 18.36

/** Middle of the visible light that the eye sees near the horizon, micrometres. */
const WAVELENGTH_UM = 0.574

/** Intervals of Simpson's rule in each layer: twice as many change no result by 0.001′. */
const INTERVALS = 64

/** Refractive index at a distance from the Earth's centre, and its derivative per metre. */
type Index = (radiusM: number) => readonly [number, number]

/**
 * Refraction at an apparent altitude, arcminutes, by numerical integration along the bent ray.
 *
 * R = ∫ (r dn/dr) / (n + r dn/dr) dψ with the zenith distance ψ along the ray as the variable, which keeps the
 * integrand smooth through the horizon (Auer & Standish 2000, AJ 119, 2472). The atmosphere is that of
 * Hohenkerk & Sinclair 1985 (NAO Technical Note 63): constant lapse to 11 km, isothermal above, to 80 km, with
 * water vapour from the relative humidity.
 *
 * @param apparentAltitudeDeg From −5° (a ray that first descends, from a height) to 90°.
 * @param latitudeDeg Only for gravity: 0.06′ between the equator and latitude 45° on the horizon.
 */
export function refractionArcmin(apparentAltitudeDeg: number, air: Air, latitudeDeg: number): number {
  // Straight up the angle stays the same all along the ray, which no integral over it can show.
  if (apparentAltitudeDeg === 90) return 0
  const startRadius = EARTH_RADIUS_M + air.heightM
  const { troposphere, stratosphere } = atmosphere(air, latitudeDeg)
  const zenithDistance = (90 - apparentAltitudeDeg) * DEG
  const invariant = troposphere(startRadius)[0] * startRadius * Math.sin(zenithDistance)
  const tropopause = EARTH_RADIUS_M + TROPOPAUSE_M
  const top = EARTH_RADIUS_M + TOP_M
  const below = bend(
    troposphere,
    invariant,
    startRadius,
    zenithDistance,
    angleAt(troposphere, invariant, tropopause),
  )
  const above = bend(
    stratosphere,
    invariant,
    tropopause,
    angleAt(stratosphere, invariant, tropopause),
    angleAt(stratosphere, invariant, top),
  )
  return ((below + above) / DEG) * 60
}

/** Zenith distance of the ray where it rises through a radius: n r sin ψ stays the same all along it. */
function angleAt(index: Index, invariant: number, radiusM: number): number {
  return Math.asin(Math.min(1, invariant / (index(radiusM)[0] * radiusM)))
}

/** The integral over one layer by Simpson's rule, radians, positive upwards. */
function bend(index: Index, invariant: number, startRadius: number, from: number, to: number): number {
  const step = (to - from) / INTERVALS
  let radius = startRadius
  let sum = 0
  for (let i = 0; i <= INTERVALS; i++) {
    const angle = from + i * step
    radius = radiusAt(index, invariant / Math.sin(angle), radius)
    const [n, slope] = index(radius)
    const weight = i === 0 || i === INTERVALS ? 1 : i % 2 === 1 ? 4 : 2
    sum += (weight * radius * slope) / (n + radius * slope)
  }
  return (sum * step) / 3
}

/** The radius at which n r takes a value, by Newton's method from a radius nearby. */
function radiusAt(index: Index, product: number, guess: number): number {
  let radius = guess
  for (let i = 0; i < 20; i++) {
    const [n, slope] = index(radius)
    const correction = (n * radius - product) / (n + radius * slope)
    radius -= correction
    if (Math.abs(correction) < 1e-6) break
  }
  return radius
}

/** The refractive index in both layers (H&S 1985, equations for light). */
function atmosphere(air: Air, latitudeDeg: number): { troposphere: Index; stratosphere: Index } {
  const lapse = air.lapseKPerKm / 1000
  const temperature = air.temperatureC + 273.15
  const gravity = 9.784 * (1 - 0.0026 * Math.cos(2 * latitudeDeg * DEG) - 2.8e-7 * air.heightM)
  const scale = (gravity * DRY_AIR) / GAS_CONSTANT
  const exponent = scale / lapse
  const vapour = vapourPressureHpa(air)
  const dryPart = (vapour * (1 - WATER / DRY_AIR) * exponent) / (VAPOUR_EXPONENT - exponent)
  const refractivity = lightRefractivity()
  const dry = (refractivity * (air.pressureHpa + dryPart)) / temperature
  const wet = (refractivity * dryPart + VAPOUR_REFRACTIVITY * vapour) / temperature
  const startRadius = EARTH_RADIUS_M + air.heightM
  const lowest = EARTH_RADIUS_M + LOWEST_M
  const troposphere: Index = (radius) => {
    const ratio = 1 - (lapse * (Math.max(radius, lowest) - startRadius)) / temperature
    const dryTerm = dry * ratio ** (exponent - 1)
    const wetTerm = wet * ratio ** (VAPOUR_EXPONENT - 1)
    const steepness = ((exponent - 1) * dryTerm - (VAPOUR_EXPONENT - 1) * wetTerm) / ratio
    const slope = (-lapse / temperature) * steepness
    return [1 + dryTerm - wetTerm + slope * Math.min(0, radius - lowest), slope]
  }
  const tropopause = EARTH_RADIUS_M + TROPOPAUSE_M
  const excess = troposphere(tropopause)[0] - 1
  const fall = scale / (temperature - lapse * (tropopause - startRadius))
  const stratosphere: Index = (radius) => {
    const rest = excess * Math.exp(-fall * (radius - tropopause))
    return [1 + rest, -fall * rest]
  }
  return { troposphere, stratosphere }
}

/** (n − 1) T/P of dry air for the wavelength, K/hPa (H&S 1985). */
function lightRefractivity(): number {
  const square = WAVELENGTH_UM ** 2
  return ((287.604 + 1.6288 / square + 0.0136 / square ** 2) * 1e-6 * 273.15) / 1013.25
}
