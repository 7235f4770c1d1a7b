import { describe, expect, test } from 'vitest'
import { sightOf } from '../../../src/audit/sight-of.ts'
import type { SightlineInputs } from '../../../src/audit/sightline-inputs.ts'
import { compare } from '../../../src/inference/comparison.ts'
import type { Branch } from '../../../src/inference/sight.ts'
import { lnWeight } from '../../../src/inference/weight.ts'
import { wrap180 } from '../../../src/quantity/degrees.ts'
import { skylineCrossings } from '../../../src/site/skyline-crossing.ts'
import { seededRandom } from '../../inference/seeded-random.ts'
import { expectWithin } from '../../published/expect-within.ts'
import { readTable } from '../../published/read-table.ts'
import { firstContact } from '../../site/first-contact.ts'
import { claimText } from '../audit-of.ts'
import { obliquityOf, semidiameterArcmin } from '../by-tables.ts'
import { auditWith, profileOf, settledLine } from '../settled.ts'

type Nodes = readonly (readonly [number, number])[]

const YEARS = [-9000, -3000, 1000]

interface Setting {
  latitude: number
  target: string
  azimuth: number
  atmosphere?: string
}

function textOf({ latitude, target, azimuth, atmosphere }: Setting, horizon: string): string {
  return claimText({
    structure: `{name: Place, latitude: ${Math.abs(latitude)}° ${latitude < 0 ? 'S' : 'N'}, elevation: 100 m}`,
    sightlines: `{one: {azimuth: ${azimuth}° ± 2′, horizon: ${horizon}}}`,
    target,
    ...(atmosphere === undefined ? {} : { atmosphere }),
  })
}

function overProfile(setting: Setting, nodes: Nodes, sdDeg: number): SightlineInputs {
  return settledLine(textOf(setting, '{profile: s.csv}'), { 's.csv': profileOf(nodes, sdDeg) })
}

function branchOf(line: SightlineInputs): Branch {
  const [branch, ...others] = sightOf(line).branches
  if (branch === undefined || others.length > 0) throw new Error('want one branch')
  return branch
}

describe('over a level profile', () => {
  // The same altitude all round is what the level horizon has by its formula, cos A = (sin δ − sin φ sin h)/cos φ cos h.
  test.each([
    ['the Sun’s upper limb', { latitude: 51, target: sun('june', 'rising', 'upper limb'), azimuth: 50 }, 1],
    ['the Sun’s lower limb', { latitude: 51, target: sun('june', 'setting', 'lower limb'), azimuth: 310 }, 2],
    ['the Sun’s centre', { latitude: -33, target: sun('december', 'rising', 'centre'), azimuth: 118 }, 0.5],
    ['a strip of the Sun', { latitude: 10, target: sun('june', 'rising', '4′ showing'), azimuth: 66 }, 1],
    [
      'the Moon',
      {
        latitude: 53,
        target: '{body: moon, event: southern minor standstill, at: setting, disc: upper limb}',
        azimuth: 235,
      },
      1,
    ],
    ['a star held by extinction', { latitude: 30, target: '{body: Sirius, at: rising}', azimuth: 112 }, -0.3],
    [
      'a fainter star held by extinction',
      { latitude: 30, target: '{body: Antares, at: setting}', azimuth: 240 },
      0,
    ],
    ['a star on a high horizon', { latitude: 30, target: '{body: Sirius, at: rising}', azimuth: 112 }, 5],
  ])('%s stands where it does over a level horizon, with the same errors', (_, setting, altitude) => {
    const nodes = Array.from(
      { length: 41 },
      (_, i) => [(setting.azimuth - 40 + 2 * i + 360) % 360, altitude] as const,
    )
    const profile = branchOf(overProfile(setting, nodes, 0.05))
    const level = branchOf(settledLine(textOf(setting, `${altitude}° ± 3′`)))
    for (const year of [-6000, -3000, 1000]) {
      const [got, want] = [profile.predict(year)!, level.predict(year)!]
      // 1″ is what the crossings of a profile are good to.
      expectWithin(wrap180(got.directionDeg - want.directionDeg) * 3600, 0, 1, 'arcsec', year)
      expect(got.errors).toHaveLength(want.errors.length)
      want.errors.forEach(({ effectDeg, source }, i) => {
        expectWithin(got.errors[i]!.effectDeg / effectDeg, 1, 0.01, 'of the effect', `${source} ${year}`)
      })
      expect(profile.curve!(year)).toBeNull()
    }
  })
})

