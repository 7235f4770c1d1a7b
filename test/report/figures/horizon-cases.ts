import type { Audit, Placement, SightlineAudit, Skyline } from '../../../src/audit/audit.ts'
import { makeShapedAudit, stepsFrom } from './make-audit.ts'

/** Where a target stands in a case: `right` of the line in arcminutes of azimuth, and the altitude of the disc's middle. */
export interface Place {
  kind: Placement['kind']
  label: string
  printed: string
  /** Null where the target has no direction. */
  right: number | null
  /** Degrees; null for a star. */
  middle: number | null
  /** Half the width of the disc, arcminutes. */
  half?: number
  /** Least and greatest direction over the date, arcminutes right of the middle. */
  range?: readonly [number, number]
}

interface Scene {
  lineDeg?: { value: number; sd: number }
  skyline: Pick<Skyline, 'nodes' | 'at_line_deg'> & Partial<Skyline>
  places: readonly Place[]
  plausible?: readonly [number, number]
  sightline?: Partial<SightlineAudit>
}

/** An audit with places chosen to be drawn; its sweep takes 32.4′ for the Sun's width. */
export function horizonAudit({ lineDeg = { value: 57.9, sd: 2 / 60 }, ...scene }: Scene): Audit {
  const [low, high] = scene.plausible ?? [10, 60]
  const base = makeShapedAudit({
    lineDeg,
    steps: stepsFrom(() => []),
    plausible: { low_arcmin: low, high_arcmin: high, stated: true },
    sightline: {
      azimuth_deg: lineDeg,
      altitude_deg: scene.skyline.at_line_deg,
      skyline: { from: 'altitude', words: 'as measured', ...scene.skyline },
      ...scene.sightline,
    },
  })
  return { ...base, placements: scene.places.map((place) => placementOf(place, lineDeg.value)) }
}

function placementOf(place: Place, lineDeg: number): Placement {
  const { kind, label, printed, right, middle, half = 16, range = [0, 0] } = place
  const row = { sightline: 'midsummer', kind, label, printed, year: 0, from: 0, to: 0 }
  if (right === null) {
    const none = { direction_deg: null, direction_range_deg: null, offset_arcmin: null }
    return { ...row, ...none, offset_sd_arcmin: null, offset_cm: null, disc: null }
  }
  const azimuth = lineDeg + right / 60
  const turned = ((azimuth % 360) + 360) % 360
  return {
    ...row,
    direction_deg: turned,
    direction_range_deg: [azimuth + range[0] / 60, azimuth + range[1] / 60],
    offset_arcmin: -right,
    offset_sd_arcmin: 2.5,
    offset_cm: 1,
    disc: middle === null ? null : { azimuth_deg: turned, altitude_deg: middle, semidiameter_arcmin: half },
  }
}

const level = (deg: number, sd = 2 / 60) => ({
  nodes: [[57.9, deg]] as const,
  at_line_deg: { value: deg, sd },
})

const asserted = (right: number | null, middle: number | null, rest: Partial<Place> = {}): Place => ({
  ...{ kind: 'asserted', label: 'asserted date', printed: '9700 to 9500 BCE', right, middle },
  ...rest,
})

const independent = (
  label: string,
  right: number,
  middle: number | null,
  rest: Partial<Place> = {},
): Place => ({
  ...{ kind: 'independent', label, printed: '800 to 500 BCE', right, middle },
  ...rest,
})

const today = (right: number | null, middle: number | null, rest: Partial<Place> = {}): Place => ({
  ...{ kind: 'today', label: 'today', printed: '2026 CE', right, middle },
  ...rest,
})

const UPPER = 1.5 - 16 / 60

/** The upper limb on a level skyline, the asserted date nearly on the line. */
function levelAudit(): Audit {
  return horizonAudit({
    skyline: level(1.5),
    places: [
      asserted(1.8, UPPER, { range: [-0.4, 0.4] }),
      independent('radiocarbon', 36, UPPER, { range: [-1.5, 1.5] }),
      today(65, UPPER),
    ],
  })
}

/** Six within 2′, two of them at one place, with long names and other scripts. */
function crowdedAudit(): Audit {
  return horizonAudit({
    skyline: level(1.5),
    places: [
      asserted(0.3, UPPER),
      independent('radiocarbon, hearth', 1, UPPER),
      independent('coin hoard beneath the threshold of the second court', -1, UPPER),
      independent('放射性炭素年代測定による', -1, UPPER),
      independent('медная монета из кургана', 0.7, UPPER),
      today(-0.9, UPPER),
    ],
  })
}

/** More dates than two lines each leave room for. */
function manyAudit(): Audit {
  return horizonAudit({
    skyline: level(1.5),
    places: [
      asserted(0, UPPER),
      ...[-30, -20, -10, -5, 5, 12, 20].map((right, index) =>
        independent(`layer ${index + 1}`, right, UPPER, { range: [-index, 2 * index] }),
      ),
      today(40, UPPER),
    ],
  })
}

