import type { Element } from 'hast'
import { directionTicks } from './direction-ticks.ts'
import { HORIZON_ROWS, type HorizonPlot } from './horizon-layout.ts'
import type { HorizonSource } from './horizon-source.ts'
import { keepLegible } from './log-ticks.ts'
import { PALETTE } from './palette.ts'
import { line, TEXT_SIZE, text } from './shape.ts'
import { textWidth } from './text-width.ts'
import type { Tick } from './year-ticks.ts'

const RULE = { stroke: PALETTE.ink, strokeWidth: 0.6 }
const MOST_AZIMUTHS = 8
/** Heights of ticks are no nearer than this, points. */
const TICK_ROOM = 12
const SUN_STEPS = [1, 2, 5, 10, 20, 50, 100]
/** Sun's widths are numbered no nearer than this, points. */
const SUN_ROOM = 24

/** Altitudes at the left, azimuths below, and below them Sun's widths from the line. */
export function horizonAxes(source: HorizonSource, plot: HorizonPlot): Element[] {
  return [...altitudeAxis(plot), ...azimuthAxis(plot), ...sunAxis(source, plot)]
}

function altitudeAxis({ box, view, y }: HorizonPlot): Element[] {
  const { left, top, bottom } = box
  const most = Math.max(2, Math.floor((y(view.altitudes[0]) - y(view.altitudes[1])) / TICK_ROOM))
  return [
    line([left, top], [left, bottom], RULE),
    ...directionTicks('altitude', ...view.altitudes, most).flatMap(({ at, label }) => [
      line([left - 4, y(at)], [left, y(at)], RULE),
      text(left - 6, y(at) + 2.6, label, { anchor: 'end' }),
    ]),
    text(1, bottom + 11.5, 'altitude', { fill: PALETTE.muted }),
  ]
}

function azimuthAxis({ box, azimuths, x }: HorizonPlot): Element[] {
  const ticks = directionTicks('azimuth', ...azimuths, MOST_AZIMUTHS)
  return scale(box, box.bottom + HORIZON_ROWS.azimuth, 'azimuth', ticks, x)
}

/** Counted from the line to both sides. */
function sunAxis({ sunWidthArcmin, line: { value } }: HorizonSource, { box, x }: HorizonPlot): Element[] {
  if (sunWidthArcmin === null) return []
  const at = (count: number) => x(value + (count * sunWidthArcmin) / 60)
  const each = at(1) - at(0)
  const step = SUN_STEPS.find((count) => count * each >= SUN_ROOM) ?? SUN_STEPS.at(-1)!
  const first = Math.ceil((box.left - at(0)) / each / step)
  const last = Math.floor((box.right - at(0)) / each / step)
  const ticks = Array.from({ length: Math.max(0, last - first + 1) }, (_, index) => {
    const count = (first + index) * step
    return { at: count, label: String(Math.abs(count)) }
  })
  return scale(box, box.bottom + HORIZON_ROWS.sun, 'Sun’s widths', ticks, at)
}

function scale(
  { left, right }: HorizonPlot['box'],
  y: number,
  name: string,
  ticks: readonly Tick[],
  position: (at: number) => number,
): Element[] {
  const nameEnd = 1 + textWidth(name, TEXT_SIZE) + 3
  const clear = ticks.filter(({ at, label }) => position(at) - textWidth(label, TEXT_SIZE) / 2 >= nameEnd)
  const labelled = new Set(keepLegible(clear, position, TEXT_SIZE, right + 2))
  return [
    line([left, y], [right, y], RULE),
    ...ticks.flatMap((tick) => [
      line([position(tick.at), y], [position(tick.at), y + 3.5], RULE),
      ...(labelled.has(tick) ? [text(position(tick.at), y + 11.5, tick.label, { anchor: 'middle' })] : []),
    ]),
    text(1, y + 11.5, name, { fill: PALETTE.muted }),
  ]
}
