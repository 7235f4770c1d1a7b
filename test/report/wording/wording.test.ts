import { describe, expect, it } from 'vitest'
import { listed } from '../../../src/quantity/listed.ts'
import { dateSets } from '../../../src/report/wording/date-sets.ts'
import { fixed } from '../../../src/report/wording/fixed.ts'
import { measuredArcmin, measuredDegrees } from '../../../src/report/wording/measured-angle.ts'
import { modelLabel } from '../../../src/report/wording/model-label.ts'
import { noEvent } from '../../../src/report/wording/no-event.ts'
import { offsetFromLine, whatPoints } from '../../../src/report/wording/offset-from-line.ts'
import { ratioFigure } from '../../../src/report/wording/ratio-figure.ts'
import { sunWidthShare } from '../../../src/report/wording/sun-width-share.ts'
import { yearStep } from '../../../src/report/wording/year-step.ts'
import { OBLIQUITY_MODELS } from '../../../src/sky/obliquity-models.ts'

describe('sets of dates', () => {
  const window = { from: -12_000, to: 2026 }

  it.each([
    [[], 'no date'],
    [[[-9698, -9502]], '9700 to 9505 BCE'],
    [[[-9738, -9502]], '9740 to 9500 BCE'],
    [[[-9602, -9596]], '9603 to 9597 BCE'],
    [
      [
        [-5000, -4001],
        [-300, 421],
      ],
      '5000 to 4000 BCE; 300 BCE to 420 CE',
    ],
    [[[-12_000, -2804]], '12,001 BCE (edge) to 2810 BCE'],
    [[[-2804, 2026]], '2810 BCE to 2026 CE (edge)'],
    [[[-12_000, 2026]], '12,001 BCE (edge) to 2026 CE (edge)'],
  ] as const)('%j prints as %s', (sets, printed) => {
    expect(dateSets(sets, window)).toBe(printed)
  })

  it.each([
    [40, 1],
    [41, 5],
    [200, 5],
    [201, 10],
  ])('%s years are printed in steps of %s', (length, step) => {
    expect(yearStep(-length, 0)).toBe(step)
  })
})

describe('ratios', () => {
  it.each([
    [{ value: 293.4, ln: 5.68 }, '293'],
    [{ value: 13.49, ln: 2.6 }, '13'],
    [{ value: 4.4, ln: 1.48 }, '4.4'],
    [{ value: 0.0351, ln: -3.35 }, '0.035'],
    // ln 10^7 = 16.118; ln 10^-4 = −9.210
    [{ value: 1e7, ln: 16.118 }, 'about 10⁷'],
    [{ value: 1e-4, ln: -9.21 }, 'about 10⁻⁴'],
    [{ value: null, ln: 1167 }, 'about 10⁵⁰⁷'],
    [{ value: null, ln: Number.POSITIVE_INFINITY }, null],
    [{ value: null, ln: null }, null],
  ])('%j prints as %s', (ratio, printed) => {
    expect(ratioFigure(ratio)).toBe(printed)
  })
})

describe('angles and shifts', () => {
  it('prints as many digits as the standard deviation leaves', () => {
    expect(measuredDegrees({ value: 57.9077, sd: 2 / 60 })).toBe('57°54′ ± 2′')
    expect(measuredDegrees({ value: 57.9077, sd: 20 / 3600 })).toBe('57°54′28″ ± 20″')
    expect(measuredArcmin({ value: -19.26, sd: 2.04 })).toBe('−19.3′ ± 2.0′')
    expect(measuredArcmin({ value: 16.313, sd: 0.01 })).toBe('16.31′')
  })

  it('tells the side on which the line points, for who looks along it', () => {
    const azimuth = { measures: 'azimuth', sdArcmin: 2.5 } as const
    expect(offsetFromLine({ ...azimuth, arcmin: 30, also: ['87 cm'] })).toBe(
      '30′ ± 2.5′ (87 cm) to the right of it',
    )
    expect(offsetFromLine({ ...azimuth, arcmin: -30, sdArcmin: null })).toBe('30′ to the left of it')
    expect(offsetFromLine({ ...azimuth, arcmin: 0.005 })).toBe('at it')
    expect(whatPoints('azimuth', 'now')).toBe('the line points')
  })

  it('tells whether a measured altitude lies above or below its target', () => {
    const altitude = { measures: 'altitude', sdArcmin: null } as const
    expect(offsetFromLine({ ...altitude, arcmin: 30 })).toBe('30′ above it')
    expect(offsetFromLine({ ...altitude, arcmin: -30 })).toBe('30′ below it')
    expect(whatPoints('altitude', 'then')).toBe('the altitude measured lay')
  })

  it('names what is not to be seen', () => {
    const star = { body: 'star', measures: 'azimuth', event: 'rising of Acrux' } as const
    expect(noEvent(star)).toBe('no rising of Acrux at that altitude')
    const culmination = { body: 'star', measures: 'altitude', event: 'lower culmination of Vega' } as const
    expect(noEvent(culmination)).toBe('no lower culmination of Vega above the horizon')
    const pair = { body: 'two stars', measures: 'azimuth', event: 'alignment of Kochab and Mizar' } as const
    expect(noEvent(pair)).toBe('no alignment of Kochab and Mizar')
  })

  it('holds a shift against the Sun', () => {
    expect(sunWidthShare(-0.1384)).toBe('0.14 of the Sun’s width')
    expect(sunWidthShare(17.02)).toBe('17 times the Sun’s width')
    expect(sunWidthShare(0.001)).toBe('0 of the Sun’s width')
  })

  it('refuses what is no number', () => {
    expect(fixed(-0.04, 1)).toBe('0.0')
    expect(fixed(-0.06, 1)).toBe('−0.1')
    expect(() => fixed(Number.NaN, 1)).toThrow(RangeError)
  })
})

describe('words', () => {
  it('joins lists', () => {
    expect([[], ['a'], ['a', 'b'], ['a', 'b', 'c']].map(listed)).toEqual(['', 'a', 'a and b', 'a, b and c'])
  })

  it('names the obliquity models as the audit does', () => {
    for (const [model, { label }] of Object.entries(OBLIQUITY_MODELS)) expect(modelLabel(model)).toBe(label)
    expect(modelLabel('Stockwell 1873')).toBe('Stockwell 1873')
  })
})
