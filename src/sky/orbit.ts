import { cubicSpline } from './cubic-spline.ts'
import { LASKAR_2004_ORBIT } from './laskar-2004-table.ts'

/** Years for which the table of orbital elements answers. */
export const ORBIT_SPAN = { from: LASKAR_2004_ORBIT[0]![0], to: LASKAR_2004_ORBIT.at(-1)![0] }

const eccentricities = cubicSpline(LASKAR_2004_ORBIT.map(([year, e]) => [year, e]))
const perihelia = cubicSpline(unwrapped())

/**
 * Eccentricity of the Earth's orbit.
 *
 * @param year Julian epoch within `ORBIT_SPAN`.
 * Source: Laskar et al. 2004, A&A 428, 261, by cubic spline between the printed millennia.
 */
export function eccentricity(year: number): number {
  return eccentricities(year)
}

/**
 * Longitude of the perihelion of the Earth's orbit from the equinox of date, degrees, not reduced to one turn.
 * The Sun is nearest when its true longitude is this + 180°.
 *
 * @param year Julian epoch within `ORBIT_SPAN`.
 * Source: as `eccentricity`.
 */
export function perihelionDeg(year: number): number {
  return perihelia(year)
}

/** Years in which the last tabulated ellipse passes into a circle, of which nothing is known but its size. */
const TAPER_YEARS = 1000

/** Which share of what is not tabulated a year has: 0 within the table, 1 from 1,000 years beyond it on. */
export function shareBeyondTable(year: number): number {
  return Math.min(1, Math.abs(year - heldInTable(year)) / TAPER_YEARS)
}

/** The year itself within the table, else the table's nearest end. */
export function heldInTable(year: number): number {
  return Math.min(Math.max(year, ORBIT_SPAN.from), ORBIT_SPAN.to)
}

/** The perihelion's longitude grows by some 17° a millennium: add a turn wherever the table falls back. */
function unwrapped(): [number, number][] {
  let turns = 0
  let before = -Infinity
  return LASKAR_2004_ORBIT.map(([year, , longitude]) => {
    if (longitude + turns < before) turns += 360
    before = longitude + turns
    return [year, before]
  })
}