function sun(solstice: 'june' | 'december', at: 'rising' | 'setting', disc: string): string {
  return `{body: sun, event: ${solstice} solstice, at: ${at}, disc: ${disc}}`
}

/** Where the claim gives its refraction, less parallax, the skyline without air is lower by that all along. */
const GIVEN_ARCMIN = 25
const GIVEN = `{refraction: ${GIVEN_ARCMIN}′, refraction_uncertainty: 1′}`

function withoutAir(nodes: Nodes) {
  const lowered = nodes.map(([azimuthDeg, altitude]) => ({
    azimuthDeg,
    altitudeDeg: altitude - GIVEN_ARCMIN / 60,
  }))
  return { nodes: lowered, isClosed: false }
}

/** Jags of a seeded random height. */
function jagged(seed: number, from: number, to: number, step: number, roughness: number): Nodes {
  const { uniform, normal } = seededRandom(seed)
  const nodes: [number, number][] = []
  for (let azimuth = from; azimuth < to; azimuth += step * (0.3 + 1.4 * uniform()))
    nodes.push([Number(azimuth.toFixed(6)), Number((1.5 + roughness * normal()).toFixed(6))])
  return nodes
}

const slope = (from: number, to: number, low: number, high: number): Nodes => [
  [from, low],
  [to, high],
]

describe('over a skyline that is not level, by following the disc in steps of its hour angle', () => {
  const cases: readonly {
    name: string
    setting: Setting
    nodes: Nodes
    above: (year: number) => number
    sign: 1 | -1
    at: 'rising' | 'setting'
  }[] = [
    {
      name: 'a slope that climbs with the Sun',
      setting: { latitude: 51, target: sun('june', 'rising', 'upper limb'), azimuth: 52, atmosphere: GIVEN },
      nodes: slope(35, 75, 0, 4),
      above: (year) => semidiameterArcmin(year, 90),
      sign: 1,
      at: 'rising',
    },
    {
      name: 'a slope that falls, lower limb',
      setting: {
        latitude: -40,
        target: sun('december', 'setting', 'lower limb'),
        azimuth: 240,
        atmosphere: GIVEN,
      },
      nodes: slope(220, 260, 4, 0.5),
      above: (year) => -semidiameterArcmin(year, 270),
      sign: -1,
      at: 'setting',
    },
    ...[3, 4, 5].map((seed) => ({
      name: `crags, ${seed}`,
      setting: { latitude: 45, target: sun('june', 'rising', 'upper limb'), azimuth: 57, atmosphere: GIVEN },
      nodes: jagged(seed, 40, 80, 0.6, 0.35),
      above: (year: number) => semidiameterArcmin(year, 90),
      sign: 1 as const,
      at: 'rising' as const,
    })),
    {
      name: 'crags, the centre of a setting Sun',
      setting: { latitude: 45, target: sun('june', 'setting', 'centre'), azimuth: 303, atmosphere: GIVEN },
      nodes: jagged(6, 280, 320, 0.6, 0.35),
      above: () => 0,
      sign: 1,
      at: 'setting',
    },
  ]
  test.each(cases)('$name', ({ setting, nodes, above, sign, at }) => {
    const branch = branchOf(overProfile(setting, nodes, 0.02))
    for (const year of YEARS) {
      const size = above(year)
      const want = firstContact(withoutAir(nodes), setting.latitude, sign * obliquityOf(year), size / 60, at)!
      const { directionDeg, discCentre } = branch.predict(year)!
      const sighted = size > 0 ? want.contactAzimuthDeg : want.centreAzimuthDeg
      // The crossings are good to 1″ of a body that comes in steeply; between two tabulated sizes, a quarter of a minute
      // apart, the place of the gleam on a crag's corner bends by as much once more.
      expectWithin(wrap180(directionDeg - sighted) * 3600, 0, 3, 'arcsec', year)
      expectWithin(wrap180(discCentre!.azimuthDeg - want.centreAzimuthDeg) * 3600, 0, 3, 'arcsec', year)
    }
  })
})

