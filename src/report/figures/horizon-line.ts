import type { Element } from 'hast'
import { measuredDegrees } from '../wording/measured-angle.ts'
import { toleranceRange } from '../wording/tolerance-range.ts'
import { HORIZON_ROWS, type HorizonPlot } from './horizon-layout.ts'
import type { HorizonSource } from './horizon-source.ts'
import { SUN } from './horizon-view.ts'
import { PALETTE } from './palette.ts'
import { type Attributes, line, shape, TEXT_SIZE, text } from './shape.ts'
import { fitText, textWidth } from './text-width.ts'

const TEXT_BELOW = 9
/** Where an error too wide for a block is drawn, points above the plot's bottom. */
const WHISKER_UP = 4
const GAP = 5

/** Whether the error of the line is so wide, over half the Sun's width, that a block of it would rule the figure. */
export function isWideError({ line: { sd } }: HorizonSource, { view }: HorizonPlot): boolean {
  return 2 * sd * view.acrossPerAzimuth > SUN / 2
}

/** One standard deviation of the line's direction to either side, as far as the plot shows it: a block, a wide one a whisker. */
export function lineError(source: HorizonSource, plot: HorizonPlot): Element[] {
  const { value, sd } = source.line
  const { box, x } = plot
  if (sd <= 0) return []
  if (isWideError(source, plot)) return whisker(source, plot)
  const [left, right] = [Math.max(box.left, x(value - sd)), Math.min(box.right, x(value + sd))]
  const size = { width: right - left, height: box.bottom - box.top }
  return [shape('rect', { x: left, y: box.top, ...size, fill: PALETTE.set95, fillOpacity: 0.6 })]
}

/** At the foot of the plot. */
function whisker({ line: { value, sd } }: HorizonSource, plot: HorizonPlot): Element[] {
  const y = whiskerY(plot)
  const ends = [-1, 1].map((side) => plot.x(value + side * sd))
  const [from, to] = ends.map((end) => within(end, plot)) as [number, number]
  const stroke = { stroke: PALETTE.ink, strokeWidth: 0.6 }
  return [line([from, y], [to, y], stroke), ...ends.flatMap((end) => endMark(end, y, 2, stroke, plot))]
}

export function whiskerY({ box }: HorizonPlot): number {
  return box.bottom - WHISKER_UP
}

function within(position: number, { box }: HorizonPlot): number {
  return Math.max(box.left, Math.min(box.right, position))
}

/** The end of a level stroke: across it, or at the plot's side an arrow head where it runs on beyond. */
function endMark(x: number, y: number, half: number, stroke: Attributes, plot: HorizonPlot): Element[] {
  const at = within(x, plot)
  if (at === x) return [line([x, y - half], [x, y + half], stroke)]
  const back = at + (x > at ? -1 : 1) * (half + 1)
  return [-1, 1].map((side) => line([back, y + side * half], [at, y], stroke))
}

/** The line through the plot and down to the scales. */
export function lineMark({ line: { value } }: HorizonSource, { box, x }: HorizonPlot): Element[] {
  const stroke = { stroke: PALETTE.ink, strokeWidth: 1.1 }
  return [line([x(value), box.top], [x(value), box.bottom + HORIZON_ROWS.bracket], stroke)]
}

/** A bracket about the line over the plausible tolerances, thin up to the least of them; what runs out of the plot ends in an arrow. */
export function toleranceBracket(source: HorizonSource, plot: HorizonPlot): Element[] {
  const { value } = source.line
  const [low, high] = source.plausibleArcmin
  const y = plot.box.bottom + HORIZON_ROWS.bracket
  const at = (arcmin: number) => plot.x(value + arcmin / 60)
  const rule = (from: number, to: number, strokeWidth: number) =>
    line([within(at(from), plot), y], [within(at(to), plot), y], { stroke: PALETTE.ink, strokeWidth })
  const isInside = (arcmin: number) => within(at(arcmin), plot) === at(arcmin)
  const ends = [-high, ...[-low, low].filter(isInside), high]
  return [
    rule(-low, low, 0.4),
    rule(-high, -low, 1.6),
    rule(low, high, 1.6),
    ...ends.flatMap((arcmin) => endMark(at(arcmin), y, 3, { stroke: PALETTE.ink, strokeWidth: 0.8 }, plot)),
  ]
}

/** Whether a plausible tolerance reaches beyond the plot. */
export function isBracketCut(
  { line: { value }, plausibleArcmin }: HorizonSource,
  plot: HorizonPlot,
): boolean {
  return [-1, 1].some((side) => {
    const end = plot.x(value + (side * plausibleArcmin[1]) / 60)
    return within(end, plot) !== end
  })
}

/** Names the line and the bracket below them: one to either side, or both on the wider side. */
export function lineTexts(source: HorizonSource, { box, x }: HorizonPlot): Element[] {
  const name = `the line, ${measuredDegrees(source.line)}`
  const tolerance = `plausible tolerance: ${toleranceRange(...source.plausibleArcmin)}`
  const y = box.bottom + HORIZON_ROWS.bracket + TEXT_BELOW
  const at = x(source.line.value)
  const room = { left: at - GAP - box.left, right: box.right - at - GAP }
  const put = (content: string, side: 'left' | 'right', weight: 400 | 600 = 400) =>
    text(side === 'left' ? at - GAP : at + GAP, y, fitText(content, room[side], TEXT_SIZE, weight), {
      anchor: side === 'left' ? 'end' : 'start',
      weight,
    })
  const fits = textWidth(name, TEXT_SIZE, 600) <= room.left && textWidth(tolerance, TEXT_SIZE) <= room.right
  if (fits) return [put(name, 'left', 600), put(tolerance, 'right')]
  return [put(`${name}; ${tolerance}`, room.left > room.right ? 'left' : 'right')]
}
