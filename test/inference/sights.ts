import type { Straight } from '../../src/inference/comparison.ts'
import type { DateSample } from '../../src/inference/date-sample.ts'
import { horizonBranch, type Uncertain } from '../../src/inference/horizon-branch.ts'
import type { Branch, Sight } from '../../src/inference/sight.ts'
import { centreAltitudeDeg } from '../../src/site/centre-altitude.ts'
import { refractionArcmin } from '../../src/site/refraction.ts'
import {
  modelSpreadSdDeg,
  NUTATION_SD_DEG,
  solsticeDeclinationDeg,
} from '../../src/sky/solstice-declination.ts'
import { SUN_PARALLAX_ARCSEC, sunSemidiameter } from '../../src/sky/sun.ts'

/** A line and the body that rises or sets on it, with one error of each kind: what most tests vary. Degrees. */
export interface HorizonLine {
  latitudeDeg: number
  at: 'rising' | 'setting'
  azimuthDeg: number
  azimuthSdDeg: number
  northSdDeg: number
  axis: string | null
  altitudeDeg: (year: number) => number
  altitudeSdDeg: (year: number) => number
  declinationDeg: (year: number) => number
  declinationSdDeg: (year: number) => number
  /** −1 where a larger obliquity takes the body south. */
  declinationSign: 1 | -1
}

/** The line as the inference sees it. The error of the declination is the obliquity's, which other lines share. */
export function horizonSight(line: HorizonLine): Sight {
  const altitude = (year: number): Uncertain => ({
    deg: line.altitudeDeg(year),
    errors: [{ source: 'altitude', sdDeg: line.altitudeSdDeg(year) }],
  })
  const declination = (year: number): Uncertain => ({
    deg: line.declinationDeg(year),
    errors: [
      { source: 'declination', sdDeg: line.declinationSign * line.declinationSdDeg(year), shared: true },
    ],
  })
  return {
    name: 'line',
    measures: 'azimuth',
    measuredDeg: line.azimuthDeg,
    axis: line.axis,
    toleranceScale: 1,
    northOf: 'plan',
    measuredSdDeg: line.azimuthSdDeg,
    northSdDeg: line.northSdDeg,
    branches: [horizonBranch({ latitudeDeg: line.latitudeDeg, at: line.at, altitude, declination })],
  }
}

/** The branch of a sight that has one only. */
export function onlyBranch({ branches }: Sight): Branch {
  const [branch, ...others] = branches
  if (branch === undefined || others.length > 0) throw new Error(`want one branch, got ${branches.length}`)
  return branch
}

/** Direction that an exact line would have had in a year; null where the target is not to be seen. */
export function directionDeg(sight: Sight, year: number): number | null {
  return onlyBranch(sight).predict(year)?.directionDeg ?? null
}

/** Refraction of the worked case: dry air of 10 °C and 1010 hPa at sea level, at a horizon of 1.5°. */
const WORKED_REFRACTION_ARCMIN = refractionArcmin(
  1.5,
  { temperatureC: 10, pressureHpa: 1010, humidity: 0, lapseKPerKm: 6.5, heightM: 0 },
  41.27,
)

/** The worked case of the method notes of this project, section 8, with exactly the errors it names. */
export const WORKED_LINE: HorizonLine = {
  latitudeDeg: 41.27,
  at: 'rising',
  azimuthDeg: 57.9077,
  azimuthSdDeg: 1 / 60,
  northSdDeg: 0,
  axis: null,
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
export const WORKED_LINE_WITH_MODELS: HorizonLine = {
  ...WORKED_LINE,
  declinationSdDeg: (year) => Math.hypot(modelSpreadSdDeg(year), NUTATION_SD_DEG),
}

export const WORKED = horizonSight(WORKED_LINE)
export const WORKED_WITH_MODELS = horizonSight(WORKED_LINE_WITH_MODELS)

/**
 * A line from the equator over a level horizon, where the azimuth of a rising body is 90° less its declination: its
 * track is whatever function of the year is given.
 */
export function artificialLine(
  azimuthOfYear: (year: number) => number,
  changes: Partial<HorizonLine> = {},
): HorizonLine {
  return {
    latitudeDeg: 0,
    at: 'rising',
    azimuthDeg: 60,
    azimuthSdDeg: 0,
    northSdDeg: 0,
    axis: null,
    altitudeDeg: () => 0,
    altitudeSdDeg: () => 0,
    declinationDeg: (year) => 90 - azimuthOfYear(year),
    declinationSdDeg: () => 0,
    declinationSign: 1,
    ...changes,
  }
}

export function artificialSight(
  azimuthOfYear: (year: number) => number,
  changes: Partial<HorizonLine> = {},
): Sight {
  return horizonSight(artificialLine(azimuthOfYear, changes))
}

/** A branch whose direction is a function of the year, known without error; null where it is not to be seen. */
export function exactBranch(directionOfYear: (year: number) => number | null): Branch {
  return {
    predict: (year) => {
      const direction = directionOfYear(year)
      return direction === null ? null : { directionDeg: direction, errors: [] }
    },
  }
}

/** A line without a north of its own, measured at 60°, over branches as given. */
export function branchedSight(branches: readonly Branch[], changes: Partial<Sight> = {}): Sight {
  return {
    name: 'branched',
    measures: 'azimuth',
    measuredDeg: 60,
    axis: null,
    toleranceScale: 1,
    northOf: 'plan',
    measuredSdDeg: 0,
    northSdDeg: 0,
    branches,
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
    comparisons: Array.from(years, (year) => [[straightAt(offsetDeg(year), variance)]]),
  }
}

/** A straight comparison of a line that shares no error with others. */
export function straightAt(offsetDeg: number, variance: number): Straight {
  return {
    kind: 'straight',
    offsetDeg,
    variance,
    measuredVariance: 0,
    axis: null,
    toleranceScale: 1,
    northOf: 'plan',
    shared: [0, 0],
  }
}
