import { describe, expect, test } from 'vitest'
import { checkedPoint } from '../../src/site/geographic-point.ts'

describe('checkedPoint', () => {
  test.each([
    [90, 180],
    [-90, -360],
    [0, 360],
  ])('takes latitude %s° and longitude %s°', (latitudeDeg, longitudeDeg) => {
    const point = { latitudeDeg, longitudeDeg }
    expect(checkedPoint(point)).toBe(point)
  })

  test.each([
    [90.001, 0, 'the latitude is 90.001°; write one from −90° to 90°'],
    [Number.NaN, 0, 'the latitude is NaN°; write one from −90° to 90°'],
    [0, -361, 'the longitude is -361°; write one from −180° to 180°, east positive'],
    [0, Number.NaN, 'the longitude is NaN°; write one from −180° to 180°, east positive'],
  ])('refuses latitude %s°, longitude %s°', (latitudeDeg, longitudeDeg, message) => {
    expect(() => checkedPoint({ latitudeDeg, longitudeDeg })).toThrow(new RangeError(message))
  })
})
