import type { Placement } from '../../audit/audit.ts'
import { PALETTE } from './palette.ts'
import type { Attributes } from './shape.ts'

/** How the place of a target at one date is marked: the same on the plan's rim and across the line. */
export interface PlanMark {
  placement: Placement
  colour: string
  stroke: Attributes
  /** Of its tick on the rim. */
  length: number
  weight: 400 | 600
  /** Which of the independent dates it is, from 0: they are told apart by their hatching. */
  hatching: number
}

/** The asserted date in the accent, independent ones in ink, today broken; the asserted last, so that it is on top. */
export function planMarks(placements: readonly Placement[]): PlanMark[] {
  const independent = placements.filter(({ kind }) => kind === 'independent')
  const marks = placements.map((placement) => ({
    ...{ placement, hatching: Math.max(0, independent.indexOf(placement)) },
    ...STYLES[placement.kind],
  }))
  return marks.toSorted((a, b) => a.length - b.length)
}

const STYLES: Readonly<Record<Placement['kind'], Omit<PlanMark, 'placement' | 'hatching'>>> = {
  asserted: {
    ...{ colour: PALETTE.accent, weight: 600, length: 8 },
    stroke: { stroke: PALETTE.accent, strokeWidth: 1.3 },
  },
  independent: {
    ...{ colour: PALETTE.ink, weight: 400, length: 6.5 },
    stroke: { stroke: PALETTE.ink, strokeWidth: 0.7 },
  },
  today: {
    ...{ colour: PALETTE.muted, weight: 400, length: 5 },
    stroke: { stroke: PALETTE.muted, strokeWidth: 0.8, strokeDasharray: '1.6 1.2' },
  },
}
