import type { Panel } from '../document.ts'
import type { Placed } from './paginate.ts'
import { anchored, type Painter, type PanelBox, type Series, type Strip } from './strip.ts'

type PanelLook = Pick<PanelBox, 'tint' | 'rules'>

/** Told apart by the number and weight of their rules, so also where the tints come out grey. */
const LOOKS: Readonly<Record<Panel['kind'], PanelLook>> = {
  claim: { tint: '#f3f3f1', rules: [{ offset: 0, width: 1, colour: '#6f6f6a' }] },
  finding: { tint: '#e9eef5', rules: [{ offset: 0, width: 4, colour: '#1c3f72' }] },
  caution: {
    tint: '#faf0df',
    rules: [
      { offset: 0, width: 1.2, colour: '#8a4a00' },
      { offset: 2.8, width: 1.2, colour: '#8a4a00' },
    ],
  },
}

export function panelBox(kind: Panel['kind'], left: number, width: number): PanelBox {
  return { left, width, padding: 8, ...LOOKS[kind] }
}

export function codePanel(left: number, width: number): PanelBox {
  return { left, width, padding: 5, tint: '#f3f3f1', rules: [] }
}

/** The same strips inside the panel, what is set again of a divided table too. */
export function inPanel(strips: readonly Strip[], box: PanelBox): Strip[] {
  const within = (each: Strip): Strip => ({ ...each, panels: [box, ...each.panels] })
  const moved = new Map<Series, Series>()
  const seriesWithin = (series: Series): Series => {
    const result = moved.get(series) ?? { head: within(series.head), foot: within(series.foot) }
    moved.set(series, result)
    return result
  }
  return anchored(strips).map((each) => {
    return each.series ? { ...within(each), series: seriesWithin(each.series) } : within(each)
  })
}

/** Draws the panels of a page: each from its first strip there to its last. */
export function paintPanels(painter: Painter, placed: readonly Placed[], frameTop: number): void {
  const spans = new Map<PanelBox, { top: number; bottom: number }>()
  for (const { strip, top } of placed) {
    for (const box of strip.panels) {
      spans.set(box, { top: spans.get(box)?.top ?? top, bottom: top + strip.height })
    }
  }
  for (const [box, { top, bottom }] of spans) {
    const edge = frameTop + top - box.padding
    painter.tagger.artifact('Layout', () => paintPanel(painter, box, edge, bottom - top + 2 * box.padding))
  }
}

function paintPanel({ canvas }: Painter, box: PanelBox, top: number, height: number): void {
  canvas.fillColor(box.tint).rect(box.left, top, box.width, height).fill()
  for (const { offset, width, colour } of box.rules) {
    canvas
      .fillColor(colour)
      .rect(box.left + offset, top, width, height)
      .fill()
  }
}
