import { formatArcmin, formatDegrees } from '../../quantity/format-angle.ts'
import { measuredDegrees } from '../wording/measured-angle.ts'
import { noEvent } from '../wording/no-event.ts'
import { sideOfLine } from '../wording/side-of-line.ts'
import { sunWidthCount } from '../wording/sun-width-count.ts'
import { toleranceRange } from '../wording/tolerance-range.ts'
import type { HorizonMark, HorizonSource } from './horizon-source.ts'

/** What the horizon figure shows, in sentences with its figures. */
export function horizonAlt(source: HorizonSource): string {
  const { sightline, line, unseen, plausibleArcmin } = source
  return [
    `The skyline of ${sightline.name}, ${skylineWords(source)}, and on it the line as measured, at azimuth ${measuredDegrees(line)}.`,
    `The target is ${sightline.target}.`,
    ...source.marks.map((mark) => place(mark, source)),
    ...unseen.map(({ label, printed }) => `${capitalised(label)}, ${printed}: ${noEvent(sightline)}.`),
    `A bracket about the line spans the build tolerances held plausible, ${toleranceRange(...plausibleArcmin)}.`,
  ].join(' ')
}

function skylineWords({ skyline: { at_line_deg, nodes } }: HorizonSource): string {
  const altitude = measuredDegrees(at_line_deg)
  return nodes.length === 1 ? `drawn level at ${altitude}` : `at ${altitude} where the line meets it`
}

function place({ placement }: HorizonMark, { sunWidthArcmin }: HorizonSource): string {
  const { label, printed, direction_deg, offset_arcmin, offset_sd_arcmin, disc } = placement
  const offset = offset_arcmin ?? 0
  const side = sideOfLine(-offset, 'azimuth')
  const sd = offset_sd_arcmin === null ? '' : ` ± ${formatArcmin(offset_sd_arcmin)}`
  const share = sunWidthArcmin === null ? '' : ` (${sunWidthCount(offset / sunWidthArcmin)})`
  const where =
    side === null ? 'at the line' : `${formatArcmin(Math.abs(offset))}${sd}${share} ${side} the line`
  const size = disc === null ? '' : `, a disc ${formatArcmin(2 * disc.semidiameter_arcmin)} wide`
  return `${capitalised(label)}, ${printed}: at azimuth ${formatDegrees(direction_deg ?? 0, 'minute')}, ${where}${size}.`
}

function capitalised(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1)
}
