import * as Astronomy from 'astronomy-engine'
import { describe, expect, test } from 'vitest'
import { wrap180 } from '../../src/quantity/degrees.ts'
import type { Files } from '../claim/read.ts'
import { expectWithin } from '../published/expect-within.ts'
import { readTextTable } from '../published/read-text-table.ts'
import { claimText } from './audit-of.ts'
import { refractionArcmin } from './by-tables.ts'
import { auditWith, profileOf, settledLine } from './settled.ts'

const PLACE = '{name: Place, latitude: 51° N, longitude: 2° W, elevation: 0 m}'
const OBSERVER = new Astronomy.Observer(51, -2, 0)
const SOLSTICES = readTextTable('seasons.csv')

/** Another program's body at an instant: topocentric, without air; degrees. */
function seenBy(body: Astronomy.Body, utc: string): { azimuth: number; altitude: number } {
  const time = new Astronomy.AstroTime(new Date(utc))
  const { ra, dec } = Astronomy.Equator(body, time, OBSERVER, true, true)
  return Astronomy.Horizon(time, OBSERVER, ra, dec)
}

function todayOf(changes: Record<string, string>, now: string, files: Files = {}) {
  return auditWith(claimText({ structure: PLACE, ...changes }), files, new Date(now))
}

/** The instant of the next solstice by the printed table. */
function solsticeAfter(now: string, longitude: '90' | '270'): Date {
  const found = SOLSTICES.find((row) => row.longitude_deg === longitude && new Date(row.utc!) > new Date(now))
  return new Date(found!.utc!)
}

const LEVEL = '{one: {azimuth: 50°32′ ± 2′, horizon: 1° ± 1′}}'
const sun = (event: string, at: string, disc = 'upper limb') =>
  `{body: sun, event: ${event}, at: ${at}, disc: ${disc}}`
/** A time is told to the minute: half of one is 7.5′ of hour angle, which turns the azimuth by 7.5′ sin 51° and moves the altitude by less. */
const HALF_MINUTE_ARCMIN = 6

describe('the next sunrise at a solstice', () => {
  test.each([
    ['june solstice', 'rising', '90', '2026-12-01T12:00:00Z'],
    ['june solstice', 'setting', '90', '2027-12-01T12:00:00Z'],
    ['december solstice', 'rising', '270', '2026-12-01T12:00:00Z'],
    ['december solstice', 'setting', '270', '2027-12-25T12:00:00Z'],
  ] as const)(
    '%s, %s: within half a day of the instant, when another program’s Sun stands there',
    (event, at, longitude, now) => {
      const { today } = todayOf({ sightlines: LEVEL, target: sun(event, at) }, now)
      const { utc, date, days, direction_deg } = today[0]!.next!
      const hours = (new Date(utc!).getTime() - solsticeAfter(now, longitude).getTime()) / 3_600_000
      // A solar day is no longer than 24 h 0.5 min.
      expect(Math.abs(hours)).toBeLessThan(12.1)
      expect(utc!.slice(0, 10)).toBe(date)
      expect(days![0] <= date && date <= days![1]).toBe(true)
      const { azimuth, altitude } = seenBy(Astronomy.Body.Sun, utc!)
      // The upper limb on the horizon of 1°: table of refraction at 1°, semidiameter 15.73′ in June and 16.26′ in December.
      const size = longitude === '90' ? 15.73 : 16.26
      expectWithin(altitude * 60, 60 - refractionArcmin(1) - size, HALF_MINUTE_ARCMIN, 'arcmin')
      // The obliquity of 2026 against the mean one: nutation, 9.2″; 0.2′ along the horizon.
      expectWithin(wrap180(azimuth - direction_deg!) * 60, 0, HALF_MINUTE_ARCMIN + 0.5, 'arcmin')
    },
  )

  test('over crags comes when the Sun clears them', () => {
    const crags = profileOf(
      [
        [30, 2],
        [47, 2],
        [48, 5],
        [50, 4.5],
        [53, 6],
        [56, 4],
        [80, 4],
      ],
      0.02,
    )
    const audit = todayOf(
      {
        sightlines: '{one: {azimuth: 50° ± 2′, horizon: {profile: s.csv}}}',
        target: sun('june solstice', 'rising'),
      },
      '2026-12-01T12:00:00Z',
      { 's.csv': crags },
    )
    const { azimuth, altitude } = seenBy(Astronomy.Body.Sun, audit.today[0]!.next!.utc!)
    const { disc } = audit.placements.at(-1)!
    // The line meets the crags 0.5° lower than the Sun clears them: a time for that altitude would be 5 minutes off.
    expectWithin(wrap180(azimuth - disc!.azimuth_deg) * 60, 0, HALF_MINUTE_ARCMIN + 0.5, 'arcmin')
    // Refraction near 5° by the table; it changes by less than 2′ in a degree there.
    expectWithin((disc!.altitude_deg - altitude) * 60, refractionArcmin(5), HALF_MINUTE_ARCMIN + 3, 'arcmin')
  })

  test('without a longitude has a day but no time', () => {
    const { today } = todayOf(
      {
        structure: '{name: Place, latitude: 51° N}',
        sightlines: LEVEL,
        target: sun('june solstice', 'rising'),
      },
      '2026-12-01T12:00:00Z',
    )
    const { date, utc } = today[0]!.next!
    expect(utc).toBeNull()
    expect(
      Math.abs(new Date(date).getTime() - solsticeAfter('2026-12-01T12:00:00Z', '90').getTime()),
    ).toBeLessThan(1.6 * 86_400_000)
  })

  test('of an angle is the nearer of two, and tells of the other', () => {
    const { today } = todayOf(
      {
        sightlines: '{one: {span: {angle: 80° ± 2′}}}',
        target: '{body: sun, event: june to december solstice, at: rising}',
      },
      '2026-12-01T12:00:00Z',
    )
    const { date, notes, stand_right_m } = today[0]!.next!
    expect(['2026-12-21', '2026-12-22']).toContain(date)
    expect(notes.join()).toMatch(/2[012] June 2027/)
    expect(stand_right_m).toBeNull()
  })

  test('that never comes has a reason', () => {
    const { today } = todayOf(
      {
        structure: '{name: North, latitude: 72° N, longitude: 2° W, elevation: 0 m}',
        sightlines: LEVEL,
        target: sun('june solstice', 'rising'),
      },
      '2026-12-01T12:00:00Z',
    )
    expect(today[0]).toMatchObject({ next: null, direction_deg: null })
    expect(today[0]!.next_reason).toMatch(/not to be seen/)
  })
})

