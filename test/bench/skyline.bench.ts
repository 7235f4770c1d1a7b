import { bench, describe } from 'vitest'
import { skylineOf } from '../../src/site/skyline.ts'
import { skylineCrossings } from '../../src/site/skyline-crossing.ts'
import { trueSkyline } from '../../src/site/true-skyline.ts'

/** A ridge of so many points over 60°, each a little higher or lower than the next. */
function ridge(points: number) {
  const nodes = Array.from({ length: points }, (_, i) => ({
    azimuthDeg: 30 + (60 * i) / (points - 1),
    altitudeDeg: 1 + 0.3 * Math.sin(i / 3) + 0.05 * Math.sin(7 * i),
    sdDeg: 0.03,
  }))
  return trueSkyline(skylineOf(nodes), (altitude) => 30 / (1 + Math.max(0, altitude)))
}

const SIGHTING = { latitudeDeg: 51, at: 'rising', aboveCentreArcmin: 16, parallaxArcsec: 8.8 } as const

describe.each([100, 1000, 10_000])('a skyline of %i points', (points) => {
  const skyline = ridge(points)
  const crossings = skylineCrossings(skyline, SIGHTING)

  bench('its table', () => {
    skylineCrossings(skyline, SIGHTING)
  })

  bench('1000 crossings', () => {
    for (let i = 0; i < 1000; i++) crossings.crossing(22 + i * 0.0025)
  })
})
