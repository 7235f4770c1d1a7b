import type { Element } from 'hast'
import { PALETTE } from './palette.ts'
import { placeFlags, rowCount } from './place-flags.ts'
import { type Attributes, line, TEXT_SIZE, text } from './shape.ts'
import { fitText, textWidth } from './text-width.ts'

/** A label above a plot for something at `x` inside it. */
export interface FlagLabel {
  x: number
  label: string
  stroke: Attributes
  fill?: string
  weight?: 400 | 600
}

export interface FlagRows {
  height: number
  /** Draws the flags with their lowest row just above `bottom`. */
  draw: (bottom: number) => Element[]
}

const ROW = 10
const WIDEST = 185

/** Lays out the flags over a plot between `from` and `to`; the rows they take are known before they are drawn. */
export function flagRows(labels: readonly FlagLabel[], from: number, to: number): FlagRows {
  const fitted = labels.map((flag) => ({
    ...flag,
    label: fitText(flag.label, WIDEST, TEXT_SIZE, flag.weight),
  }))
  const sized = fitted.map((flag) => ({ x: flag.x, width: textWidth(flag.label, TEXT_SIZE, flag.weight) }))
  const placed = placeFlags(sized, from, to)
  const draw = (bottom: number) => {
    const baseline = (row: number) => bottom - 4 - row * ROW
    return fitted.flatMap((flag, index) => {
      const { row, left, side } = placed[index]!
      // The estimated width errs on the wide side, so a label left of its pole is set from its end.
      const end = left + sized[index]!.width
      return [
        line([flag.x, bottom], [flag.x, baseline(row) - 6], flag.stroke),
        text(side === 'left' ? end : left, baseline(row), flag.label, {
          anchor: side === 'left' ? 'end' : 'start',
          fill: flag.fill ?? PALETTE.ink,
          weight: flag.weight ?? 400,
        }),
      ]
    })
  }
  return { height: labels.length === 0 ? 0 : rowCount(placed) * ROW + 2, draw }
}
