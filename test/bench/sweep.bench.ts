import { bench, describe } from 'vitest'
import { impliedDates } from '../../src/inference/implied-dates.ts'
import { halfBitLimit, otherIn95Limit, ratio3Limit } from '../../src/inference/limits.ts'
import { prepareSweep, sweepPoint } from '../../src/inference/sweep.ts'
import { refractionArcmin } from '../../src/site/refraction.ts'
import { meanObliquityDeg } from '../../src/sky/mean-obliquity.ts'
import { tabulatedObliquityDeg } from '../../src/sky/tabulated-obliquity.ts'
import {
  branchedSight,
  exactBranch,
  horizonSight,
  WORKED_LINE_WITH_MODELS,
  WORKED_WITH_MODELS,
} from '../inference/sights.ts'

// Only ratios within one run say anything: machines differ.

const WINDOW = { from: -20_000, to: 2026 }
const ASSERTED = { from: -9700, to: -9500 }
const OTHERS = [{ from: -800, to: -500 }]

/** A Sun that hardly sets: the weight of every year needs an integral over altitude. */
const FAR_NORTH = horizonSight({
  ...WORKED_LINE_WITH_MODELS,
  latitudeDeg: 66,
  azimuthDeg: 10,
  altitudeDeg: () => -0.1,
  altitudeSdDeg: () => 0.1,
})

/** A target that stands on either of two directions. */
const TWOFOLD = branchedSight(
  [exactBranch((year) => 60 + year / 1000), exactBranch((year) => 61 - year / 900)],
  {
    measuredSdDeg: 0.1,
  },
)

const ground = prepareSweep([WORKED_WITH_MODELS], WINDOW, ASSERTED, OTHERS)
const farNorth = prepareSweep([FAR_NORTH], WINDOW, ASSERTED, OTHERS)
const twofold = prepareSweep([TWOFOLD], WINDOW, ASSERTED, OTHERS)
const several = prepareSweep(
  [WORKED_WITH_MODELS, WORKED_WITH_MODELS, WORKED_WITH_MODELS],
  WINDOW,
  ASSERTED,
  OTHERS,
)

describe('the track against one step of the sweep on it', () => {
  bench('hold the line against the track at every date', () => {
    prepareSweep([WORKED_WITH_MODELS], WINDOW, ASSERTED, OTHERS)
  })
  bench('one step', () => {
    sweepPoint(ground, 20)
  })
  bench('one step where the track is curved', () => {
    sweepPoint(farNorth, 20)
  })
  bench('one step of a target of two branches', () => {
    sweepPoint(twofold, 20)
  })
  bench('one step of three lines together', () => {
    sweepPoint(several, 20)
  })
  bench('the three limits', () => {
    ratio3Limit(ground, 0)
    otherIn95Limit(ground, 0)
    halfBitLimit(ground)
  })
  bench('the implied dates', () => {
    impliedDates(WORKED_WITH_MODELS, -30_000, 12_026)
  })
})

describe('the obliquity from its series against the table of it', () => {
  bench('series', () => {
    meanObliquityDeg(-9600)
  })
  bench('table', () => {
    tabulatedObliquityDeg('vondrak2011', -9600)
  })
})

describe('refraction', () => {
  const air = { temperatureC: 10, pressureHpa: 1010, humidity: 0.5, lapseKPerKm: 6.5, heightM: 0 }
  bench('ray trace', () => {
    refractionArcmin(1.5, air, 41.27)
  })
})
