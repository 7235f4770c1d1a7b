import type { Uncertain } from '../../inference/horizon-branch.ts'
import { rememberLast } from '../../inference/remember-last.ts'
import { DEG } from '../../quantity/degrees.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { formatNumber } from '../../quantity/format-number.ts'
import { horizonAboveCentreArcmin } from '../../site/centre-altitude.ts'
import { declinationDeg, horizonCrossing } from '../../site/horizontal.ts'
import type { ObliquityModelName } from '../../sky/obliquity-models.ts'
import {
  hemisphere,
  type SolsticeEvent,
  SUN_PARALLAX_ARCSEC,
  solsticeDwellDays,
  solsticeLongitudeDeg,
  sunSemidiameterAt,
} from '../../sky/sun.ts'
import {
  equinoxDay,
  type SunDay,
  type SunSide,
  sunDayAt,
  sunDayFromSolstice,
  sunDayOfDeclination,
} from '../../sky/sun-days.ts'
import { tabulatedObliquityDeg } from '../../sky/tabulated-obliquity.ts'
import type { SettledSunEvent, SettledTarget, SightlineInputs } from '../sightline-inputs.ts'
import { discWords } from '../words.ts'
import { type DiscBody, discAltitude } from './disc-altitude.ts'
import { discBranch, discOnLine } from './disc-branch.ts'
import { meridianBranch } from './meridian-branch.ts'
import { obliquityErrors } from './obliquity-errors.ts'
import type { TargetModel } from './target-model.ts'

type SettledSun = Extract<SettledTarget, { body: 'sun' }>

/** Name of the error in the budget that any day but a solstice has. */
export const HALF_DAY = 'the half day by which a rising can miss its moment'

/** Models of the obliquity that a date of the Sun can be had from. */
export const SUN_MODELS: readonly ObliquityModelName[] = [
  'vondrak2011',
  'laskar2004',
  'laskar1986',
  'p03',
  'iau1976',
  'newcomb1895',
]

/** The Sun on a day of the year, rising, setting or at noon. */
export function sunTarget(inputs: SightlineInputs, target: SettledSun): TargetModel {
  const { event, at, disc } = target
  const courses = coursesOf(inputs, target).map(rememberLast)
  const course = courses[0]!
  const semidiameter = (year: number) => sunSemidiameterAt(year, course(year)?.longitudeDeg ?? 90)
  const body: DiscBody = { semidiameter, parallaxArcsec: SUN_PARALLAX_ARCSEC, nearnessSd: 0 }
  const altitude = discAltitude(inputs, disc, body)
  const model: Omit<TargetModel, 'branches' | 'notes'> = {
    event: sunEventWords(event, at),
    description: `${sunEventWords(event, at)}${senseWords(event)}, ${at === 'noon' ? disc.part : discWords(disc)}`,
    declinationDeg: (year) => course(year)?.declinationDeg ?? null,
    altitudeDeg: (year) => summed(altitude(year)),
    onLine: at === 'noon' ? null : discOnLine(inputs, { at, disc, body }),
    seenAt: null,
    semidiameter,
    models: SUN_MODELS,
    warnings: [],
  }
  if (at === 'noon') {
    const aboveCentreArcmin = (year: number) =>
      disc.part === 'showing' ? 0 : horizonAboveCentreArcmin(disc, semidiameter(year).arcmin)
    const branches = courses.map((day) =>
      meridianBranch(inputs, {
        culmination: 'upper',
        declination: uncertain(inputs, event, day),
        aboveCentreArcmin,
        parallaxArcsec: SUN_PARALLAX_ARCSEC,
      }),
    )
    return { ...model, branches, altitudeDeg: () => null, notes: (year) => paceNotes(course(year)) }
  }
  const branches = courses.map((day) =>
    discBranch(inputs, { at, disc, body, declination: uncertain(inputs, event, day) }),
  )
  const notes = (year: number) =>
    isSolstice(event) ? dwellNotes(inputs, at, event.name, year, altitude(year).deg) : paceNotes(course(year))
  return { ...model, branches, notes }
}

type Course = (year: number) => SunDay | null

/** The days of the year that the event can mean, as the Sun stands on them in a year. */
function coursesOf(inputs: SightlineInputs, { event, at, disc }: SettledSun): Course[] {
  const obliquity = (year: number) => tabulatedObliquityDeg(inputs.model, year)
  const sides: SunSide[] = ['northward', 'southward']
  switch (event.name) {
    case 'june solstice':
    case 'december solstice':
      return [(year) => sunDayAt(year, solsticeLongitudeDeg(event.name), obliquity(year))]
    case 'day':
      return [(year) => sunDayFromSolstice(year, event.after, event.days, obliquity(year))]
    case 'zenith passage':
      return [(year) => sunDayOfDeclination(year, inputs.latitudeDeg, 'northward', obliquity(year))]
    case 'equinox': {
      const { sense } = event
      if (sense === 'declination zero')
        return [(year) => equinoxDay(year, sense, 'northward', obliquity(year))]
      if (sense === 'midway in days') {
        return sides.map((side) => (year) => equinoxDay(year, sense, side, obliquity(year)))
      }
      const middle = midwayDeclination(inputs, at, disc)
      return [
        (year) => {
          const declination = middle(year)
          return declination === null
            ? null
            : sunDayOfDeclination(year, declination, 'northward', obliquity(year))
        },
      ]
    }
  }
}

