import { DEG, wrap180, wrap360 } from '../quantity/degrees.ts'
import { eccentricity, heldInTable, perihelionDeg, shareBeyondTable } from './orbit.ts'
import { SEMIDIAMETER_BEYOND_TABLE, TROPICAL_YEAR_DAYS } from './sun.ts'

/**
 * True longitude of the Sun from the equinox of date, degrees from 0 to 360, a number of days of 86,400 s after it
 * stood at another, by Kepler's equation in the ellipse of the epoch. The planets and the Moon, which the ellipse
 * leaves out, sway the Sun by up to 30″; in a year the ellipse turns by 1′, which moves it by 2″.
 *
 * @param year Julian epoch; beyond the orbit's table the last ellipse passes in 1,000 years into a circle, see
 *   `sunLongitudeSdDeg`.
 * @param days Negative for days before.
 */
export function sunLongitudeAfterDeg(year: number, fromDeg: number, days: number): number {
  return wrap360(trueLongitudeDeg(year, meanLongitudeDeg(year, fromDeg) + (360 * days) / TROPICAL_YEAR_DAYS))
}

/** Days of 86,400 s that the Sun takes from one true longitude to the next time it is at another; 0 to a year. */
export function daysBetweenLongitudes(year: number, fromDeg: number, toDeg: number): number {
  const way = wrap360(meanLongitudeDeg(year, toDeg) - meanLongitudeDeg(year, fromDeg))
  return (way * TROPICAL_YEAR_DAYS) / 360
}

/**
 * Standard deviation in degrees of a longitude reached from another: 0 within the orbit's table. From 1,000
 * years beyond it on the ellipse is unknown: an eccentricity as large as the semidiameter's spread there supposes, its perihelion anywhere. The
 * equation of the centre, 2e sin of the anomaly, then differs between two places Δ apart by 2√2 e sin(Δ/2) in root
 * mean square.
 */
export function sunLongitudeSdDeg(year: number, fromDeg: number, toDeg: number): number {
  const { arcmin, sdArcmin } = SEMIDIAMETER_BEYOND_TABLE
  const e = (Math.SQRT2 * sdArcmin) / arcmin
  return (
    (shareBeyondTable(year) * 2 * Math.SQRT2 * e * Math.abs(Math.sin(((toDeg - fromDeg) / 2) * DEG))) / DEG
  )
}

/** Eccentricity, and the perihelion's longitude in degrees; a jump where the table ends would be read as a crossing. */
function ellipseOf(year: number): { e: number; perihelion: number } {
  const held = heldInTable(year)
  return { e: (1 - shareBeyondTable(year)) * eccentricity(held), perihelion: perihelionDeg(held) }
}

/** The longitude the Sun would have at its mean speed, within 180° of the true one. */
function meanLongitudeDeg(year: number, trueDeg: number): number {
  const { e, perihelion } = ellipseOf(year)
  const anomalyDeg = trueDeg - perihelion - 180
  const anomaly = anomalyDeg * DEG
  const eccentric = Math.atan2(Math.sqrt(1 - e * e) * Math.sin(anomaly), e + Math.cos(anomaly))
  return trueDeg + wrap180((eccentric - e * Math.sin(eccentric)) / DEG - anomalyDeg)
}

function trueLongitudeDeg(year: number, meanDeg: number): number {
  const { e, perihelion } = ellipseOf(year)
  const anomalyDeg = meanDeg - perihelion - 180
  const eccentric = eccentricAnomaly(anomalyDeg * DEG, e)
  const anomaly = Math.atan2(Math.sqrt(1 - e * e) * Math.sin(eccentric), Math.cos(eccentric) - e)
  return meanDeg + wrap180(anomaly / DEG - anomalyDeg)
}

/** Solves Kepler's equation M = E − e sin E by Newton's steps: eccentricities of the Earth need three or four. */
function eccentricAnomaly(meanAnomaly: number, e: number): number {
  let eccentric = meanAnomaly
  for (let i = 0; i < 10; i++) {
    const step = (eccentric - e * Math.sin(eccentric) - meanAnomaly) / (1 - e * Math.cos(eccentric))
    eccentric -= step
    if (Math.abs(step) < 1e-14) break
  }
  return eccentric
}
