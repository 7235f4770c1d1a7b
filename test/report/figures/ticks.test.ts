import { describe, expect, it } from 'vitest'
import { directionTicks } from '../../../src/report/figures/direction-ticks.ts'
import {
  keepLegible,
  lengthTicks,
  ratioTicks,
  toleranceTicks,
} from '../../../src/report/figures/log-ticks.ts'
import { minorYears, yearTicks } from '../../../src/report/figures/year-ticks.ts'

describe('yearTicks', () => {
  it('are round as people count, on both sides of a year 0 that does not exist', () => {
    expect(yearTicks(-20_000, 2026, 7)).toEqual([
      { at: -19_999, label: '20,000 BCE' },
      { at: -14_999, label: '15,000 BCE' },
      { at: -9999, label: '10,000 BCE' },
      { at: -4999, label: '5000 BCE' },
      { at: 1, label: '1 CE' },
    ])
  })

  it('suit a short window', () => {
    expect(yearTicks(1110, 1145, 7).map(({ label }) => label)).toEqual([
      '1110 CE',
      '1120 CE',
      '1130 CE',
      '1140 CE',
    ])
  })

  it.each([
    [-20_000, 2026],
    [-3000, 500],
    [-1, 3],
    [900, 901],
    [-300_000, 2000],
  ])('are at most seven and within %d to %d', (from, to) => {
    const ticks = yearTicks(from, to, 7)
    expect(ticks.length).toBeGreaterThan(0)
    expect(ticks.length).toBeLessThanOrEqual(8)
    for (const { at } of [...ticks, ...minorYears(from, to, 7).map((at) => ({ at }))]) {
      expect(at >= from && at <= to).toBe(true)
    }
  })
})

describe('toleranceTicks', () => {
  it('are those people read', () => {
    expect(toleranceTicks(0.5, 300).map(({ label }) => label)).toEqual([
      '30″',
      '1′',
      '2′',
      '5′',
      '10′',
      '20′',
      '30′',
      '1°',
      '2°',
      '5°',
    ])
  })
})

describe('lengthTicks and ratioTicks', () => {
  it('run one, two, five', () => {
    expect(lengthTicks(4, 260).map(({ label }) => label)).toEqual([
      '5 cm',
      '10 cm',
      '20 cm',
      '50 cm',
      '1 m',
      '2 m',
    ])
    expect(ratioTicks(0.03, 3).map(({ label }) => label)).toEqual(['0.05', '0.1', '0.2', '0.5', '1', '2'])
    expect(ratioTicks(0, 3)).toEqual([])
  })
})

describe('directionTicks', () => {
  it('are whole parts of a degree, printed within the circle', () => {
    expect(directionTicks('azimuth', 57.6, 59.2, 8).map(({ label }) => label)).toEqual([
      '57°45′',
      '58°00′',
      '58°15′',
      '58°30′',
      '58°45′',
      '59°00′',
    ])
    expect(directionTicks('azimuth', -2.5, 3, 8).map(({ label }) => label)).toEqual([
      '358°',
      '359°',
      '0°',
      '1°',
      '2°',
      '3°',
    ])
  })

  it('are altitudes with their sign, up to the zenith', () => {
    expect(directionTicks('altitude', -12, 103, 8).map(({ label }) => label)).toEqual([
      ...['0°', '15°', '30°', '45°', '60°', '75°', '90°'],
    ])
    expect(directionTicks('altitude', -1.2, 0.4, 5).map(({ label }) => label)).toEqual([
      ...['−1°00′', '−0°30′', '0°00′'],
    ])
  })
})

describe('keepLegible', () => {
  it('leaves out labels that would touch, or reach too far', () => {
    const ticks = [0, 5, 40, 80].map((at) => ({ at, label: '10,000' }))
    expect(keepLegible(ticks, (at) => at, 7.5, 80).map(({ at }) => at)).toEqual([0, 40])
  })
})
