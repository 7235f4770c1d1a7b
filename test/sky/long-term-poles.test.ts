import { describe, test } from 'vitest'
import { eclipticPole, equatorPole, polynomial } from '../../src/sky/long-term-poles.ts'
import { expectWithin } from '../published/expect-within.ts'

const AXES = ['x', 'y', 'z'] as const

// Test values of liberfa's own test program (t_erfa_c.c: t_ltpecl, t_ltpequ).
describe.each([
  {
    pole: eclipticPole,
    name: 'ecliptic',
    year: -1500,
    published: ['0.4768625676477096525e-3', '-0.4052259533091875112', '0.9142164401096448012'],
  },
  {
    pole: equatorPole,
    name: 'equator',
    year: -2500,
    published: ['-0.3586652560237326659', '-0.1996978910771128475', '0.9118552442250819624'],
  },
])('the pole of the $name', ({ pole, year, published }) => {
  test.each(AXES.map((axis, i) => ({ axis, i })))(`at ${year} has the published $axis`, ({ axis, i }) => {
    expectWithin(pole(year)[i]!, Number(published[i]), 1e-14, 'of the unit vector', axis)
  })

  test.each([-190_000, -20_000, 2000, 12_000, 190_000])('is a unit vector at %s', (year) => {
    expectWithin(Math.hypot(...pole(year)), 1, 1e-14, 'of the unit vector')
  })
})

describe('polynomial', () => {
  test('is the sum of its powers', () => {
    expectWithin(polynomial([1, -2, 3, 4], 2), 1 - 4 + 12 + 32, 0, 'units')
  })
})
