import { describe, expect, it } from 'vitest'
import type { Skyline } from '../../../src/audit/audit.ts'
import { altitudeOfSkyline, skylineEnds, skylineParts } from '../../../src/report/figures/horizon-skyline.ts'

function profile(nodes: Skyline['nodes']): Skyline {
  return { from: 'profile', words: '', nodes, at_line_deg: { value: 0, sd: 0 } }
}

const THROUGH_NORTH = profile([
  [350, 1],
  [358, 2],
  [364, 5],
])

const ALL_ROUND = profile([
  [10, 1],
  [130, 2],
  [250, 3],
  [370, 1],
])

describe('skylineParts', () => {
  it('is level from side to side where there is one node', () => {
    expect(skylineParts(profile([[80, 1.5]]), -3, 4)).toEqual([
      [
        [-3, 1.5],
        [4, 1.5],
      ],
    ])
  })

  it('cuts at both sides, and keeps the nodes between', () => {
    expect(skylineParts(THROUGH_NORTH, 354, 361)).toEqual([
      [
        [354, 1.5],
        [358, 2],
        [361, 3.5],
      ],
    ])
  })

  it('finds its way on another turn', () => {
    expect(skylineParts(THROUGH_NORTH, -4, 1)).toEqual([
      [
        [-4, 1.75],
        [-2, 2],
        [1, 3.5],
      ],
    ])
  })

  it('is in two parts, without a gap, where a full turn begins and ends', () => {
    const parts = skylineParts(ALL_ROUND, 9, 11)
    expect(parts.map((part) => part.map(([azimuth]) => azimuth))).toEqual([
      [9, 10],
      [10, 11],
    ])
    expect(parts.flat()[1]).toEqual(parts.flat()[2])
  })

  it('is nothing beyond its ends', () => {
    expect(skylineParts(THROUGH_NORTH, 10, 20)).toEqual([])
  })

  it('stands upright at a cliff', () => {
    const cliff = profile([
      [10, 1],
      [11, 1],
      [11, 4],
      [12, 4],
    ])
    expect(skylineParts(cliff, 10.5, 11.5)).toEqual([
      [
        [10.5, 1],
        [11, 1],
        [11, 4],
        [11.5, 4],
      ],
    ])
  })
})

describe('skylineEnds', () => {
  it('are those in view, on the turn of the view', () => {
    expect(skylineEnds(THROUGH_NORTH, -20, 20)).toEqual([
      { node: [-10, 1], beyond: 'left' },
      { node: [4, 5], beyond: 'right' },
    ])
    expect(skylineEnds(THROUGH_NORTH, -5, 3)).toEqual([])
  })

  it('are none of a full turn, nor of a level skyline', () => {
    expect(skylineEnds(ALL_ROUND, 0, 20)).toEqual([])
    expect(skylineEnds(profile([[80, 1]]), 70, 90)).toEqual([])
  })
})

describe('altitudeOfSkyline', () => {
  it.each([
    [354, 1.5],
    [-6, 1.5],
    [361, 3.5],
    [1, 3.5],
    // Beyond the ends, that of the nearer one.
    [345, 1],
    [10, 5],
  ])('at %s° is %s°', (azimuth, altitude) => {
    expect(altitudeOfSkyline(THROUGH_NORTH, azimuth)).toBeCloseTo(altitude, 9)
  })
})
