import type { Element } from 'hast'
import { measuredDegrees } from '../wording/measured-angle.ts'
import { toleranceRange } from '../wording/tolerance-range.ts'
import { HORIZON_ROWS, type HorizonPlot } from './horizon-layout.ts'
import type { HorizonSource } from './horizon-source.ts'
import { PALETTE } from './palette.ts'
import { line, shape, TEXT_SIZE, text } from './shape.ts'
import { fitText, textWidth } from './text-width.ts'

const TEXT_BELOW = 9
const GAP = 5

/** One standard deviation of the line's direction to either side, as far as the plot shows it. */
export function lineBand({ line: { value, sd } }: HorizonSource, { box, x }: HorizonPlot): Element[] {
  if (sd <= 0) return []
  const [left, right] = [Math.max(box.left, x(value - sd)), Math.min(box.right, x(value + sd))]
  const size = { width: right - left, height: box.bottom - box.top }
  return [shape('rect', { x: left, y: box.top, ...size, fill: PALETTE.set95, fillOpacity: 0.6 })]
}

/** The line through the plot and down to the scales. */
export function lineMark({ line: { value } }: HorizonSource, { box, x }: HorizonPlot): Element[] {
  const stroke = { stroke: PALETTE.ink, strokeWidth: 1.1 }
  return [line([x(value), box.top], [x(value), box.bottom + HORIZON_ROWS.bracket], stroke)]
}

/** A bracket about the line over the plausible tolerances, thin up to the least of them; what runs out of the plot has no end. */
export function toleranceBracket(source: HorizonSource, { box, x }: HorizonPlot): Element[] {
  const { value } = source.line
  const [low, high] = source.plausibleArcmin
  const y = box.bottom + HORIZON_ROWS.bracket
  const at = (arcmin: number) => x(value + arcmin / 60)
  const within = (position: number) => Math.max(box.left, Math.min(box.right, position))
  const rule = (from: number, to: number, strokeWidth: number) =>
    line([within(at(from)), y], [within(at(to)), y], { stroke: PALETTE.ink, strokeWidth })
  const ends = [-high, -low, low, high].filter((arcmin) => within(at(arcmin)) === at(arcmin))
  return [
    rule(-low, low, 0.4),
    rule(-high, -low, 1.6),
    rule(low, high, 1.6),
    ...ends.map((arcmin) =>
      line([at(arcmin), y - 3], [at(arcmin), y + 3], { stroke: PALETTE.ink, strokeWidth: 0.8 }),
    ),
  ]
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
