import { describe, expect, test } from 'vitest'
import { distinctSights } from '../../src/inference/distinct-sights.ts'
import { horizonSight, WORKED_LINE } from './sights.ts'

const line = { ...WORKED_LINE, axis: 'p\nq' }

describe('distinctSights', () => {
  test('leaves a line out that stands there twice, whatever its name', () => {
    const [first, other] = [horizonSight(line), horizonSight({ ...line, axis: 'p\nr' })]
    const again = { ...horizonSight(line), name: 'again' }
    expect(distinctSights([first, other, again])).toEqual([first, other])
    expect(distinctSights([first, other, again])[0]).toBe(first)
  })

  test.each([
    ['between no points', { axis: null }, { axis: null }],
    ['between other points', {}, { axis: 'p\nr' }],
    ['the other way round', {}, { azimuthDeg: line.azimuthDeg + 180 }],
    ['of a setting', {}, { at: 'setting' as const }],
    ['over another horizon', {}, { altitudeDeg: () => 2 }],
    ['over a horizon known less well', {}, { altitudeSdDeg: () => 0.1 }],
    ['of another body', {}, { declinationDeg: () => 20 }],
  ])('keeps lines %s', (_, one, two) => {
    const sights = [horizonSight({ ...line, ...one }), horizonSight({ ...line, ...two })]
    expect(distinctSights(sights)).toEqual(sights)
  })

  test('tells targets apart that are both never to be seen', () => {
    const unseen = [80, 85].map((altitude) => horizonSight({ ...line, altitudeDeg: () => altitude }))
    expect(distinctSights(unseen)).toHaveLength(2)
  })
})
