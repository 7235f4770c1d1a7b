import { crossingNear } from './altitude-crossing.ts'
import { STANDSTILL_CYCLE_YEARS, type StandstillEvent } from './moon.ts'
import { type NextSighting, type NoSighting, type SoughtSighting, sightingAt } from './next-sighting.ts'
import { julianEpochOf, moonLitShare, utDaysOf } from './present-sky.ts'
import { type LocatedPlace, locatedPlace, type SkyPlace } from './sky-place.ts'
import { type StandstillSeason, standstillSeason } from './standstill-season.ts'
import { isSunUp } from './sun-up.ts'

/** The Moon at a standstill where it is sighted. */
export interface MoonSight {
  standstill: StandstillEvent
  at: 'rising' | 'setting'
  /**
   * True altitude of the centre when it is sighted, degrees: topocentric and without air, so that the caller takes
   * refraction and semidiameter off and adds no parallax.
   */
  centreAltitudeDeg: number
}

export interface MoonNote {
  /** The lit part of the disc, 0 to 1: a thin crescent is hard to find low down, and lost by day. */
  litShare: number
  /** Whether the Sun is up at the sighting; null where the longitude is not known. */
  isSunUp: boolean | null
  /** Calendar years of the first and the last month of the season. */
  season: { fromYear: number; toYear: number }
}

/** The first of all. */
export interface MoonSighting extends NextSighting<MoonNote> {
  /** The first of the same season with the Sun down; null where there is none or the longitude is not known. */
  withSunDown: NextSighting<MoonNote> | null
}

/** A rising or setting lies so many days from its monthly extreme at most. */
const MOST_DAYS_OFF = 0.6

/**
 * The next rising or setting of the Moon at a standstill: the nearest to the first monthly extreme in the standstill's
 * season. Months that fall short by more than the season's margin, which its wobble brings about, are passed over.
 *
 * Throws a RangeError for an impossible place, altitude or date.
 */
export function nextMoonSighting(place: SkyPlace, sight: MoonSight, now: Date): SoughtSighting<MoonSighting> {
  const located = locatedPlace(place, now)
  if (!(Math.abs(sight.centreAltitudeDeg) <= 90))
    throw new RangeError(`altitude of the centre is ${sight.centreAltitudeDeg}°: give one from −90 to 90`)
  const start = utDaysOf(now)
  let because: NoSighting = 'stays below that altitude'
  // The season at hand may be as good as over; then there is the next.
  for (const from of [start, start + STANDSTILL_CYCLE_YEARS * 365.25]) {
    const season = standstillSeason(sight.standstill, from)
    const sighting = firstSightingIn(season, place, located, sight, start)
    if (typeof sighting === 'string') because = sighting
    else if (sighting !== null) return { sighting, because: null }
  }
  return { sighting: null, because }
}

/** Null where the season is over; a reason where the Moon does not pass the altitude in the rest of it. */
function firstSightingIn(
  season: StandstillSeason,
  place: SkyPlace,
  located: LocatedPlace,
  { at, centreAltitudeDeg }: MoonSight,
  start: number,
): MoonSighting | NoSighting | null {
  let first: NextSighting<MoonNote> | null = null
  let because: NoSighting | null = null
  for (const extreme of season.extremes) {
    if (extreme.utDays < start - MOST_DAYS_OFF) continue
    const crossing = crossingNear('moon', located, extreme.utDays, at, centreAltitudeDeg)
    if ('because' in crossing) because ??= crossing.because
    else if (crossing.utDays >= start) {
      const sighting = moonSightingAt(place, located, season, crossing.utDays)
      first ??= sighting
      if (sighting.note.isSunUp === false) return { ...first, withSunDown: sighting }
    }
  }
  return first === null ? because : { ...first, withSunDown: null }
}

function moonSightingAt(
  place: SkyPlace,
  located: LocatedPlace,
  season: StandstillSeason,
  utDays: number,
): NextSighting<MoonNote> {
  return sightingAt(place, utDays, {
    litShare: moonLitShare(utDays),
    isSunUp: place.longitudeDeg === null ? null : isSunUp(located, utDays),
    season: {
      fromYear: Math.floor(julianEpochOf(season.extremes[0]!.utDays)),
      toYear: Math.floor(julianEpochOf(season.extremes.at(-1)!.utDays)),
    },
  })
}
