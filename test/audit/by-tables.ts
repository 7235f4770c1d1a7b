import { readTable } from '../published/read-table.ts'
import { readTextTable } from '../published/read-text-table.ts'

/**
 * Where targets stood by the published tables beside these tests and the plain rules of the method notes of this
 * project (sections 1 to 5), with none of the program's own functions. Angles in degrees unless a name says otherwise.
 */
const RAD = Math.PI / 180
const sin = (deg: number) => Math.sin(deg * RAD)
const cos = (deg: number) => Math.cos(deg * RAD)

/** Azimuth of a rising or setting: cos A = (sin δ − sin φ sin h)/(cos φ cos h). */
export function azimuthOf(
  declination: number,
  altitude: number,
  latitude: number,
  at: 'rising' | 'setting',
): number {
  const azimuth =
    Math.acos((sin(declination) - sin(latitude) * sin(altitude)) / (cos(latitude) * cos(altitude))) / RAD
  return at === 'rising' ? azimuth : 360 - azimuth
}

/** True altitude on the meridian. */
export function culminationOf(declination: number, latitude: number, which: 'upper' | 'lower'): number {
  return which === 'upper' ? 90 - Math.abs(latitude - declination) : Math.abs(latitude + declination) - 90
}

const REFRACTION = readTable('refraction.csv').filter(
  (row) => row.temperature_C === 15 && row.pressure_hPa === 1013.25 && row.height_m === 0,
)

/** Refraction at an apparent altitude that the table holds, for 15 °C and 1013.25 hPa at sea level; arcminutes. */
export function refractionArcmin(apparentAltitude: number): number {
  const row = REFRACTION.find((held) => held.apparent_altitude_deg === apparentAltitude)
  if (row === undefined) throw new Error(`no refraction at ${apparentAltitude}°`)
  return row.raytrace_arcmin!
}

/** From 20° up, between rows: as the cotangent, which is off by 0.02′ there. */
export function highRefractionArcmin(apparentAltitude: number): number {
  return refractionArcmin(45) / Math.tan(apparentAltitude * RAD)
}

function rowOf(table: string, year: number): Readonly<Record<string, number>> {
  const row = readTable(table).find((held) => held.year === year)
  if (row === undefined) throw new Error(`${table} has no ${year}`)
  return row
}

export function obliquityOf(year: number): number {
  return rowOf('obliquity.csv', year).vondrak2011!
}

/** Semidiameter of the Sun at a true longitude: 959.63″ over r = (1 − e²)/(1 + e cos ν); arcminutes. */
export function semidiameterArcmin(year: number, longitude: number): number {
  const { eccentricity: e, perihelion_deg: perihelion } = rowOf('orbit.csv', year)
  return ((959.63 / 60) * (1 + e! * cos(longitude - perihelion! - 180))) / (1 - e! * e!)
}

/** Mean longitude of the Sun where its true one is given, by Kepler's equation. */
function meanOf(year: number, longitude: number): number {
  const { eccentricity: e, perihelion_deg: perihelion } = rowOf('orbit.csv', year)
  const anomaly = longitude - perihelion! - 180
  const eccentric = 2 * Math.atan(Math.sqrt((1 - e!) / (1 + e!)) * Math.tan((anomaly * RAD) / 2))
  const mean = (eccentric - e! * Math.sin(eccentric)) / RAD
  return longitude + near0(mean - anomaly)
}

/** True longitude of the Sun some days of 86,400 s after it stood at another: the mean one undone by halving. */
export function longitudeAfter(year: number, from: number, days: number): number {
  const want = meanOf(year, from) + (360 * days) / 365.2422
  let [low, high] = [want - 5, want + 5]
  for (let i = 0; i < 60; i++) {
    const middle = (low + high) / 2
    if (meanOf(year, middle) < want) low = middle
    else high = middle
  }
  return low
}

/** Days from one true longitude to another ahead of it. */
export function daysBetween(year: number, from: number, to: number): number {
  return ((meanOf(year, to) - meanOf(year, from)) * 365.2422) / 360
}

/** Declination of the Sun at a true longitude: sin δ = sin ε sin λ. */
export function sunDeclination(year: number, longitude: number): number {
  return Math.asin(sin(obliquityOf(year)) * sin(longitude)) / RAD
}

/** Place of a star by another program: see the head of the table. */
export function starOf(name: string, year: number): { ra: number; declination: number } {
  const row = readTextTable('star-positions.csv').find(
    (held) => held.name === name && Number(held.year) === year,
  )
  if (row === undefined) throw new Error(`no place of ${name} in ${year}`)
  return { ra: Number(row.ra_deg), declination: Number(row.dec_deg) }
}

interface Place {
  azimuth: number
  altitude: number
}

function placeAt({ ra, declination }: ReturnType<typeof starOf>, sidereal: number, latitude: number): Place {
  const hour = sidereal - ra
  const altitude =
    Math.asin(sin(latitude) * sin(declination) + cos(latitude) * cos(declination) * cos(hour)) / RAD
  const azimuth =
    Math.atan2(
      -cos(declination) * sin(hour),
      sin(declination) * cos(latitude) - cos(declination) * cos(hour) * sin(latitude),
    ) / RAD
  return { azimuth, altitude }
}

/** The moments of a day at which two stars have one azimuth, found by going through it in steps of a minute. */
export function oneAboveOther(
  names: readonly [string, string],
  year: number,
  latitude: number,
): { azimuth: number; above: string }[] {
  const stars = names.map((name) => starOf(name, year))
  const gap = (sidereal: number) => {
    const [one, other] = stars.map((star) => placeAt(star, sidereal, latitude))
    return near0(one!.azimuth - other!.azimuth)
  }
  return Array.from({ length: 1440 }, (_, i) => i / 4).flatMap((from) => {
    let [low, high] = [from, from + 0.25]
    if (gap(low) * gap(high) > 0 || Math.abs(gap(low) - gap(high)) > 90) return []
    const sign = Math.sign(gap(low))
    for (let i = 0; i < 50; i++) {
      const middle = (low + high) / 2
      if (Math.sign(gap(middle)) === sign) low = middle
      else high = middle
    }
    const [one, other] = stars.map((star) => placeAt(star, low, latitude))
    return [{ azimuth: one!.azimuth, above: names[one!.altitude > other!.altitude ? 0 : 1] }]
  })
}

/** Altitude at which m + 0.25 X reaches magnitude 6, X = 1/(cos z + 0.025 e^(−11 cos z)). */
export function extinctionAltitude(magnitude: number): number {
  const airMass = (altitude: number) => 1 / (sin(altitude) + 0.025 * Math.exp(-11 * sin(altitude)))
  let [low, high] = [0, 90]
  for (let i = 0; i < 60; i++) {
    const middle = (low + high) / 2
    if (magnitude + 0.25 * airMass(middle) > 6) low = middle
    else high = middle
  }
  return high
}

/** From −180° to 180°. */
function near0(deg: number): number {
  return deg - 360 * Math.round(deg / 360)
}
