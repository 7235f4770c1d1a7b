import type { Audit } from '../../../src/audit/audit.ts'
import {
  between,
  impliedOf,
  makeShapedAudit,
  type Sets,
  stepAt,
  stepsFrom,
  TOLERANCES,
  trackOf,
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

export const CASES: Readonly<Record<string, () => Audit>> = {
  premise: premiseAudit,
  carried: carriedAudit,
  missed: missedAudit,
  none: noneAudit,
  several: severalAudit,
  parts: partsAudit,
}
