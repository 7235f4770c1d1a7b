import type { HorizonMark } from './horizon-source.ts'
import { PALETTE } from './palette.ts'
import type { Attributes } from './shape.ts'

/** The second independent date and further ones, told apart by their dashes. */
const DASHES = ['', '7 1.6', '1 1.4', '6 1.5 1 1.5']

/** How the disc of a date is outlined: they differ in width and dashes too, so that grey print keeps them apart. */
export function markStroke({ placement, independent }: HorizonMark): Attributes {
  switch (placement.kind) {
    case 'asserted':
      return { stroke: PALETTE.accent, strokeWidth: 2 }
    case 'today':
      return { stroke: PALETTE.ink, strokeWidth: 0.8, strokeDasharray: '3 2' }
    case 'independent': {
      const dash = DASHES[(independent ?? 0) % DASHES.length]!
      return { stroke: PALETTE.rule, strokeWidth: 0.9, ...(dash === '' ? {} : { strokeDasharray: dash }) }
    }
  }
}

/** The same, thinner, for the stem that leads from a disc to its label. */
export function stemStroke(mark: HorizonMark): Attributes {
  return { ...markStroke(mark), strokeWidth: mark.placement.kind === 'asserted' ? 0.8 : 0.6 }
}
