import { describe, expect, test } from 'vitest'
import { auditPlan } from '../../../src/audit/audit-plan.ts'
import { groundOf } from '../../../src/audit/audit-sweep.ts'
import { raisedHorizon } from '../../../src/audit/raised-horizon.ts'
import { settleClaim } from '../../../src/audit/settle-claim.ts'
import { sightOf } from '../../../src/audit/sight-of.ts'
import type { SightlineInputs } from '../../../src/audit/sightline-inputs.ts'
import { targetModel } from '../../../src/audit/targets/target-model.ts'
import type { Sight } from '../../../src/inference/sight.ts'
import { sweepPoint } from '../../../src/inference/sweep.ts'
import { horizonCrossing } from '../../../src/site/horizontal.ts'
import { NUTATION_SD_DEG } from '../../../src/sky/solstice-declination.ts'
import { expectWithin } from '../../published/expect-within.ts'
import { claimText } from '../audit-of.ts'
import { azimuthOf, obliquityOf, semidiameterArcmin } from '../by-tables.ts'
import { auditWith, claimOf, settledLine } from '../settled.ts'

type At = 'rising' | 'setting'
const HORIZONS = '{june: 2° ± 3′, december: 1° ± 5′}'

/** A span over two horizons. */
function spanText(span: string, at: At, latitude: string, changes: Record<string, string> = {}): string {
  return claimText({
    structure: `{name: Span, latitude: ${latitude}, elevation: 0 m}`,
    sightlines: `{both: {span: {angle: ${span}, horizons: ${HORIZONS}}}}`,
    target: `{body: sun, event: june to december solstice, at: ${at}, disc: upper limb}`,
    ...changes,
  })
}

/** Less parallax, as a claim gives it: then nothing is left to differ but the last digits of the tables. */
const REFRACTION_ARCMIN = 20

/** By the published tables: obliquity and orbit of the year. */
function angleByTables(year: number, at: At, latitude: number): number {
  const [june, december] = (
    [
      [90, 1, 2],
      [270, -1, 1],
    ] as const
  ).map(([longitude, sign, horizon]) => {
    const altitude = horizon - (REFRACTION_ARCMIN + semidiameterArcmin(year, longitude)) / 60
    return azimuthOf(sign * obliquityOf(year), altitude, latitude, at)
  })
  return Math.abs(june! - december!)
}

describe('date → angle → date', () => {
  const cases = (
    [
      ['51° N', 51],
      ['33° S', -33],
      ['3° N', 3],
    ] as const
  ).flatMap(([text, latitude]) =>
    (['rising', 'setting'] as const).flatMap((at) =>
      [-9000, -3000, 1000].map((year) => ({ text, latitude, at, year })),
    ),
  )
  test.each(cases)('$at at $text in $year', ({ text, latitude, at, year }) => {
    const angle = angleByTables(year, at, latitude)
    const atmosphere = `{refraction: ${REFRACTION_ARCMIN}′, refraction_uncertainty: 1′}`
    const { implied } = auditWith(spanText(`${angle.toFixed(7)}° ± 1′`, at, text, { atmosphere }))
    const years = implied.find(({ model }) => model === 'vondrak2011')!.dates.map((date) => date.year)
    const off = years.map((found) => Math.abs(found - year))
    // The obliquity is printed to 1e−6°, 0.002″ of rounding, and moves by 0.1″ a year at least; the size of the Sun is
    // good to 1e−7 of 16′, less than that; the step of the audit's own table of the obliquity costs as much again.
    expectWithin(Math.min(...off), 0, 0.1, 'years')
  })
})

const LINE = settledLine(spanText('70° ± 1′', 'rising', '51° N'))

function directionOf(line: SightlineInputs, year: number): number {
  return targetModel(line).branches[0]!.predict(year)!.directionDeg
}

