import { utDaysOf, YEARS_OF_PRESENT_SKY } from './present-sky.ts'

/** A place on the Earth from which the present sky is to be seen. */
export interface SkyPlace {
  /** Geographic latitude, degrees, north positive. */
  latitudeDeg: number
  /** Degrees, east positive; null where it is not known. */
  longitudeDeg: number | null
  /** Height above the sea, metres. */
  heightM: number
}

/** A place of which the longitude is known. */
export interface LocatedPlace extends SkyPlace {
  longitudeDeg: number
}

/**
 * The place with a longitude: Greenwich stands in for an unknown one. What is computed there is within half a day of
 * what happens at any other longitude of that latitude, which is why such an answer keeps its day alone.
 *
 * Throws a RangeError where the place is none on the Earth, or `now` is no time of the centuries in which
 * astronomy-engine is good.
 */
export function locatedPlace(place: SkyPlace, now: Date): LocatedPlace {
  const { latitudeDeg, longitudeDeg, heightM } = place
  if (!(Math.abs(latitudeDeg) <= 90))
    throw new RangeError(`latitude is ${latitudeDeg}°: give one from −90 to 90`)
  if (longitudeDeg !== null && !(Math.abs(longitudeDeg) <= 180))
    throw new RangeError(`longitude is ${longitudeDeg}°: give one from −180 to 180, east positive, or null`)
  if (!Number.isFinite(heightM)) throw new RangeError(`height is ${heightM} m: give a number of metres`)
  const { from, to } = YEARS_OF_PRESENT_SKY
  const year = now.getUTCFullYear()
  if (!(year >= from && year <= to))
    throw new RangeError(`now is in the year ${year}: give a date between ${from} and ${to}`)
  return { latitudeDeg, longitudeDeg: longitudeDeg ?? 0, heightM }
}

/** An instant as ISO 8601 writes it, to the nearest minute, such as `2027-06-21T14:11Z`. */
export function isoMinute(utDays: number): string {
  return `${new Date(roundedToMinute(utDays)).toISOString().slice(0, 16)}Z`
}

/**
 * Calendar day of an instant, such as `2027-06-21`, by the mean time of a longitude (UTC and a day for each 360°); null
 * gives the day of UTC. Clocks that keep another time may have another day near midnight.
 */
export function isoDay(utDays: number, longitudeDeg: number | null): string {
  const aheadMs = ((longitudeDeg ?? 0) / 360) * MS_PER_DAY
  return new Date(roundedToMinute(utDays) + aheadMs).toISOString().slice(0, 10)
}

const MS_PER_DAY = 86_400_000
const MS_PER_MINUTE = 60_000

function roundedToMinute(utDays: number): number {
  const sinceJ2000 = utDays - utDaysOf(new Date(0))
  return Math.round((sinceJ2000 * MS_PER_DAY) / MS_PER_MINUTE) * MS_PER_MINUTE
}
