import { isoDay, isoMinute, type SkyPlace } from './sky-place.ts'

/** The next chance to see a target for oneself. */
export interface NextSighting<Note = null> {
  /** Calendar day, ISO 8601: by the place's mean time, or of UTC where its longitude is not known. */
  date: string
  /** Instant to the minute, ISO 8601; null where the longitude is not known. */
  utc: string | null
  /** What else a person who goes to see it should know; null where there is nothing. */
  note: Note
}

/** Why there is no next chance. */
export type NoSighting =
  /** The Sun's declination never gets there. */
  | 'never at that declination'
  /** The body does not go down as far as the altitude. */
  | 'stays above that altitude'
  /** It does not come up to the altitude; on the meridian, to the horizon. */
  | 'stays below that altitude'
  /** It happens by daylight or in twilight on all days of a year. */
  | 'never on a dark night'
  /** The two stars never stand so above the horizon. */
  | 'never one above the other'

export type SoughtSighting<Sighting> =
  | { sighting: Sighting; because: null }
  | { sighting: null; because: NoSighting }

/** A sighting at an instant, told as exactly as the place is known. */
export function sightingAt<Note>({ longitudeDeg }: SkyPlace, utDays: number, note: Note): NextSighting<Note> {
  return {
    date: isoDay(utDays, longitudeDeg),
    utc: longitudeDeg === null ? null : isoMinute(utDays),
    note,
  }
}
