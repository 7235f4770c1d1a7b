import type { Audit } from '../../../src/audit/audit.ts'
import {
  between,
  courseOf,
  crossings,
  impliedOf,
  makeShapedAudit,
  type Sets,
  stepAt,
  stepsFrom,
  stretchesAbout,
  TOLERANCES,
  trackOf,
  yearsOnLine,
} from './make-audit.ts'

const FROM = -20_000
const TO = 2026

/** The worked case: its printed sets at 0, 10′ and 30′, and shapes between and beyond them. */
export function premiseAudit(): Audit {
  const sets95 = between([
    [
      0,
      [
        [-10_460, -7835],
        [-7055, -4345],
      ],
    ],
    [
      2.9,
      [
        [-10_700, -7480],
        [-7400, -4080],
      ],
    ],
    [3, [[-10_720, -4060]]],
    [10, [[-11_880, -2800]]],
    [30, [[-14_665, 420]]],
    [90, [[-19_450, 1950]]],
    [110, [[FROM, 1985]]],
    [300, [[-19_350, TO]]],
  ])
  const sets68 = between([
    [
      0,
      [
        [-10_080, -8750],
        [-6080, -4790],
      ],
    ],
    [
      7.5,
      [
        [-10_500, -7560],
        [-7260, -4100],
      ],
    ],
    [7.8, [[-10_520, -4080]]],
    [30, [[-12_200, -2150]]],
    [100, [[-14_900, 380]]],
    [300, [[-15_450, -480]]],
  ])
  return makeShapedAudit({
    steps: stepsFrom(sets95, sets68),
    limits: [
      { against: 'radiocarbon', ratio_3_arcmin: 23.2, other_date_in_95_arcmin: 23.3, half_bit_arcmin: 25.8 },
    ],
  })
}

/** Documented precision: the asserted date keeps its lead over all of the plausible range. */
export function carriedAudit(): Audit {
  const sets = (tolerance: number): Sets => {
    const half = 160 + 70 * tolerance
    return [[Math.max(-3000, -1650 - half), Math.min(TO, -1650 + half)]]
  }
  return makeShapedAudit({
    outcome: 'carried',
    window: [-3000, TO],
    asserted: [-1700, -1600],
    others: [['oral tradition', 300, 700]],
    assumed: 3,
    plausible: { low_arcmin: 2, high_arcmin: 5, stated: true },
    steps: stepsFrom(sets),
    limits: [
      { against: 'oral tradition', ratio_3_arcmin: 14.2, other_date_in_95_arcmin: 31, half_bit_arcmin: 44 },
    ],
    lineDeg: { value: 58.4, sd: 0.02 },
  })
}

/** The line fits other dates than the asserted one, which lies outside the window besides. */
export function missedAudit(): Audit {
  const sets = (tolerance: number): Sets => {
    const half = 400 + 45 * tolerance
    return [[Math.max(-6000, -3100 - half), Math.min(TO, -3100 + half)]]
  }
  return makeShapedAudit({
    outcome: 'missed',
    window: [-6000, TO],
    asserted: [-10_550, -10_450],
    others: [['foundation inscription', 1140, 1140]],
    assumed: null,
    plausible: { low_arcmin: 10, high_arcmin: 60, stated: false },
    steps: stepsFrom(sets),
    limits: [{ against: 'foundation inscription', half_bit_arcmin: 61 }],
    lineDeg: { value: 58.1, sd: 0.1 },
    measuredLength: false,
  })
}

/** Nothing fits: the sets huddle at the dates that miss the line least. */
export function noneAudit(): Audit {
  const sets = (tolerance: number): Sets => {
    const width = 60 + 21_000 * (tolerance / 300) ** 0.9
    return [[FROM, Math.min(TO, FROM + width)]]
  }
  const line = { value: 64.2, sd: 0.3 }
  return makeShapedAudit({
    outcome: 'none',
    others: [],
    assumed: 0,
    steps: stepsFrom(sets),
    limits: [{ half_bit_arcmin: 260 }],
    lineDeg: line,
    implied: [impliedOf([], { year: -20_000, offset_arcmin: 263, sd_arcmin: 18, sun_widths: 8.1 })],
    noTarget: [[-1000, TO]],
  })
}

/** Five independent dates, some alike and one with a long label. */
export function severalAudit(): Audit {
  const base = premiseAudit()
  const others = [
    ['radiocarbon, hearth', -800, -500],
    ['radiocarbon, post', -760, -400],
    ['coin hoard beneath the threshold of the second court', 117, 138],
    ['pottery', -1400, -900],
    ['dendrochronology', -4890, -4890],
  ] as const
  const limits = [23.2, 24, 26.4, 19.8, null].map((ratio3, index) => ({
    against: others[index]![0],
    ratio_3_arcmin: ratio3,
    other_date_in_95_arcmin: 30 + index,
    half_bit_arcmin: 25.8,
  }))
  return makeShapedAudit({ others, limits, assumed: 10, steps: base.sweep.steps })
}

