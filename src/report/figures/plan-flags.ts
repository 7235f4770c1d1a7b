import type { Element } from 'hast'
import { PALETTE } from './palette.ts'
import { type PlacedFlag, rowCount } from './place-flags.ts'
import { placeInHalves } from './place-in-halves.ts'
import type { AcrossScale } from './plan-across.ts'
import { type PlanMark, planMarks } from './plan-mark.ts'
import { offsetLines, shortOffset } from './plan-offset.ts'
import { type PlanSource, rightOfLineDeg } from './plan-source.ts'
import { line, shape, TEXT_SIZE, text } from './shape.ts'
import { fitText, textWidth } from './text-width.ts'

export interface PlanFlags {
  height: number
  /** Draws the flags with their lowest row just above `bottom`. */
  draw: (bottom: number) => Element[]
}

interface Flag {
  mark: PlanMark
  x: number
  width: number
  lines: readonly string[]
}

const LINE = 8.6
const GAP = 2
/** From a pole to its label, as in place-flags. */
const BESIDE = 3

/**
 * The dates above a view across a line, each with how far its target stood off: in lines of their own, or `short`, in
 * a single one, where many share the figure. What lies beyond the view is flagged at its edge.
 */
export function planFlags(source: PlanSource, scale: AcrossScale, isShort: boolean): PlanFlags {
  const marks = planMarks(source.placements).toReversed()
  const view = scale.right - scale.left
  // As wide as half of the view, a label has room on one side of its pole wherever that stands; as wide as a third,
  // no two can each need the side on which the other's pole is.
  const tries = [view / 2 - BESIDE, view / 3 - BESIDE].map((widest) => {
    const flags = marks.flatMap((mark) => flagOf(source, mark, scale, { isShort, widest }))
    return { flags, placed: placeInHalves(flags, scale.left, scale.right) }
  })
  const best = tries.find(({ placed }) => placed.every(({ side }) => side !== null)) ?? tries.at(-1)!
  return stacked(best.flags, best.placed)
}

function stacked(flags: readonly Flag[], placed: readonly PlacedFlag[]): PlanFlags {
  const rows = Array.from({ length: rowCount(placed) }, (_, row) =>
    Math.max(
      ...flags.map(({ lines }, index) => (placed[index]!.row === row ? lines.length * LINE + GAP : 0)),
    ),
  )
  const below = (row: number) => rows.slice(0, row).reduce((sum, height) => sum + height, 0)
  const draw = (bottom: number) => {
    const tops = flags.map(({ lines }, index) => bottom - 2 - below(placed[index]!.row) - lines.length * LINE)
    return [
      ...flags.map(({ x, mark }, index) => line([x, bottom], [x, tops[index]!], mark.stroke)),
      ...flags.flatMap((flag, index) => flagText(flag, placed[index]!, tops[index]!)),
    ]
  }
  return { height: below(rows.length) + 2, draw }
}

function flagOf(
  source: PlanSource,
  mark: PlanMark,
  { x, shown }: AcrossScale,
  { isShort, widest }: { isShort: boolean; widest: number },
): Flag[] {
  const right = rightOfLineDeg(source, mark.placement)
  if (right === null) return []
  const lines = isShort ? [shortLine(source, mark, widest)] : longLines(source, mark, widest)
  const width = Math.max(...lines.map((content, row) => textWidth(content, TEXT_SIZE, weightOf(mark, row))))
  return [{ mark, lines, width, x: x(Math.max(shown[0], Math.min(shown[1], right * 60))) }]
}

/** Where room is scarce, the length gives way to the name. */
function shortLine(source: PlanSource, { placement, weight }: PlanMark, widest: number): string {
  const parts = shortOffset(source, placement)
  const [angle, name] = [parts[0] ?? '', nameOf(placement)]
  const whole = `${name} ${parts.join(', ')}`
  if (textWidth(whole, TEXT_SIZE, weight) <= widest) return whole
  const room = widest - textWidth(` ${angle}`, TEXT_SIZE, weight)
  return `${fitText(name, room, TEXT_SIZE, weight)} ${angle}`
}

/** Name and date in one line or in two, the offset likewise. */
function longLines(source: PlanSource, { placement, weight }: PlanMark, widest: number): string[] {
  const fits = (content: string) => textWidth(content, TEXT_SIZE, weight) <= widest
  const [name, whole] = [nameOf(placement), `${nameOf(placement)}: ${placement.printed}`]
  const offset = offsetLines(source, placement)
  return [
    ...(fits(whole) ? [whole] : [fitText(name, widest, TEXT_SIZE, weight), placement.printed]),
    ...(fits(offset.join(', ')) ? [offset.join(', ')] : offset),
  ]
}

function nameOf({ kind, label }: PlanMark['placement']): string {
  return kind === 'asserted' ? 'asserted' : label
}

function weightOf({ weight }: PlanMark, row: number): 400 | 600 {
  return row === 0 ? weight : 400
}

function flagText({ mark, x, width, lines }: Flag, { left, side }: PlacedFlag, top: number): Element[] {
  // Where labels could not be kept off the poles of others, they blot them out.
  const plate = { x: left - 1, y: top, width: width + 2, height: lines.length * LINE }
  const isLeft = side === 'left'
  return [
    ...(side === null ? [shape('rect', { ...plate, fill: PALETTE.paper })] : []),
    ...lines.map((content, row) =>
      text(isLeft ? x - BESIDE : left, top + (row + 0.8) * LINE, content, {
        anchor: isLeft ? 'end' : 'start',
        fill: mark.colour,
        weight: weightOf(mark, row),
      }),
    ),
  ]
}
