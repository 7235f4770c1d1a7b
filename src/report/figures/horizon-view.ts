import { extent } from 'd3-array'
import { DEG } from '../../quantity/degrees.ts'
import { type Extent, extentOf, unionOf } from './horizon-extent.ts'
import { skylineParts } from './horizon-skyline.ts'
import type { HorizonMark, HorizonSource } from './horizon-source.ts'

/** The part of the sky that a horizon figure shows. Degrees on the sky: `across` is from the line, to the right positive. */
export interface HorizonView {
  /** Points to a degree on the sky, the same across and up. */
  perDegree: number
  /** Degrees on the sky to a degree of azimuth, the cosine of the skyline's altitude. */
  acrossPerAzimuth: number
  across: readonly [number, number]
  altitudes: readonly [number, number]
}

/** The Sun's width for the limits of the scale, degrees; what is drawn has its own. */
export const SUN = 0.533
/** Points to a degree where the Sun is so many points wide. */
const LARGEST = 72 / SUN
/** No smaller for the sake of the plausible tolerances, of errors. */
const LEAST_FOR_SPREADS = 26 / SUN
/** No smaller for the sake of an independent date or of today. */
const LEAST_FOR_OTHERS = 12 / SUN
const SMALLEST = 6 / SUN
const LEAST_HEIGHT = 62
const MOST_HEIGHT = 126
/** Room about discs, points. */
const PAD = { side: 10, top: 11, bottom: 8 }
/** Room over and under a skyline, points. */
const EDGE = 4
/** Beyond 84° or so a degree of azimuth is hardly a width at all. */
const LEAST_COSINE = 0.1

/**
 * As much of the sky as holds the line and every disc, at a scale at which the Sun is 72 points wide at most; what
 * would press it below 12 points is left out of the picture, the asserted date below 6.
 */
export function horizonView(source: HorizonSource, width: number): HorizonView {
  const acrossPerAzimuth = Math.max(LEAST_COSINE, Math.cos(source.skyline.at_line_deg.value * DEG))
  const atLine = source.skyline.at_line_deg.value
  const line: Extent = { across: [0, 0], altitudes: [atLine, atLine] }
  const extents = keptMarks(source, line, acrossPerAzimuth, width)
  const needed = unionOf([line, ...extents])
  const wished = unionOf([needed, spreadsOf(source, acrossPerAzimuth)])
  const perDegree = Math.max(
    SMALLEST,
    Math.min(scaleFor(needed, width), Math.max(scaleFor(wished, width), LEAST_FOR_SPREADS)),
  )
  const across = [wished, needed, line].find((each) => fits(each.across, perDegree, width)) ?? line
  const middle = (across.across[0] + across.across[1]) / 2
  const half = width / perDegree / 2
  const shown = [middle - half, middle + half] as const
  return {
    perDegree,
    acrossPerAzimuth,
    across: shown,
    altitudes: altitudesShown(source, needed, shown, perDegree, acrossPerAzimuth),
  }
}

/** Whether the whole of a mark lies in the view. */
export function isInView(mark: HorizonMark, line: number, view: HorizonView): boolean {
  const { across, altitudes } = extentOf(mark, line, view.acrossPerAzimuth)
  const within = ([low, high]: readonly [number, number], [from, to]: readonly [number, number]) =>
    low >= from && high <= to
  return within(across, view.across) && within(altitudes, view.altitudes)
}

/** The asserted date if it can be had at all, and with it the nearest others that leave the Sun large enough. */
function keptMarks({ marks, line }: HorizonSource, origin: Extent, factor: number, width: number): Extent[] {
  const of = (mark: HorizonMark) => extentOf(mark, line.value, factor)
  const size = ({ across }: Extent) => Math.max(-across[0], across[1])
  const asserted = marks.filter(({ placement }) => placement.kind === 'asserted').map(of)
  const others = marks
    .filter(({ placement }) => placement.kind !== 'asserted')
    .map(of)
    .sort((a, b) => size(a) - size(b))
  const base = asserted.filter((each) => scaleFor(unionOf([origin, each]), width) >= SMALLEST)
  for (let count = others.length; count > 0; count--) {
    const kept = [...base, ...others.slice(0, count)]
    if (scaleFor(unionOf([origin, ...kept]), width) >= LEAST_FOR_OTHERS) return kept
  }
  return base
}

/** How far the plausible tolerances and the errors of the line reach. */
function spreadsOf({ plausibleArcmin, line, skyline }: HorizonSource, factor: number): Extent {
  const reach = Math.max(plausibleArcmin[1] / 60, line.sd) * factor
  const { value } = skyline.at_line_deg
  return { across: [-reach, reach], altitudes: [value, value] }
}

function scaleFor({ across, altitudes }: Extent, width: number): number {
  const room = { across: width - 2 * PAD.side, up: MOST_HEIGHT - PAD.top - PAD.bottom }
  return Math.min(LARGEST, room.across / (across[1] - across[0]), room.up / (altitudes[1] - altitudes[0]))
}

function fits([from, to]: readonly [number, number], perDegree: number, width: number): boolean {
  return (to - from) * perDegree <= width - 2 * PAD.side + 0.01
}

/** All that must be seen, and as much more of the skyline as there is room for. */
function altitudesShown(
  { skyline, line }: HorizonSource,
  needed: Extent,
  across: readonly [number, number],
  perDegree: number,
  factor: number,
): [number, number] {
  const [low, high] = [
    needed.altitudes[0] - PAD.bottom / perDegree,
    needed.altitudes[1] + PAD.top / perDegree,
  ]
  const parts = skylineParts(skyline, line.value + across[0] / factor, line.value + across[1] / factor)
  const heights = parts
    .flat()
    .flatMap(([, altitude]) => [altitude - EDGE / perDegree, altitude + EDGE / perDegree])
  const [least, greatest] = extent([low, high, ...heights]) as [number, number]
  const missing = { below: low - least, above: greatest - high }
  const room = Math.max(0, MOST_HEIGHT / perDegree - (high - low))
  const share = Math.min(1, room / Math.max(missing.below + missing.above, 1e-9))
  const shown: [number, number] = [low - missing.below * share, high + missing.above * share]
  const lack = Math.max(0, LEAST_HEIGHT / perDegree - (shown[1] - shown[0])) / 2
  return [shown[0] - lack, shown[1] + lack]
}