/** Sets of four parts that merge, split and vanish, one of them a few years long. */
export function partsAudit(): Audit {
  const sets95 = (tolerance: number): Sets => {
    const grown = 9 * tolerance
    const parts: [number, number][] = [
      [-17_000 - grown, -16_200 + grown],
      [-12_000, -11_990],
      [-8000 - grown, -7000 + grown],
      [-3000 - grown / 2, -2000 + grown / 2],
    ]
    if (tolerance > 60) return [[Math.max(FROM, -17_000 - grown), Math.min(TO, -2000 + grown)]]
    return tolerance > 20 ? parts.filter((_, index) => index !== 1) : parts
  }
  return makeShapedAudit({
    outcome: 'open',
    others: [],
    asserted: [-8000, -6000],
    assumed: 0.5,
    plausible: { low_arcmin: 0, high_arcmin: 300, stated: true },
    steps: TOLERANCES.map((tolerance) => stepAt(tolerance, sets95(tolerance))),
    limits: [{ half_bit_arcmin: 48 }],
    tracks: [trackOf('vondrak2011', { value: 58.9, sd: 0.5 }, 0)],
    lineDeg: { value: 58.9, sd: 0.5 },
  })
}

const WINDOW = [FROM, TO] as const

/** A wave of directions. */
function wave(middle: number, swing: number, period: number, late = 0): (year: number) => number {
  return (year) => middle + swing * Math.sin(((year - late) / period) * 2 * Math.PI)
}

/** Midway in days: two branches that hardly move, and an error of half a day that is wider than their swing. */
export function equinoxAudit(): Audit {
  const line = { value: 269.33, sd: 5 / 60 }
  const branches = [
    ['March equinox', wave(269.6, 0.45, 21_000)],
    ['September equinox', wave(269.6, -0.45, 21_000)],
  ] as const
  const years = branches
    .flatMap(([, direction]) => yearsOnLine(direction, line.value))
    .toSorted((a, b) => a - b)
  return makeShapedAudit({
    outcome: 'open',
    asserted: [-3400, -3200],
    others: [],
    lineDeg: line,
    steps: stepsFrom(() => [WINDOW]),
    limits: [{ half_bit_arcmin: 0 }],
    tracks: ['vondrak2011', 'laskar2004'].flatMap((model) =>
      branches.map(([branch_words, direction], branch) =>
        courseOf(model, line, direction, { branch, branch_words, sd: 17 }),
      ),
    ),
    implied: [
      {
        ...impliedOf(years),
        dates: impliedOf(years).dates.map((date) => ({ ...date, low95: null, high95: null })),
      },
    ],
    sightline: {
      event: 'equinox sunset',
      target: 'equinox sunset (midway in days), lower limb on the horizon',
      azimuth_deg: line,
      direction_at_asserted_deg: 269.4,
      notes: [],
    },
  })
}

/** The Sun at noon: an altitude on the meridian. */
export function noonAudit(): Audit {
  const line = { value: 34.59, sd: 0.05 }
  const course = wave(35.2, 1.05, 41_000, 2860)
  const years = yearsOnLine(course, line.value)
  return makeShapedAudit({
    asserted: [-1230, -1170],
    others: [['layers', -400, -200]],
    lineDeg: line,
    steps: stepsFrom((tolerance) => stretchesAbout(years, 900 + 90 * tolerance, WINDOW)),
    limits: [{ against: 'layers', ratio_3_arcmin: 1.4, half_bit_arcmin: 17 }],
    tracks: [courseOf('vondrak2011', line, course)],
    implied: [impliedOf(years)],
    sightline: {
      measures: 'altitude',
      event: 'December solstice noon',
      target: 'December solstice noon, centre',
      azimuth_deg: { value: 180, sd: 0 },
      altitude_deg: line,
      refraction_arcmin: { value: 1.3, sd: 0.3 },
      centre_altitude_deg: { value: 34.57, sd: 0.05 },
      direction_at_asserted_deg: 34.59,
      notes: [],
    },
  })
}

