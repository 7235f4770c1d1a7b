import type { NoSighting } from './next-sighting.ts'
import { seenBody } from './present-sky.ts'
import type { LocatedPlace } from './sky-place.ts'

type Body = 'sun' | 'moon'

/** An instant in days of UT from J2000.0, or why there is none. */
export type Crossing = { utDays: number } | { because: NoSighting }

/** Mean time from one upper transit to the next, days. */
const DAY_OF: Readonly<Record<Body, number>> = { sun: 1, moon: 1.03505 }

/** A second. */
const CLOSE_ENOUGH_DAYS = 1 / 86_400

/** The upper transit nearest to an instant. */
export function transitNear(body: Body, place: LocatedPlace, utDays: number): number {
  let transit = utDays
  for (let i = 0; i < 4; i++) transit -= (seenBody(body, place, transit).hourAngleDeg / 360) * DAY_OF[body]
  return transit
}

/**
 * The instant, of all risings or of all settings, nearest to a given one at which a body's centre passes a true
 * altitude, topocentric and without air. Where the nearest does not come about, but its neighbour half a day off or
 * less does, that one.
 */
export function crossingNear(
  body: Body,
  place: LocatedPlace,
  near: number,
  at: 'rising' | 'setting',
  altitudeDeg: number,
): Crossing {
  const transit = transitNear(body, place, near)
  // A rising lies in the half day before a transit: the nearest belongs to the nearest transit or to the next one.
  const other = transit + (at === 'rising' ? 1 : -1) * DAY_OF[body]
  const crossings = [transit, transitNear(body, place, other)].map((upper) =>
    crossingAbout(body, place, upper, at, altitudeDeg),
  )
  const found = crossings.filter((crossing) => 'utDays' in crossing)
  found.sort((a, b) => Math.abs(a.utDays - near) - Math.abs(b.utDays - near))
  return found[0] ?? crossings[0]!
}

/** The crossing between an upper transit and the lower one before or after it, by bisection. */
function crossingAbout(
  body: Body,
  place: LocatedPlace,
  upper: number,
  at: 'rising' | 'setting',
  altitudeDeg: number,
): Crossing {
  const isAbove = (utDays: number) => seenBody(body, place, utDays).altitudeDeg >= altitudeDeg
  let above = upper
  let below = upper + (at === 'rising' ? -0.5 : 0.5) * DAY_OF[body]
  if (!isAbove(above)) return { because: 'stays below that altitude' }
  if (isAbove(below)) return { because: 'stays above that altitude' }
  while (Math.abs(above - below) > CLOSE_ENOUGH_DAYS) {
    const middle = (above + below) / 2
    if (isAbove(middle)) above = middle
    else below = middle
  }
  return { utDays: (above + below) / 2 }
}
