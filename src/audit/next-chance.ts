import { nearestOffset } from '../inference/comparison.ts'
import { DEG } from '../quantity/degrees.ts'
import { formatDay } from '../quantity/format-day.ts'
import { formatNumber } from '../quantity/format-number.ts'
import { horizonAboveCentreArcmin } from '../site/centre-altitude.ts'
import { MOON_PARALLAX_ARCMIN, type StandstillEvent } from '../sky/moon.ts'
import { type MoonSighting, nextMoonSighting } from '../sky/next-moon-sighting.ts'
import type { NextSighting, NoSighting } from '../sky/next-sighting.ts'
import { nextStarPairSighting } from '../sky/next-star-pair-sighting.ts'
import { nextStarSighting } from '../sky/next-star-sighting.ts'
import { nextSunSighting } from '../sky/next-sun-sighting.ts'
import { YEARS_OF_PRESENT_SKY } from '../sky/present-sky.ts'
import type { SkyPlace } from '../sky/sky-place.ts'
import { labelOfStar } from '../sky/star-catalogue.ts'
import { SUN_PARALLAX_ARCSEC } from '../sky/sun.ts'
import type { SunMoment } from '../sky/sun-moments.ts'
import type { NextChance } from './audit.ts'
import { nearestBranch } from './nearest-branch.ts'
import { refractionAt } from './refraction-at.ts'
import { sightOf } from './sight-of.ts'
import type { SettledSunEvent, SettledTarget, SightlineInputs } from './sightline-inputs.ts'
import { targetModel } from './targets/target-model.ts'

/** The next chance, or why none is told. */
export type ChanceOrReason = { next: NextChance; reason: null } | { next: null; reason: string }

/** When the target of a line is next to be seen where it is looked for, and where to stand to have it over the foresight. */
export function nextChance(line: SightlineInputs, place: SkyPlace, now: Date): ChanceOrReason {
  const year = now.getUTCFullYear()
  const { from, to } = YEARS_OF_PRESENT_SKY
  if (year < from || year > to) {
    return { next: null, reason: `the present sky is reckoned here for the years ${from} to ${to} alone` }
  }
  const direction = nearestOffset(sightOf(line), year)
  if (direction === null) return { next: null, reason: 'the target is not to be seen there in our time' }
  const sought = soughtSighting(line, place, now, year)
  if ('because' in sought) return { next: null, reason: REASONS[sought.because] }
  const { sighting, days, notes } = sought
  return {
    next: {
      date: sighting.date,
      utc: sighting.utc,
      days,
      direction_deg: direction.directionDeg,
      stand_right_m: standRightM(line, direction.offsetDeg),
      stand_sd_m: standRightM(line, direction.sdDeg),
      notes,
    },
    reason: null,
  }
}

const REASONS: Readonly<Record<NoSighting, string>> = {
  'never at that declination': 'the Sun never stands there',
  'stays above that altitude': 'it does not go down so far',
  'stays below that altitude': 'it does not come up so far',
  'never on a dark night': 'it falls into daylight or twilight the whole year round',
  'never one above the other': 'the two never stand so above the horizon',
}

/**
 * Metres to the right of the backsight, as one looks along the line, from which the target stands over the foresight:
 * the eye has to go left where the target is to the right.
 */
function standRightM({ lengthM, measures }: SightlineInputs, offsetDeg: number): number | null {
  return lengthM === null || measures !== 'azimuth' || Math.abs(offsetDeg) > FURTHEST_DEG
    ? null
    : lengthM * Math.tan(offsetDeg * DEG)
}

/** Beyond this the foresight would be looked at from another side altogether. */
const FURTHEST_DEG = 10

type Sought =
  | { sighting: NextSighting<unknown>; days: NextChance['days']; notes: string[] }
  | { because: NoSighting }

function soughtSighting(line: SightlineInputs, place: SkyPlace, now: Date, year: number): Sought {
  const { target } = line
  switch (target.body) {
    case 'sun':
      return sunSought(line, target.event, target.at, place, now, year)
    case 'sun at both solstices':
      return spanSought(line, target.at, place, now, year)
    case 'moon': {
      const standstill: StandstillEvent = `${target.standstill.side} ${target.standstill.size} standstill`
      const sight = { standstill, at: target.at, centreAltitudeDeg: centreAltitudeDeg(line, year) }
      const found = nextMoonSighting(place, sight, now)
      return found.sighting === null ? { because: found.because } : { ...ofMoon(found.sighting), days: null }
    }
    case 'star': {
      const { star, at } = target
      const sight =
        at === 'rising' || at === 'setting'
          ? { star, at, altitudeDeg: starAltitudeDeg(line, year) }
          : { star, at }
      const found = nextStarSighting(place, sight, now)
      return found.sighting === null
        ? { because: found.because }
        : { sighting: found.sighting, days: null, notes: [BY_NIGHT] }
    }
    case 'two stars': {
      const [first, second] = target.stars
      const pair = { stars: [first, second] as const, above: target.above, nearAzimuthDeg: line.measuredDeg }
      const found = nextStarPairSighting(place, pair, now)
      if (found.sighting === null) return { because: found.because }
      const upper = labelOfStar(target.stars[found.sighting.note.above])
      return { sighting: found.sighting, days: null, notes: [`${upper} is above then.`, BY_NIGHT] }
    }
  }
}