/** The Moon at a standstill, which swings by 9′ besides. */
export function moonAudit(): Audit {
  const line = { value: 46.43, sd: 3 / 60 }
  const course = wave(47.6, 1.6, 41_000, 2860)
  const years = yearsOnLine(course, line.value)
  return makeShapedAudit({
    asserted: [-2600, -2400],
    others: [['radiocarbon', -1900, -1700]],
    lineDeg: line,
    steps: stepsFrom((tolerance) => stretchesAbout(years, 2500 + 60 * tolerance, WINDOW)),
    limits: [{ against: 'radiocarbon', half_bit_arcmin: 31 }],
    tracks: [courseOf('vondrak2011', line, course, { sd: 11 })],
    implied: [impliedOf(years)],
    sightline: {
      body: 'moon',
      event: 'northern major standstill moonrise',
      target: 'northern major standstill moonrise, upper limb on the horizon',
      azimuth_deg: line,
      semidiameter_arcmin: { value: 15.54, sd: 0 },
      direction_at_asserted_deg: 46.43,
      notes: ['A standstill comes back every 18.6 years.'],
    },
  })
}

/** A star whose course crosses the line eight times, goes round through north, and that a short model loses. */
export function starAudit(): Audit {
  const line = { value: 8, sd: 0.1 }
  const course = wave(2, 62, 10_500)
  const short = (year: number) => course(year) + ((year - 2000) / 1600) ** 3
  const years = yearsOnLine(course, line.value)
  return makeShapedAudit({
    asserted: [-2550, -2450],
    others: [['foundation text', -1900, -1850]],
    assumed: 2,
    lineDeg: line,
    steps: stepsFrom((tolerance) => stretchesAbout(years, 40 + 14 * tolerance, WINDOW)),
    limits: [
      { against: 'foundation text', ratio_3_arcmin: 12, ratio_3_steady: false, other_date_in_95_arcmin: 50 },
    ],
    tracks: [
      courseOf('vondrak2011', line, course, { sd: 40 }),
      courseOf('p03', line, short, { from: -5000, to: 10_000, sd: 40 }),
    ],
    implied: [impliedOf(years)],
    sightline: {
      body: 'star',
      event: 'rising of Sirius',
      target: 'rising of Sirius, first visible at 2.4° by extinction',
      azimuth_deg: line,
      altitude_deg: { value: 0.17, sd: 0.08 },
      semidiameter_arcmin: null,
      direction_at_asserted_deg: 64,
      notes: ['Sirius has magnitude −1.5.'],
    },
  })
}

/** A star that vanishes below the southern horizon for ages. */
export function vanishingAudit(): Audit {
  const line = { value: 172, sd: 0.05 }
  const wide = wave(165, 30, 26_000, -5000)
  const course = (year: number) => (wide(year) > 180 ? null : wide(year))
  const years = yearsOnLine(course, line.value)
  return makeShapedAudit({
    asserted: [-4050, -3950],
    others: [],
    lineDeg: line,
    steps: stepsFrom((tolerance) => stretchesAbout(years, 60 + 12 * tolerance, WINDOW)),
    noTarget: stretchesAbout([2000], 4000, WINDOW),
    limits: [{ half_bit_arcmin: 200 }],
    outcome: 'open',
    tracks: [courseOf('vondrak2011', line, course, { sd: 30 })],
    implied: [impliedOf(years)],
    sightline: {
      body: 'star',
      event: 'rising of Acrux',
      target: 'rising of Acrux on the horizon',
      azimuth_deg: line,
      semidiameter_arcmin: null,
      direction_at_asserted_deg: course(-4000),
      notes: [],
    },
  })
}

/** A star that never rises there. */
export function neverAudit(): Audit {
  const line = { value: 150, sd: 0.05 }
  return makeShapedAudit({
    outcome: 'none',
    others: [],
    lineDeg: line,
    steps: stepsFrom(() => []),
    noTarget: [WINDOW],
    limits: [{}],
    tracks: [courseOf('vondrak2011', line, () => null)],
    implied: [impliedOf([], { year: -8987, offset_arcmin: null, sd_arcmin: null, sun_widths: null })],
    sightline: {
      body: 'star',
      event: 'rising of Acrux',
      target: 'rising of Acrux on the horizon',
      azimuth_deg: line,
      semidiameter_arcmin: null,
      centre_altitude_deg: null,
      declination_deg: null,
      direction_at_asserted_deg: null,
      offset_at_asserted_arcmin: null,
      offset_at_asserted_sd_arcmin: null,
      closest_in_asserted: null,
      notes: [],
    },
  })
}

