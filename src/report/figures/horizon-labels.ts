import type { Placement } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { sideOfLine } from '../wording/side-of-line.ts'
import { sunWidthCount } from '../wording/sun-width-count.ts'
import type { HorizonMark, HorizonSource } from './horizon-source.ts'
import { TEXT_SIZE } from './shape.ts'
import { fitText, textWidth } from './text-width.ts'

/** The label of one placement, on the stem that stands at `x`. */
export interface HorizonLabel {
  mark: HorizonMark
  x: number
  lines: readonly string[]
}

interface Scene {
  inside: readonly HorizonMark[]
  outside: readonly HorizonMark[]
  x: (azimuthDeg: number) => number
  left: number
  right: number
}

const AT_LINE = 'at the line'
const WIDEST = 170
/** More labels than these get one line each, without the Sun's widths, which the scale below tells. */
const MOST_WITH_TWO_LINES = 6
/** The stems of what is out of the picture stand so far from the plot's side and from each other, points. */
const EDGE_STEP = 9

/** What the labels say and where their stems stand: date and offset from the line. */
export function horizonLabels(source: HorizonSource, scene: Scene): HorizonLabel[] {
  const isMany = source.marks.length > MOST_WITH_TWO_LINES
  const outside = new Map(outsideStems(scene))
  return source.marks.map((mark) => ({
    mark,
    x: outside.get(mark) ?? scene.x(mark.directionDeg),
    lines: isMany ? [oneLine(mark)] : [dateLine(mark, WIDEST), offsetLine(mark, source)],
  }))
}

/** Stems of marks beyond a side stand at that side, the outermost first; those above or below stand where they are. */
function outsideStems({ outside, x, left, right }: Scene): [HorizonMark, number][] {
  const beyond = (isLeft: boolean) =>
    outside.filter(({ azimuthDeg }) => (isLeft ? x(azimuthDeg) < left : x(azimuthDeg) > right))
  const within = outside.filter(({ azimuthDeg }) => x(azimuthDeg) >= left && x(azimuthDeg) <= right)
  return [
    ...beyond(true).map((mark, index): [HorizonMark, number] => [mark, left + (index + 1) * EDGE_STEP]),
    ...beyond(false).map((mark, index): [HorizonMark, number] => [mark, right - (index + 1) * EDGE_STEP]),
    ...within.map((mark): [HorizonMark, number] => [mark, clamp(x(mark.directionDeg), left, right)]),
  ]
}

function dateLine({ placement: { label, printed } }: HorizonMark, width: number): string {
  const room = width - textWidth(`, ${printed}`, TEXT_SIZE, 600)
  return `${fitText(label, room, TEXT_SIZE, 600)}, ${printed}`
}

/** Where the target stood from the line: `36′ to the right, 1.1 Sun’s widths`. */
function offsetLine({ placement }: HorizonMark, { sunWidthArcmin }: HorizonSource): string {
  const { offset_arcmin: offset } = placement
  const widths =
    sunWidthArcmin === null || offset === null ? '' : `, ${sunWidthCount(offset / sunWidthArcmin)}`
  const where = whereFromLine(placement)
  return where === AT_LINE ? where : `${where}${widths}`
}

function oneLine(mark: HorizonMark): string {
  const where = whereFromLine(mark.placement)
  return `${dateLine(mark, WIDEST - textWidth(`: ${where}`, TEXT_SIZE, 600))}: ${where}`
}

function whereFromLine({ offset_arcmin }: Placement): string {
  const offset = offset_arcmin ?? 0
  // From the line to the target: the other way than the offset.
  const side = sideOfLine(-offset, 'azimuth')
  return side === null ? AT_LINE : `${formatArcmin(Math.abs(offset))} ${side.replace(/ of$/, '')}`
}

function clamp(value: number, low: number, high: number): number {
  return Math.max(low, Math.min(high, value))
}
