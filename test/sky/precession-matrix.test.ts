import { describe, test } from 'vitest'
import { eclipticPole } from '../../src/sky/long-term-poles.ts'
import { meanObliquityDeg } from '../../src/sky/mean-obliquity.ts'
import { precessionMatrix } from '../../src/sky/precession-matrix.ts'
import { dot, turn } from '../../src/sky/vector.ts'
import { expectWithin } from '../published/expect-within.ts'

describe('the rotation from J2000 to the equator and equinox of date', () => {
  // Test values of liberfa's own test program (t_erfa_c.c: t_ltp, Julian epoch 1666.666), from memory.
  const published = [
    ['0.9967044141159213819', '0.7437801893193210840e-1', '0.3237624409345603401e-1'],
    ['-0.7437802731819618167e-1', '0.9972293894454533070', '-0.1205768842723593346e-2'],
    ['-0.3237622482766575399e-1', '-0.1206286039697609008e-2', '0.9994750246704010914'],
  ]
  test.each(published.map((row, i) => ({ row, i })))('at 1666.666 has the published row $i', ({ row, i }) => {
    const got = precessionMatrix(1666.666)[i as 0 | 1 | 2]
    for (const [k, want] of row.entries()) expectWithin(got[k]!, Number(want), 1e-14, 'of the unit vector', k)
  })

  test.each([-190_000, -20_000, 2000, 12_000])('at %s has rows of length 1, at right angles', (year) => {
    const [x, y, z] = precessionMatrix(year)
    for (const row of [x, y, z]) expectWithin(dot(row, row), 1, 1e-14, 'of the unit vector')
    for (const pair of [dot(x, y), dot(y, z), dot(z, x)]) expectWithin(pair, 0, 1e-14, 'of the unit vector')
  })

  test.each([-20_000, -4000, 1500])('at %s puts the pole of the ecliptic at 18 h and 90° − ε', (year) => {
    const [x, y, z] = turn(precessionMatrix(year), eclipticPole(year))
    const obliquity = (meanObliquityDeg(year) * Math.PI) / 180
    expectWithin(x, 0, 1e-14, 'of the unit vector', 'x')
    expectWithin(y, -Math.sin(obliquity), 1e-14, 'of the unit vector', 'y')
    expectWithin(z, Math.cos(obliquity), 1e-14, 'of the unit vector', 'z')
  })
})
