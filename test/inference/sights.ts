import type { DateSample } from '../../src/inference/date-sample.ts'
import type { Sight } from '../../src/inference/sight.ts'
import { centreAltitudeDeg } from '../../src/site/centre-altitude.ts'
import { refractionArcmin } from '../../src/site/refraction.ts'
import {
  modelSpreadSdDeg,
  NUTATION_SD_DEG,
  solsticeDeclinationDeg,
} from '../../src/sky/solstice-declination.ts'
import { SUN_PARALLAX_ARCSEC, sunSemidiameter } from '../../src/sky/sun.ts'

/** Refraction of the worked case: dry air of 10 °C and 1010 hPa at sea level, at a horizon of 1.5°. */
const WORKED_REFRACTION_ARCMIN = refractionArcmin(
  1.5,
  { temperatureC: 10, pressureHpa: 1010, humidity: 0, lapseKPerKm: 6.5, heightM: 0 },
  41.27,
)

/** The worked case of the method notes of this project, section 8, with exactly the errors it names. */
export const WORKED: Sight = {
  name: 'worked case',
  latitudeDeg: 41.27,
  at: 'rising',
  azimuthDeg: 57.9077,
  azimuthSdDeg: 1 / 60,
  northSdDeg: 0,
  altitudeDeg: (year) =>
    centreAltitudeDeg(
      1.5,
      WORKED_REFRACTION_ARCMIN,
      sunSemidiameter(year, 'june solstice').arcmin,
      SUN_PARALLAX_ARCSEC,
    ),
  altitudeSdDeg: () => 2 / 60,
  declinationDeg: (year) => solsticeDeclinationDeg(year, 'june solstice', 'vondrak2011'),
  declinationSdDeg: () => 0,
  declinationSign: 1,
}

/** The same with the two errors that the program adds: the spread of the models and nutation. */
export const WORKED_WITH_MODELS: Sight = {
  ...WORKED,
  declinationSdDeg: (year) => Math.hypot(modelSpreadSdDeg(year), NUTATION_SD_DEG),
}

/**
 * A sight from the equator over a level horizon, where the azimuth of a rising body is 90° less its declination: its
 * track is whatever function of the year is given.
 */
export function artificialSight(
  azimuthOfYear: (year: number) => number,
  changes: Partial<Sight> = {},
): Sight {
  return {
    name: 'artificial',
    latitudeDeg: 0,
    at: 'rising',
    azimuthDeg: 60,
    azimuthSdDeg: 0,
    northSdDeg: 0,
    altitudeDeg: () => 0,
    altitudeSdDeg: () => 0,
    declinationDeg: (year) => 90 - azimuthOfYear(year),
    declinationSdDeg: () => 0,
    declinationSign: 1,
    ...changes,
  }
}

/** A sample of dates whose line is off its target by a function of the year, with one variance at all of them. */
export function straightSample(
  from: number,
  to: number,
  steps: number,
  offsetDeg: (year: number) => number,
  variance: number,
): DateSample {
  const years = Float64Array.from(
    { length: steps + 1 },
    (_, i) => from + ((to - from) * i) / Math.max(1, steps),
  )
  const width = steps === 0 ? 1 : (to - from) / steps
  return {
    years,
    cells: years.map((_, i) => (steps > 0 && (i === 0 || i === steps) ? width / 2 : width)),
    comparisons: Array.from(years, (year) => [
      { kind: 'straight', offsetDeg: offsetDeg(year), variance, shared: [0, 0] },
    ]),
  }
}