const SHIFTS = 300
const DRAWS = 5

describe('the weight over crags', () => {
  const setting = {
    latitude: 45,
    target: sun('june', 'rising', 'upper limb'),
    azimuth: 57,
    atmosphere: GIVEN,
  }
  /** Two summits with a notch between them that a disc does not fit into, and a step. */
  const crags: Nodes = [
    [48, 2],
    [56, 2],
    [56.3, 1.2],
    [56.6, 2.1],
    [57.5, 1.9],
    [57.6, 1.2],
    [59, 1.1],
    [66, 1.3],
  ]

  /**
   * By drawing the errors themselves: the skyline raised by its own error and the day's refraction, the declination by
   * the others, for each the place of the gleam, and the mean of the normal density of the line about it.
   */
  function sampledWeights(
    nodes: Nodes,
    year: number,
    toleranceDeg: number,
    azimuths: readonly number[],
  ): number[] {
    const { normal } = seededRandom(31)
    const raisedSd = Math.hypot(0.05, 1 / 60)
    const declinationSd = declinationSdOf(year)
    const sd = Math.hypot(2 / 60, toleranceDeg)
    const sum = azimuths.map(() => 0)
    for (let i = 0; i < SHIFTS; i++) {
      // In even shares of the normal distribution, so that only the declination is left to chance.
      const skylineShiftDeg = raisedSd * quantile((i + 0.5) / SHIFTS)
      const { crossing } = skylineCrossings(withoutAir(nodes), {
        latitudeDeg: setting.latitude,
        at: 'rising',
        aboveCentreArcmin: semidiameterArcmin(year, 90),
        parallaxArcsec: 0,
        skylineShiftDeg,
      })
      for (let draw = 0; draw < DRAWS; draw++) {
        const found = crossing(obliquityOf(year) + declinationSd * normal())
        if (found.kind !== 'crossing') continue
        azimuths.forEach((azimuth, k) => {
          sum[k]! += Math.exp(-(((azimuth - found.azimuthDeg) / sd) ** 2) / 2) / sd
        })
      }
    }
    return sum.map((total) => total / (SHIFTS * DRAWS))
  }

  const cases = [
    ...[-3000, 1000].map((year) => ({ name: `crags in ${year}`, nodes: crags, year })),
    ...[7, 8].map((seed) => ({ name: `jags ${seed}`, nodes: jagged(seed, 48, 66, 0.6, 0.35), year: -3000 })),
  ]
  test.each(cases)('$name, is that of the errors drawn', ({ nodes, year }) => {
    const line = overProfile(setting, nodes, 0.05)
    const sight = sightOf(line)
    const [branch] = sight.branches
    const prediction = branch!.predict(year)!
    const azimuths = [-0.6, -0.3, -0.1, 0, 0.1, 0.3, 0.6].map((turn) => prediction.directionDeg + turn)
    for (const toleranceDeg of [0, 0.1, 0.5]) {
      const want = sampledWeights(nodes, year, toleranceDeg, azimuths)
      const highest = Math.max(...want)
      azimuths.forEach((azimuth, k) => {
        const got = Math.exp(
          lnWeight([[compare({ ...sight, measuredDeg: azimuth }, branch!, year)]], toleranceDeg),
        )
        // What bends by less than a tenth counts as straight, which shows in the tails, at a twentieth of the highest.
        expectWithin(
          got,
          want[k]!,
          0.03 * want[k]! + 0.005 * highest,
          'of the density',
          `${azimuth} ${toleranceDeg}`,
        )
      })
    }
  })
})

/** Nutation's 9.2″ over its cycle, and half of what Vondrák 2011 and Laskar 2004 part by, as the report lists them. */
function declinationSdOf(year: number): number {
  const row = readTable('obliquity.csv').find((held) => held.year === year)!
  return Math.hypot(9.2 / Math.SQRT2 / 3600, (row.vondrak2011! - row.laskar2004!) / 2)
}