/** Two stars one above the other, the one or the other on top: twelve dates about a line just west of north. */
export function pairAudit(): Audit {
  const line = { value: 359.87, sd: 2 / 60 }
  const names = ['Kochab above', 'Mizar above']
  const courses = [wave(360, 24, 14_000, 1200), wave(360.5, -31, 14_000, 2900)] as const
  const years = courses.flatMap((course) => yearsOnLine(course, line.value)).toSorted((a, b) => a - b)
  return makeShapedAudit({
    asserted: [-2470, -2430],
    others: [['king list', -2560, -2530]],
    assumed: 3,
    plausible: { low_arcmin: 3, high_arcmin: 15, stated: true },
    lineDeg: line,
    steps: stepsFrom((tolerance) => stretchesAbout(years, 8 + 4 * tolerance, WINDOW)),
    limits: [{ against: 'king list', ratio_3_arcmin: 2.1, other_date_in_95_arcmin: 9, half_bit_arcmin: 290 }],
    tracks: [
      ...courses.map((course, branch) =>
        courseOf('vondrak2011', line, course, { branch, branch_words: names[branch]!, sd: 3 }),
      ),
      ...courses.map((course, branch) =>
        courseOf('p03', line, (year) => course(year + (year - 2000) / 40), {
          ...{ branch, branch_words: names[branch]!, sd: 3 },
          ...{ from: -5000, to: 10_000 },
        }),
      ),
    ],
    implied: [impliedOf(years)],
    sightline: {
      body: 'two stars',
      event: 'alignment of Kochab and Mizar, one above the other',
      target: 'alignment of Kochab and Mizar, one above the other',
      azimuth_deg: line,
      semidiameter_arcmin: null,
      centre_altitude_deg: null,
      declination_deg: null,
      direction_at_asserted_deg: 359.8,
      notes: [],
    },
  })
}

/** Stars again, whose dates and sets fill so little of the window that the figure shows a part of it. */
export function narrowAudit(): Audit {
  const base = pairAudit()
  const years = [-2491, -2439]
  return makeShapedAudit({
    asserted: [-2470, -2430],
    others: [['king list', -2560, -2530]],
    assumed: 3,
    plausible: { low_arcmin: 3, high_arcmin: 15, stated: true },
    lineDeg: base.tracks[0]!.line_deg,
    // Beyond the plausible tolerances another date comes in, far from these.
    steps: stepsFrom((tolerance) =>
      stretchesAbout(tolerance > 100 ? [...years, -19_000] : years, 12 + 6 * tolerance, WINDOW),
    ),
    limits: [{ against: 'king list', ratio_3_arcmin: 2.1, other_date_in_95_arcmin: 9 }],
    tracks: base.tracks,
    implied: [impliedOf(years)],
    sightline: base.sightlines[0]!,
  })
}

/** A calendar of three lines, each with its own day; the last one’s direction hardly dates at all. */
export function calendarAudit(): Audit {
  const joint = premiseAudit()
  const [first] = joint.sightlines
  const line = { value: 72.4, sd: 0.08 }
  const lines = [
    { name: 'midsummer', event: 'June solstice sunrise', sd: 2.5 },
    { name: 'thirty days', event: 'sunrise 30 days after the June solstice', sd: 7 },
    { name: 'sixty days', event: 'sunrise 60 days after the June solstice', sd: 14 },
  ]
  return {
    ...joint,
    sightlines: lines.map(({ name, event }, index) => ({
      ...first!,
      name,
      event,
      target: `${event}, centre on the horizon`,
      sweep: {
        ...joint.sweep,
        steps: stepsFrom((tolerance) =>
          stretchesAbout([-5000], 2500 * (index + 1) + 90 * tolerance, WINDOW),
        ).map((step) => ({
          ...step,
          bits: 1.5 / (index + 1) / (1 + step.tolerance_arcmin / 20),
          ratios: [
            { against: 'radiocarbon', value: 3 / (index + 1), ln: Math.log(3 / (index + 1)), words: '' },
          ],
        })),
      },
    })),
    tracks: [
      ...joint.tracks,
      ...lines
        .slice(1)
        .map(({ name, sd }) =>
          courseOf('vondrak2011', line, wave(72.5, 0.4, 21_000), { sightline: name, sd }),
        ),
    ],
    implied: lines.map(({ name }, index) => ({
      ...impliedOf(index === 0 ? crossings(57.9077) : yearsOnLine(wave(72.5, 0.4, 21_000), line.value)),
      sightline: name,
    })),
    today: lines.map(({ name }) => ({
      ...{ sightline: name, year: 2026, direction_deg: 59, offset_arcmin: -65 },
      ...{ sun_widths: 2.1, offset_cm: 190, next: null, next_reason: 'none is reckoned here' },
    })),
  }
}

export const CASES: Readonly<Record<string, () => Audit>> = {
  premise: premiseAudit,
  carried: carriedAudit,
  missed: missedAudit,
  none: noneAudit,
  several: severalAudit,
  parts: partsAudit,
  equinox: equinoxAudit,
  noon: noonAudit,
  moon: moonAudit,
  star: starAudit,
  vanishing: vanishingAudit,
  never: neverAudit,
  pair: pairAudit,
  narrow: narrowAudit,
  calendar: calendarAudit,
}