describe('the angle between the two solstices', () => {
  test.each(['rising', 'setting'] as const)('is the difference of the two lines by themselves, %s', (at) => {
    const single = (event: string, horizon: string) =>
      settledLine(
        spanText('70° ± 1′', at, '51° N', {
          sightlines: `{one: {azimuth: 90° ± 1′, horizon: ${horizon}}}`,
          target: `{body: sun, event: ${event}, at: ${at}, disc: upper limb}`,
        }),
      )
    const june = directionOf(single('june solstice', '2° ± 3′'), -3000)
    const december = directionOf(single('december solstice', '1° ± 5′'), -3000)
    const span = directionOf(settledLine(spanText('70° ± 1′', at, '51° N')), -3000)
    expectWithin((span - Math.abs(december - june)) * 3600, 0, 1e-6, 'arcsec')
  })

  const prediction = targetModel(LINE).branches[0]!.predict(-3000)!
  const effectOf = (source: string) => {
    const found = prediction.errors.filter((error) => error.source === source)
    expect(found, source).toHaveLength(1)
    return found[0]!.effectDeg
  }
  const own = directionOf(LINE, -3000)
  const pair = LINE.pair!

  // Finite differences of one standard deviation to either side, which leave the third derivative: below 0.1 %.
  test.each([
    ['june', 'June', 3 / 60],
    ['december', 'December', 5 / 60],
  ] as const)('answers the %s horizon by itself', (side, month, sd) => {
    const raised = (deg: number) =>
      directionOf({ ...LINE, pair: { ...pair, [side]: raisedHorizon(pair[side], deg) } }, -3000)
    const want = (raised(sd) - raised(-sd)) / 2
    expectWithin(effectOf(`altitude of the horizon (${month})`) / want, 1, 2e-3, 'of the effect')
  })

  test('answers the obliquity at both ends, which add', () => {
    const altitude = (solstice: 'june' | 'december') => targetModel(pair[solstice]).altitudeDeg(-3000)!.deg
    const angle = (obliquity: number) =>
      horizonCrossing(-obliquity, altitude('december'), 51, 'rising')!.azimuthDeg -
      horizonCrossing(obliquity, altitude('june'), 51, 'rising')!.azimuthDeg
    const obliquity = obliquityOf(-3000)
    const want = (angle(obliquity + NUTATION_SD_DEG) - angle(obliquity - NUTATION_SD_DEG)) / 2
    expectWithin(effectOf('nutation') / want, 1, 1e-3, 'of the effect')
    expect(prediction.errors.filter(({ shared }) => shared).map(({ source }) => source)).toEqual([
      'model of the obliquity',
      'nutation',
    ])
    expectWithin(angle(obliquity), own, 1e-4, 'degrees')
  })

  test('has the day’s refraction twice, each of its own day', () => {
    const of = (month: string) =>
      prediction.errors.filter(({ source }) => source === `refraction of the day (${month})`)
    expect([of('June').length, of('December').length]).toEqual([1, 1])
    expect(prediction.errors.some(({ source }) => source === 'refraction of the day')).toBe(false)
  })

  test('does not answer north', () => {
    const text = spanText('', 'rising', '51° N', {
      north: 'unknown',
      points: '{a: {east: 0 m, north: 0 m}, b: {east: 60 m, north: 50 m}, c: {east: 60 m, north: -40 m}}',
      sightlines: `{both: {span: {from: a, june: b, december: c, horizons: ${HORIZONS}}}}`,
    })
    const sure = settledLine(text.replace('north: unknown', 'north: {from: star}'))
    expect(settledLine(text)).toEqual(sure)
  })
})

describe('a build tolerance of an angle', () => {
  test('counts √2 times that of a straight line', () => {
    const claim = claimOf(spanText('82°30′ ± 2′', 'rising', '51° N'))
    const { sights, dates } = settleClaim(claim)
    const asLine: Sight = { ...sights[0]!, toleranceScale: 1 }
    for (const tolerance of [1, 10, 60]) {
      const angle = sweepPoint(groundOf(sights, dates), tolerance)
      const line = sweepPoint(groundOf([asLine], dates), tolerance * Math.SQRT2)
      expectWithin(angle.bits, line.bits, 1e-9, 'bits', tolerance)
      // √2 and back leaves the last digit.
      expect(angle.sets95).toHaveLength(line.sets95.length)
      angle.sets95.flat().forEach((end, i) => {
        expectWithin(end, line.sets95.flat()[i]!, 1e-6, 'years', tolerance)
      })
    }
    expect(sightOf(LINE).toleranceScale).toBe(Math.SQRT2)
  })
})

describe('on the plan', () => {
  const text = (june: string, december: string, at: At) =>
    spanText('', at, '51° N', {
      north: '{from: star}',
      points: `{a: {east: 0 m, north: 0 m}, b: ${june}, c: ${december}}`,
      sightlines: '{both: {span: {from: a, june: b, december: c}}}',
    })
  test.each([
    ['rising', '{east: 60 m, north: 45 m}', '{east: 30 m, north: -40 m}'],
    ['setting', '{east: -60 m, north: 45 m}', '{east: -30 m, north: -40 m}'],
  ] as const)('its second line is where its second point is, %s', (at, june, december) => {
    const claim = claimOf(text(june, december, at))
    const { lines } = settleClaim(claim)
    const plan = auditPlan(claim, lines)
    const { azimuth_deg, span } = plan.lines[0]!
    const bearing = (index: number) =>
      (Math.atan2(plan.points[index]!.east_m, plan.points[index]!.north_m) * 180) / Math.PI
    expectWithin(Math.cos(((azimuth_deg! - bearing(1)) * Math.PI) / 180), 1, 1e-12, 'of the cosine')
    const second = azimuth_deg! + span!.angle_deg
    expectWithin(Math.cos(((second - bearing(2)) * Math.PI) / 180), 1, 1e-12, 'of the cosine')
    expect(span!.to).toBe(2)
  })
})