describe('the next Moon at a standstill', () => {
  // The sky's own tests have the date; here its altitude: a claim gives refraction less parallax, and a person sees it
  // with its parallax all the same.
  test.each([
    ['traced', '{refraction_uncertainty: 1′}', refractionArcmin(1)],
    ['given less parallax', '{refraction: -33′, refraction_uncertainty: 1′}', 57.04 - 33],
  ])('is timed for the horizon, with the refraction %s', (_, atmosphere, refraction) => {
    const { today } = todayOf(
      {
        sightlines: LEVEL,
        target: '{body: moon, event: northern major standstill, at: rising, disc: centre}',
        atmosphere,
      },
      '2026-12-01T12:00:00Z',
    )
    const { altitude } = seenBy(Astronomy.Body.Moon, today[0]!.next!.utc!)
    expectWithin(altitude * 60, 60 - refraction, HALF_MINUTE_ARCMIN, 'arcmin')
  })
})

describe('where to stand', () => {
  // Looking from the place told, the foresight stands where the target is.
  test.each([
    ['50.7 m', '46.2 m'],
    ['60 m', '40 m'],
    ['-2 m', '70 m'],
  ])('with the foresight %s east and %s north, the target is over it', (east, north) => {
    const changes = {
      north: '{from: star}',
      points: `{a: {east: 10 m, north: 5 m}, b: {east: ${Number.parseFloat(east) + 10} m, north: ${Number.parseFloat(north) + 5} m}}`,
      sightlines: '{one: {from: a, to: b, horizon: 1° ± 1′}}',
      target: sun('june solstice', 'rising'),
    }
    const line = settledLine(claimText({ structure: PLACE, ...changes }))
    const { today } = todayOf(changes, '2026-12-01T12:00:00Z')
    const { stand_right_m, direction_deg } = today[0]!.next!
    const far = Math.abs(wrap180(line.measuredDeg - direction_deg!)) > 10
    expect(stand_right_m === null).toBe(far)
    if (stand_right_m === null) return
    const [x, y] = [Number.parseFloat(east), Number.parseFloat(north)]
    const length = Math.hypot(x, y)
    // To the right of one who looks along (x, y) is (y, −x).
    const eye = [(stand_right_m * y) / length, (-stand_right_m * x) / length] as const
    const azimuth = (Math.atan2(x - eye[0], y - eye[1]) * 180) / Math.PI
    expectWithin(azimuth, direction_deg!, 1e-9, 'degrees')
  })

  test('is not told of a bare azimuth', () => {
    const { today } = todayOf(
      { sightlines: LEVEL, target: sun('june solstice', 'rising') },
      '2026-12-01T12:00:00Z',
    )
    expect(today[0]!.next!.stand_right_m).toBeNull()
  })
})
