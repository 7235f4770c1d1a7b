import { describe, expect, it } from 'vitest'
import { sunWidthCount } from '../../../src/report/wording/sun-width-count.ts'
import { toleranceRange } from '../../../src/report/wording/tolerance-range.ts'

describe('sunWidthCount', () => {
  it.each([
    [0.0567, '0.06 Sun’s widths'],
    [-1.111, '1.1 Sun’s widths'],
    [0.999, '1 Sun’s width'],
    [0, '0 Sun’s widths'],
  ])('prints %s', (count, printed) => {
    expect(sunWidthCount(count)).toBe(printed)
  })
})

describe('toleranceRange', () => {
  it.each([
    [10, 60, '10′ to 1°'],
    [0, 5, 'exact to 5′'],
    [3, 3, '3′'],
    [0, 0, 'exact'],
  ])('prints %s to %s', (low, high, printed) => {
    expect(toleranceRange(low, high)).toBe(printed)
  })
})
