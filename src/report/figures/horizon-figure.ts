import type { Element } from 'hast'
import type { Audit } from '../../audit/audit.ts'
import { noEvent } from '../wording/no-event.ts'
import { horizonAlt } from './horizon-alt.ts'
import { horizonAxes } from './horizon-axes.ts'
import { discs, spreads, stems } from './horizon-discs.ts'
import { skylineBand, skylineShapes } from './horizon-ground.ts'
import { HORIZON_ROWS, HORIZON_WIDTH, layHorizon, NOTE_HEIGHT } from './horizon-layout.ts'
import { lineError, lineMark, lineTexts, toleranceBracket } from './horizon-line.ts'
import { skylineNames } from './horizon-names.ts'
import { type HorizonSource, horizonSource } from './horizon-source.ts'
import { PALETTE } from './palette.ts'
import { TEXT_SIZE, text } from './shape.ts'
import { type FigureDrawing, svgRoot } from './svg-root.ts'
import { fitText } from './text-width.ts'

/**
 * The skyline of one sightline, the line's mark on it, and the disc of the target where it stood at each date, all to
 * one scale. Points; 440 wide, about 240 high. Throws a RangeError where the sightline has no skyline.
 */
export function horizonFigure(audit: Audit, sightline: string): FigureDrawing {
  const source = horizonSource(audit, sightline)
  const { plot, flags } = layHorizon(source)
  const shapes = [
    ...lineError(source, plot),
    ...skylineBand(source, plot),
    ...lineMark(source, plot),
    ...stems(flags.labels, plot),
    ...spreads(plot),
    ...discs(plot),
    ...skylineShapes(source, plot),
    ...skylineNames(source, plot, flags.labels),
    ...toleranceBracket(source, plot),
    ...lineTexts(source, plot),
    ...flags.draw(plot.box.top),
    ...notes(source, plot.box.left),
    ...horizonAxes(source, plot),
  ]
  const size = { width: HORIZON_WIDTH, height: Math.ceil(plot.box.bottom + HORIZON_ROWS.height) }
  return svgRoot(size, `The target of ${sightline} on the skyline`, horizonAlt(source), shapes)
}

/** The dates for which there is nothing to draw. */
function notes({ unseen, sightline }: HorizonSource, left: number): Element[] {
  return unseen.map(({ label, printed, kind }, row) => {
    const why = `, ${printed}: ${noEvent(sightline)}`
    const content = fitText(`${fitText(label, 150, TEXT_SIZE)}${why}`, HORIZON_WIDTH - left - 4, TEXT_SIZE)
    const fill = kind === 'asserted' ? PALETTE.accent : PALETTE.ink
    return text(left, (row + 1) * NOTE_HEIGHT - 2.5, content, { fill })
  })
}
