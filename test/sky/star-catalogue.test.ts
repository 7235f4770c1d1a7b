import * as Astronomy from 'astronomy-engine'
import { describe, expect, test } from 'vitest'
import { FAINTEST_MAGNITUDE, labelOfStar, STARS } from '../../src/sky/star-catalogue.ts'
import { numberIn, readTextTable } from '../published/read-text-table.ts'

const starOfHr = (hr: number) => STARS.find((star) => star.hr === hr)!

describe('the catalogue of stars', () => {
  test('is the published table, row by row', () => {
    const rows = readTextTable('bright-stars.csv')
    expect(rows).toHaveLength(518)
    expect(
      STARS.map((star) => ({
        ...star,
        bayer: star.bayer === null ? null : `${star.bayer}${star.bayerNumber ?? ''}`,
      })),
    ).toEqual(
      rows.map((row) => ({
        hr: numberIn(row.hr),
        bayer: row.bayer || null,
        bayerNumber: numberIn(/\d?$/.exec(row.bayer!)?.[0]),
        constellation: row.constellation || null,
        flamsteed: numberIn(row.flamsteed),
        name: row.names || null,
        raDeg: numberIn(row.ra_deg),
        decDeg: numberIn(row.dec_deg),
        properMotionRaArcsecPerYear: numberIn(row.pm_ra_cosdec_arcsec_yr),
        properMotionDecArcsecPerYear: numberIn(row.pm_dec_arcsec_yr),
        parallaxArcsec: numberIn(row.parallax_arcsec),
        radialVelocityKmPerS: numberIn(row.radial_velocity_km_s),
        magnitude: numberIn(row.v_mag),
      })),
    )
  })

  test('is in the order of brightness, down to its limit', () => {
    const magnitudes = STARS.map((star) => star.magnitude)
    expect(magnitudes).toEqual([...magnitudes].sort((a, b) => a - b))
    expect(Math.max(...magnitudes)).toBe(FAINTEST_MAGNITUDE)
  })

  // Another program's boundaries of the constellations (Delporte 1930). Stars may have been lettered across a boundary;
  // of these, none has.
  test('has each star in its constellation', () => {
    for (const star of STARS.filter((held) => held.constellation !== null))
      expect(Astronomy.Constellation(star.raDeg / 15, star.decDeg).symbol, labelOfStar(star)).toBe(
        star.constellation,
      )
  })

  test('names a star as a person would', () => {
    expect([2491, 4915, 3485, 464, 5958, 2491].map(starOfHr).map(labelOfStar)).toEqual([
      'Sirius',
      'Chara',
      'delta Vel',
      '51 And',
      'HR 5958',
      'Sirius',
    ])
  })
})