/** Of the standard normal distribution, by halving its integral (Abramowitz & Stegun 26.2.17, good to 1e−7). */
function quantile(share: number): number {
  let [low, high] = [-8, 8]
  for (let i = 0; i < 50; i++) {
    const middle = (low + high) / 2
    if (cumulative(middle) < share) low = middle
    else high = middle
  }
  return low
}

function cumulative(x: number): number {
  const t = 1 / (1 + 0.2316419 * Math.abs(x))
  const poly =
    t * (0.31938153 + t * (-0.356563782 + t * (1.781477937 + t * (-1.821255978 + t * 1.330274429))))
  const tail = (Math.exp((-x * x) / 2) / Math.sqrt(2 * Math.PI)) * poly
  return x > 0 ? 1 - tail : tail
}

describe('the directions over a run of errors', () => {
  test('pass through the one that is foretold where there is no error', () => {
    const setting = {
      latitude: 45,
      target: sun('june', 'rising', 'upper limb'),
      azimuth: 57,
      atmosphere: GIVEN,
    }
    let looked = 0
    for (const seed of [3, 4, 5, 6, 7, 8]) {
      const branch = branchOf(overProfile(setting, jagged(seed, 40, 80, 0.6, 0.35), 0.05))
      for (const year of YEARS) {
        const piece = branch.curve!(year)?.find(({ fromSd, toSd }) => fromSd <= 0 && toSd >= 0)
        if (piece === undefined) continue
        looked++
        const share = -piece.fromSd / (piece.toSd - piece.fromSd)
        const direction = piece.fromDeg + share * (piece.toDeg - piece.fromDeg)
        // A piece ends there, or runs on in one line with the next, to 0.7″ at each of a few joints.
        expectWithin(
          (direction - branch.predict(year)!.directionDeg) * 3600,
          0,
          2,
          'arcsec',
          `${seed} ${year}`,
        )
      }
    }
    expect(looked).toBeGreaterThan(5)
  })
})

describe('beyond the ends of a profile', () => {
  const setting = { latitude: 51, target: sun('june', 'rising', 'upper limb'), azimuth: 57 }
  const short = Array.from({ length: 6 }, (_, i) => [55 + i, 1] as const)

  test('it goes on level, as uncertain as one that nobody measured', () => {
    const got = branchOf(overProfile(setting, short, 0.02)).predict(-3000)!
    const want = branchOf(settledLine(textOf(setting, '1° ± 30′'))).predict(-3000)!
    expect(want.directionDeg).toBeLessThan(54)
    expectWithin((got.directionDeg - want.directionDeg) * 3600, 0, 1, 'arcsec')
    expectWithin(got.errors[0]!.effectDeg / want.errors[0]!.effectDeg, 1, 0.02, 'of the effect')
  })

  test('a warning tells of it, and of the year', () => {
    const text = textOf(setting, '{profile: s.csv}')
    const { warnings } = auditWith(text, { 's.csv': profileOf(short, 0.02) })
    expect(warnings.join()).toMatch(
      /does not reach .*the place of the target in 2100 to 1900 BCE; .*go on level, ± 30′/,
    )
    const wide = Array.from({ length: 31 }, (_, i) => [35 + i, 1] as const)
    expect(auditWith(text, { 's.csv': profileOf(wide, 0.02) }).warnings.join()).not.toMatch(/does not reach/)
  })
})

describe('a formula carried far beyond its range', () => {
  test('leaves no direction where it has no declination', () => {
    const setting = {
      latitude: 51,
      target: '{body: moon, event: northern minor standstill, at: rising}',
      azimuth: 57,
    }
    const branch = branchOf({ ...overProfile(setting, slope(30, 80, 1, 2), 0.02), model: 'p03' })
    // The polynomial of IAU 2006 has an obliquity of 174.6° in 42,001 BCE (test/published/obliquity.csv).
    expect(branch.predict(-42_000)).toBeNull()
    expect(branch.curve!(-42_000)).toEqual([])
  })
})