/** Declination of the direction midway between the two solstices'; at noon, of the altitude midway. */
function midwayDeclination(
  inputs: SightlineInputs,
  at: SettledSun['at'],
  disc: SettledSun['disc'],
): (year: number) => number | null {
  if (at === 'noon') return () => 0
  const altitudes = (['june solstice', 'december solstice'] as const).map((event) =>
    discAltitude(inputs, disc, {
      semidiameter: (year) => sunSemidiameterAt(year, solsticeLongitudeDeg(event)),
      parallaxArcsec: SUN_PARALLAX_ARCSEC,
      nearnessSd: 0,
    }),
  )
  return (year) => {
    const obliquity = tabulatedObliquityDeg(inputs.model, year)
    const [june, december] = [obliquity, -obliquity].map((declination, i) =>
      horizonCrossing(declination, altitudes[i]!(year).deg, inputs.latitudeDeg, at),
    )
    if (june == null || december == null) return null
    const altitude = (altitudes[0]!(year).deg + altitudes[1]!(year).deg) / 2
    return declinationDeg((june.azimuthDeg + december.azimuthDeg) / 2, altitude, inputs.latitudeDeg)
  }
}

/** The declination of a course with its errors. */
function uncertain(
  inputs: SightlineInputs,
  event: SettledSunEvent,
  course: Course,
): (year: number) => Uncertain | null {
  return (year) => {
    const day = course(year)
    if (day === null) return null
    // sin δ = sin ε sin λ: at a fixed longitude the declination follows the obliquity by cos ε sin λ / cos δ.
    const obliquity = tabulatedObliquityDeg(inputs.model, year)
    const fixed =
      event.name === 'zenith passage' || (event.name === 'equinox' && event.sense !== 'midway in days')
    const per = fixed
      ? 0
      : (Math.cos(obliquity * DEG) * Math.sin(day.longitudeDeg * DEG)) / Math.cos(day.declinationDeg * DEG)
    const errors = [...obliquityErrors(year, isSolstice(event) ? hemisphere(event.name) : per)]
    if (!isSolstice(event)) errors.push({ source: HALF_DAY, sdDeg: day.declinationSdDeg })
    return { deg: day.declinationDeg, errors: errors.filter(({ sdDeg }) => sdDeg !== 0) }
  }
}

function isSolstice(event: SettledSunEvent): event is { name: SolsticeEvent } {
  return event.name === 'june solstice' || event.name === 'december solstice'
}

function sunEventWords(event: SettledSunEvent, at: SettledSun['at']): string {
  const moment = { rising: 'sunrise', setting: 'sunset', noon: 'noon' }[at]
  switch (event.name) {
    case 'june solstice':
      return `June solstice ${moment}`
    case 'december solstice':
      return `December solstice ${moment}`
    case 'equinox':
      return `equinox ${moment}`
    case 'zenith passage':
      return `zenith passage ${moment}`
    case 'day': {
      const count = Math.abs(event.days)
      const month = event.after === 'june solstice' ? 'June' : 'December'
      return `${moment} ${count} ${count === 1 ? 'day' : 'days'} ${event.days < 0 ? 'before' : 'after'} the ${month} solstice`
    }
  }
}

function senseWords(event: SettledSunEvent): string {
  return event.name === 'equinox' ? ` (${event.sense})` : ''
}

function summed({ deg, errors }: Uncertain): { deg: number; sdDeg: number } {
  return { deg, sdDeg: Math.hypot(...errors.map(({ sdDeg }) => sdDeg)) }
}

/** The Sun's declination may fall short of its extreme by so much that its azimuth moves by 1′. */
function dwellNotes(
  inputs: SightlineInputs,
  at: 'rising' | 'setting',
  event: SolsticeEvent,
  year: number,
  altitude: number,
): string[] {
  const obliquity = tabulatedObliquityDeg(inputs.model, year)
  const crossing = horizonCrossing(hemisphere(event) * obliquity, altitude, inputs.latitudeDeg, at)
  if (crossing === null) return []
  const days = solsticeDwellDays(year, event, obliquity, 1 / 60 / Math.abs(crossing.perDeclination))
  const count = formatNumber(days, days < 9.5 ? 1 : 2)
  return [
    `Around the solstice the Sun’s place on the horizon stays within 1′ of its extreme for ${count === '1' ? 'a day' : `${count} days`}.`,
  ]
}

/** At a solstice the Sun stands still, and there is nothing to be said of its pace. */
const SMALLEST_PACE_ARCMIN = 0.1

function paceNotes(day: SunDay | null): string[] {
  const perDay = Math.abs(day?.perDayDeg ?? 0) * 60
  if (perDay < SMALLEST_PACE_ARCMIN) return []
  return [
    `On that day the Sun’s declination changes by ${formatArcmin(perDay)} from one rising to the next, so that a single one can miss the moment meant by up to ${formatArcmin(perDay / 2)}.`,
  ]
}
