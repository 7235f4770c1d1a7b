import { listedShort } from '../../quantity/listed.ts'
import { noEvent } from '../wording/no-event.ts'
import type { PlanSource } from './plan-source.ts'
import { TEXT_SIZE } from './shape.ts'
import { fitText, textWidth } from './text-width.ts'

/** The dates at which the target stood nowhere, in lines that fit a width; none where there are no such dates. */
export function planNotes({ placements, sightline }: PlanSource, width: number): string[] {
  const unseen = placements.filter(({ offset_arcmin }) => offset_arcmin === null)
  if (unseen.length === 0) return []
  const names = unseen.map(({ kind, label }) => (kind === 'asserted' ? 'asserted' : label))
  const parts =
    unseen.length === placements.length
      ? [noEvent(sightline), 'at any of these dates']
      : [`${listedShort(names, 3)}:`, noEvent(sightline)]
  const whole = parts.join(' ')
  return (textWidth(whole, TEXT_SIZE) <= width ? [whole] : parts).map((line) =>
    fitText(line, width, TEXT_SIZE),
  )
}
