import { describe, test } from 'vitest'
import { meanObliquityDeg } from '../../src/sky/mean-obliquity.ts'
import { expectWithin } from '../published/expect-within.ts'
import { readTable } from '../published/read-table.ts'

describe('meanObliquityDeg', () => {
  // Half a unit of the table's last figure is 0.0018″.
  test.each(readTable('obliquity.csv'))("at $year is liberfa's, $vondrak2011°", ({ year, vondrak2011 }) => {
    expectWithin(meanObliquityDeg(year!) * 3600, vondrak2011! * 3600, 0.002, 'arcsec')
  })

  test('at J2000 is the IAU 2006 value, 84381.406″', () => {
    expectWithin(meanObliquityDeg(2000) * 3600, 84381.406, 0.0005, 'arcsec')
  })
})
