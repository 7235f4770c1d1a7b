/** The air at the observer. */
export interface Air {
  temperatureC: number
  pressureHpa: number
  /** Relative humidity, 0 to 1. */
  humidity: number
  /** Fall of temperature with height in the troposphere, K/km. */
  lapseKPerKm: number
  /** Height of the observer above sea level, metres. */
  heightM: number
}

/** The lapse rate of the standard atmosphere (ISO 2533, ICAO Doc 7488), K/km. */
export const STANDARD_LAPSE_K_PER_KM = 6.5

/** Pressure of the standard atmosphere at a height in metres, hPa (ISO 2533): 1013.25 (1 − 2.25577e−5 H)^5.25588. */
export function standardPressureHpa(heightM: number): number {
  return 1013.25 * (1 - 2.25577e-5 * heightM) ** 5.25588
}

/** Temperature of the standard atmosphere at a height in metres, °C (ISO 2533): 15 °C less 6.5 K/km. */
export function standardTemperatureC(heightM: number): number {
  return 15 - (STANDARD_LAPSE_K_PER_KM * heightM) / 1000
}