/** The Moon's centre on a horizon 25° high, where a degree of azimuth is less wide. */
function highAudit(): Audit {
  return horizonAudit({
    skyline: level(25, 0.1),
    places: [
      asserted(-60, 25, { half: 15.54, range: [-30, 40] }),
      independent('radiocarbon', 66, 25, { half: 15.54 }),
      today(100, 25, { half: 15.54 }),
    ],
    sightline: {
      body: 'moon',
      event: 'northern major standstill moonrise',
      target: 'northern major standstill moonrise, centre on the horizon',
      semidiameter_arcmin: { value: 15.54, sd: 0 },
    },
  })
}

/** The lower limb on the sea; a line measured to 2° only. */
function seaAudit(): Audit {
  return horizonAudit({
    lineDeg: { value: 57.9, sd: 2 },
    plausible: [0, 300],
    skyline: { ...level(-0.5, 0.005), from: 'sea' },
    places: [asserted(2, -0.5 + 16 / 60), today(-100, -0.5 + 16 / 60)],
  })
}

/** A profile with a cliff, whose two ends are in view. */
function cliffAudit(): Audit {
  const nodes = [
    [57, 1.1],
    [57.6, 1.5],
    [58.2, 1.5],
    [58.2001, 2.6],
    [59.4, 2.3],
  ] as const
  return horizonAudit({
    skyline: { from: 'profile', nodes, at_line_deg: { value: 1.5, sd: 0.03 } },
    places: [asserted(2, UPPER), independent('radiocarbon', 36, 2.2), today(65, 2.0)],
  })
}

/** A slope with the discs about the line, which is known to 39′ only. */
function slopeAudit(): Audit {
  const nodes = [
    [55, 1.9],
    [56.9, 1.2],
    [57.2, 1.25],
    [58.9, 2.2],
    [61, 2.6],
  ] as const
  return horizonAudit({
    lineDeg: { value: 57.9, sd: 0.65 },
    skyline: { from: 'profile', nodes, at_line_deg: { value: 1.25 + (0.7 / 1.7) * 0.95, sd: 0.02 } },
    places: [asserted(-6, 1.35), independent('radiocarbon', 1, 1.42), today(20, 1.62)],
  })
}

/** A star over a skyline that runs through north, at dates that it moves far in. */
function northAudit(): Audit {
  const nodes = [
    [355, 1],
    [357, 1.4],
    [359, 1.2],
    [360.5, 0.66],
    [362, 0.9],
  ] as const
  return horizonAudit({
    lineDeg: { value: 0.2, sd: 0.1 },
    skyline: { from: 'profile', nodes, at_line_deg: { value: 0.77, sd: 0.02 } },
    places: [
      asserted(-30, null),
      independent('king list', 80, null, { range: [-40, 50] }),
      today(-190, null),
    ],
    sightline: {
      body: 'star',
      event: 'rising of Sirius',
      target: 'rising of Sirius, first visible at 2.4° by extinction',
      altitude_deg: { value: 2.4, sd: 0.3 },
      semidiameter_arcmin: null,
    },
  })
}

/** A star on the skyline itself. */
function starAudit(): Audit {
  return horizonAudit({
    skyline: level(0.66, 0.3),
    places: [asserted(14, null, { range: [-11, 10] }), independent('text', -108, null), today(-265, null)],
    sightline: {
      body: 'star',
      event: 'rising of Sirius',
      target: 'rising of Sirius',
      semidiameter_arcmin: null,
    },
  })
}

/** The asserted date is 15° off, and today is out of the picture. */
function farAudit(): Audit {
  return horizonAudit({
    skyline: level(1.5),
    places: [asserted(-900, UPPER), independent('radiocarbon', -30, UPPER), today(1500, UPPER)],
  })
}

/** Even the asserted date is out of the picture. */
function beyondAudit(): Audit {
  return horizonAudit({
    skyline: level(1.5),
    places: [asserted(3000, UPPER), independent('radiocarbon', 3030, UPPER), today(-3000, UPPER)],
  })
}

/** No sunrise at the asserted date. */
function nowhereAudit(): Audit {
  return horizonAudit({
    skyline: { ...level(1.5), from: 'level' },
    places: [asserted(null, null), independent('radiocarbon', 36, UPPER), today(65, UPPER)],
  })
}

export const HORIZON_CASES: Readonly<Record<string, () => Audit>> = {
  level: levelAudit,
  crowded: crowdedAudit,
  many: manyAudit,
  high: highAudit,
  sea: seaAudit,
  cliff: cliffAudit,
  slope: slopeAudit,
  north: northAudit,
  star: starAudit,
  far: farAudit,
  beyond: beyondAudit,
  nowhere: nowhereAudit,
}
