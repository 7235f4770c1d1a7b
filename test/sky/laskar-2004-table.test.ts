import { describe, expect, test } from 'vitest'
import { LASKAR_2004_OBLIQUITY, LASKAR_2004_ORBIT } from '../../src/sky/laskar-2004-table.ts'
import { readTable } from '../published/read-table.ts'

describe('the table of Laskar et al. 2004', () => {
  test('has the obliquity of the published table at every row, ascending', () => {
    const published = readTable('obliquity.csv').map(({ year, laskar2004 }) => [year, laskar2004])
    expect(LASKAR_2004_OBLIQUITY).toEqual(published.sort((a, b) => a[0]! - b[0]!))
    expect(published).toHaveLength(56)
  })

  test('has the orbit of the published table at every row, ascending', () => {
    const published = readTable('orbit.csv').map((row) => [row.year, row.eccentricity, row.perihelion_deg])
    expect(LASKAR_2004_ORBIT).toEqual(published.sort((a, b) => a[0]! - b[0]!))
    expect(published).toHaveLength(41)
  })
})