const BY_NIGHT = 'It is the next time with the Sun at least 12° below the horizon.'

function sunSought(
  line: SightlineInputs,
  event: SettledSunEvent,
  at: 'rising' | 'setting' | 'noon',
  place: SkyPlace,
  now: Date,
  year: number,
): Sought {
  const moment = momentOf(line, event, year)
  const sight =
    at === 'noon' ? { moment, at } : { moment, at, centreAltitudeDeg: centreAltitudeDeg(line, year) }
  const found = nextSunSighting(place, sight, now)
  if (found.sighting === null) return { because: found.because }
  const { steady } = found.sighting.note
  return { sighting: found.sighting, days: steady === null ? null : [steady.from, steady.to], notes: [] }
}

/** Of an angle the nearer of its two days, with the other beside it. */
function spanSought(
  { pair }: SightlineInputs,
  at: 'rising' | 'setting',
  place: SkyPlace,
  now: Date,
  year: number,
): Sought {
  if (pair === null) throw new Error('an angle has two lines')
  const june = sunSought(pair.june, { name: 'june solstice' }, at, place, now, year)
  const december = sunSought(pair.december, { name: 'december solstice' }, at, place, now, year)
  if ('because' in june) return june
  if ('because' in december) return december
  const [first, second] = june.sighting.date < december.sighting.date ? [june, december] : [december, june]
  return {
    ...first,
    notes: [`The other of the two is on ${formatDay(second.sighting.date)}: it takes both to see the angle.`],
  }
}

/** The moment of the year that the event means in our time. */
function momentOf(
  line: SightlineInputs,
  event: SettledSunEvent,
  year: number,
): SunMoment | { name: 'zenith passage' } {
  switch (event.name) {
    case 'june solstice':
    case 'december solstice':
    case 'zenith passage':
      return { name: event.name }
    case 'day':
      return event
    case 'equinox':
      // The direction midway between the solstices' depends on the horizon, which only the line knows.
      return event.sense === 'midway in direction'
        ? { name: 'declination', declinationDeg: targetModel(line).declinationDeg(year) ?? 0 }
        : { name: 'equinox', sense: event.sense }
  }
}

/** True altitude of the centre as seen from the place itself, without parallax, when the disc stands on the horizon. */
function centreAltitudeDeg(line: SightlineInputs, year: number): number {
  const { target, horizonDeg } = line
  const semidiameter = targetModel(line).semidiameter(year)?.arcmin ?? 0
  const aboveDeg = 'disc' in target ? horizonAboveCentreArcmin(target.disc, semidiameter) / 60 : 0
  const onSkyline = nearestBranch(sightOf(line), year).predict(year)?.discCentre
  const seenDeg = onSkyline?.altitudeDeg ?? horizonDeg - aboveDeg
  const { arcmin, lessParallax } = refractionAt(line, seenDeg + aboveDeg)
  const trueDeg = seenDeg - arcmin / 60
  // A refraction given less parallax leads to the altitude from the Earth's centre, where nobody stands.
  return lessParallax ? trueDeg - (parallaxArcmin(target) / 60) * Math.cos(trueDeg * DEG) : trueDeg
}

/** True altitude at which a star is seen: over a skyline, where it clears that. */
function starAltitudeDeg(line: SightlineInputs, year: number): number {
  const onSkyline = nearestBranch(sightOf(line), year).predict(year)?.discCentre
  if (onSkyline !== undefined) {
    return onSkyline.altitudeDeg - refractionAt(line, onSkyline.altitudeDeg).arcmin / 60
  }
  const altitude = targetModel(line).altitudeDeg(year)
  // Whoever asks has made sure that the target has a direction, and so an altitude.
  if (altitude === null) throw new Error('a star that is never seen has no next chance')
  return altitude.deg
}

/** Mean horizontal parallax; 0 of a star. */
function parallaxArcmin({ body }: SettledTarget): number {
  if (body === 'moon') return MOON_PARALLAX_ARCMIN
  return body === 'sun' ? SUN_PARALLAX_ARCSEC / 60 : 0
}

function ofMoon(sighting: MoonSighting): { sighting: MoonSighting; notes: string[] } {
  const { withSunDown } = sighting
  const { litShare, isSunUp, season } = sighting.note
  const years =
    season.fromYear === season.toYear ? `${season.fromYear}` : `${season.fromYear} to ${season.toYear}`
  const byDay = isSunUp === true ? ' The Sun is up then.' : ''
  const darker =
    withSunDown === null || withSunDown.date === sighting.date
      ? []
      : [
          `The first of them with the Sun down is on ${formatDay(withSunDown.date)}, ${percent(withSunDown.note.litShare)} of the disc lit.`,
        ]
  return {
    sighting,
    notes: [
      `This standstill lasts from ${years}; in those years each month brings a chance.`,
      `${percent(litShare)} of the disc is lit.${byDay}`,
      ...darker,
    ],
  }
}

function percent(share: number): string {
  return `${formatNumber(share * 100, 2)} %`
}
