import type { Element } from 'hast'
import type { Audit, DatedLabel } from '../../audit/audit.ts'
import { formatYear } from '../../quantity/format-year.ts'
import type { Box } from './box.ts'
import { assertedBand, independentBand } from './date-band.ts'
import { hatch } from './hatch.ts'
import type { MarginLabel } from './margin-labels.ts'
import { PALETTE } from './palette.ts'
import type { PremisePlot } from './premise-layout.ts'
import { premiseYears } from './premise-years.ts'
import { shape } from './shape.ts'

type Pair = readonly [number, number]
type Pairs = readonly Pair[]

/** Something labelled right of the plot, at the height of a year. */
export type DatedMarginLabel = Omit<MarginLabel, 'y'> & { year: number }

/** The asserted date and the independent ones across the plot, the asserted on top. */
export function premiseDates(audit: Audit, plot: PremisePlot): Element[] {
  return [
    ...audit.other_dates.flatMap((date, index) => independentBand(bandOf(date, plot), 'vertical', index)),
    ...assertedBand(bandOf(audit.asserted, plot), 'vertical'),
  ]
}

/** A grey ground under the years outside the window. */
export function outsideGrounds({ sweep: { window } }: Audit, { box, yWithin }: PremisePlot): Element[] {
  const { left, right } = box
  const ground = (top: number, bottom: number) =>
    shape('rect', { x: left, y: top, width: right - left, height: bottom - top, fill: PALETTE.outside })
  const ends = [
    [box.top, yWithin(window.to)],
    [yWithin(window.from), box.bottom],
  ] as const
  return ends.filter(([top, bottom]) => bottom > top).map(([top, bottom]) => ground(top, bottom))
}

/** Years in which the target stays out of reach of the line's altitude. */
export function outOfReach(audit: Audit, plot: PremisePlot): Element[] {
  return audit.sweep.no_target
    .map(([from, to]) => hatch(bandOf({ from, to }, plot), 9, true))
    .filter((d) => d !== '')
    .map((d) => shape('path', { d, fill: 'none', stroke: PALETTE.rule, strokeWidth: 0.5 }))
}

function bandOf({ from, to }: { from: number; to: number }, plot: PremisePlot): Box {
  return { left: plot.box.left, right: plot.box.right, top: plot.yWithin(to), bottom: plot.yWithin(from) }
}

/** What the margin says: the dates, the two sets where they end, the window's ends, years out of reach. */
export function premiseMarginLabels(audit: Audit): DatedMarginLabel[] {
  const { shown } = premiseYears(audit)
  const unreached = within(audit.sweep.no_target, shown)
  return [
    {
      year: middle(audit.asserted),
      lines: ['asserted date', audit.asserted.printed],
      strong: true,
      fill: PALETTE.accent,
    },
    ...audit.other_dates.map((date) => ({
      year: middle(date),
      lines: [date.label, date.printed],
      strong: true,
    })),
    ...setLabels(audit, shown),
    ...windowLabels(audit, shown),
    ...unreached.slice(0, 1).map(([from, to]) => ({
      year: (from + to) / 2,
      lines: ['target out of reach'],
      fill: PALETTE.muted,
    })),
  ]
}

/** The window's ends, or where the plot ends before it. */
function windowLabels({ sweep: { window } }: Audit, [from, to]: Pair): DatedMarginLabel[] {
  const fill = PALETTE.muted
  return [
    window.to > to
      ? { year: to, lines: ['the window goes on', `to ${formatYear(window.to)}`], fill }
      : { year: window.to, lines: [`window to ${formatYear(window.to)}`], fill },
    window.from < from
      ? { year: from, lines: ['the window begins', `in ${formatYear(window.from)}`], fill }
      : { year: window.from, lines: [`window from ${formatYear(window.from)}`], fill },
  ]
}

/** Each set is labelled where its widest visible part meets the right edge. */
function setLabels(audit: Audit, shown: Pair): DatedMarginLabel[] {
  const last = audit.sweep.steps.at(-1)
  if (last === undefined) return []
  const inner = widestMiddle(within(last.sets68, shown))
  const outer = widestMiddle(within(without(last.sets95, last.sets68), shown))
  return [
    ...(inner === null ? [] : [{ year: inner, lines: ['68 % set'] }]),
    ...(outer === null ? [] : [{ year: outer, lines: ['95 % set'] }]),
  ]
}

/** As much of each stretch as is shown. */
function within(pairs: Pairs, [from, to]: Pair): Pairs {
  return pairs
    .filter(([low, high]) => low <= to && high >= from)
    .map(([low, high]) => [Math.max(low, from), Math.min(high, to)])
}

function middle({ from, to }: DatedLabel): number {
  return (from + to) / 2
}

function widestMiddle(pairs: Pairs): number | null {
  const widest = [...pairs].sort((a, b) => b[1] - b[0] - (a[1] - a[0]))[0]
  return widest === undefined ? null : (widest[0] + widest[1]) / 2
}

/** The parts of some stretches that no stretch of the others covers. */
function without(pairs: Pairs, others: Pairs): Pairs {
  return others.reduce<Pairs>(
    (rest, [from, to]) =>
      rest.flatMap(([a, b]): Pairs => {
        if (to <= a || from >= b) return [[a, b]]
        return (
          [
            [a, from],
            [to, b],
          ] as Pairs
        ).filter(([low, high]) => high > low)
      }),
    pairs,
  )
}
