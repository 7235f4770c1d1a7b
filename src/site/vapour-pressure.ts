import type { Air } from './air.ts'

/**
 * Pressure of saturated water vapour over water, in air of a pressure, hPa: Gill 1982, Atmosphere–Ocean Dynamics,
 * equations A4.5 to A4.7, as Hohenkerk & Sinclair 1985 quote it. From −40 °C to 40 °C to 0.2 %.
 */
export function saturatedVapourPressureHpa(temperatureC: number, pressureHpa: number): number {
  const t = temperatureC
  return 10 ** ((0.7859 + 0.03477 * t) / (1 + 0.00412 * t)) * (1 + pressureHpa * (4.5e-6 + 6e-10 * t * t))
}

/**
 * Partial pressure of water vapour at the observer, hPa, from the relative humidity as a ratio of masses of vapour to
 * dry air (H&S 1985): e = f s/(1 − (1 − f) s/P).
 */
export function vapourPressureHpa({ temperatureC, pressureHpa, humidity }: Air): number {
  const saturated = saturatedVapourPressureHpa(temperatureC, pressureHpa)
  return (humidity * saturated) / (1 - ((1 - humidity) * saturated) / pressureHpa)
}
