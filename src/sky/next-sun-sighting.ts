import { type Crossing, crossingNear, transitNear } from './altitude-crossing.ts'
import { type NextSighting, type SoughtSighting, sightingAt } from './next-sighting.ts'
import { julianEpochOf, seenBody, utDaysOf } from './present-sky.ts'
import { isoDay, type LocatedPlace, locatedPlace, type SkyPlace } from './sky-place.ts'
import { type SolsticeEvent, solsticeDwellDays } from './sun.ts'
import { type SunMoment, sunMoments } from './sun-moments.ts'
import { tabulatedObliquityDeg } from './tabulated-obliquity.ts'

/** The Sun on a day of the year where it is sighted. */
export type SunSight = { moment: SunMoment | { name: 'zenith passage' } } & (
  | {
      at: 'rising' | 'setting'
      /**
       * True altitude of the centre when it is sighted, degrees: topocentric and without air, so that the caller takes
       * refraction and semidiameter off and adds no parallax.
       */
      centreAltitudeDeg: number
    }
  | { at: 'noon' }
)

export interface SunNote {
  /** At a solstice: first and last day whose sighting finds the declination within 1′ of its extreme; else null. */
  steady: { from: string; to: string } | null
}

/** The Sun's declination may stray so far from its extreme for a day to do as well as that of the solstice. */
const STEADY_MARGIN_DEG = 1 / 60

/**
 * The next sighting of the Sun on a day of the year: of all risings (settings, noons) the nearest to the instant meant,
 * which is half a day off at most.
 *
 * Throws a RangeError for an impossible place, altitude or date.
 */
export function nextSunSighting(
  place: SkyPlace,
  sight: SunSight,
  now: Date,
): SoughtSighting<NextSighting<SunNote>> {
  const located = locatedPlace(place, now)
  if (sight.at !== 'noon' && !(Math.abs(sight.centreAltitudeDeg) <= 90))
    throw new RangeError(`altitude of the centre is ${sight.centreAltitudeDeg}°: give one from −90 to 90`)
  const start = utDaysOf(now)
  const moments = sunMoments(momentAt(place, sight), start - 1)
  if (moments.length === 0) return { sighting: null, because: 'never at that declination' }
  const crossings = moments.map((moment) => ({ moment, ...sunCrossing(located, moment, sight) }))
  for (const crossing of crossings)
    if ('utDays' in crossing && crossing.utDays >= start)
      return { sighting: sunSighting(place, sight, crossing), because: null }
  const without = crossings.find((crossing) => 'because' in crossing)
  return { sighting: null, because: without?.because ?? 'never at that declination' }
}

function momentAt(place: SkyPlace, { moment }: SunSight): SunMoment {
  return moment.name === 'zenith passage'
    ? { name: 'declination', declinationDeg: place.latitudeDeg }
    : moment
}

function sunCrossing(place: LocatedPlace, moment: number, sight: SunSight): Crossing {
  if (sight.at !== 'noon') return crossingNear('sun', place, moment, sight.at, sight.centreAltitudeDeg)
  const utDays = transitNear('sun', place, moment)
  return seenBody('sun', place, utDays).altitudeDeg < 0
    ? { because: 'stays below that altitude' }
    : { utDays }
}

function sunSighting(
  place: SkyPlace,
  sight: SunSight,
  { moment, utDays }: { moment: number; utDays: number },
): NextSighting<SunNote> {
  const { name } = sight.moment
  const isSolstice = name === 'june solstice' || name === 'december solstice'
  return sightingAt(place, utDays, {
    steady: isSolstice ? steadyDays(place, name, moment, utDays) : null,
  })
}

/** From day to day a rising near a solstice shifts by a minute or two, which does not matter here. */
function steadyDays(place: SkyPlace, event: SolsticeEvent, moment: number, sighting: number) {
  const year = julianEpochOf(moment)
  const obliquity = tabulatedObliquityDeg('vondrak2011', year)
  const halfDays = solsticeDwellDays(year, event, obliquity, STEADY_MARGIN_DEG) / 2
  const after = sighting - moment
  return {
    from: isoDay(sighting - Math.floor(halfDays + after), place.longitudeDeg),
    to: isoDay(sighting + Math.floor(halfDays - after), place.longitudeDeg),
  }
}
