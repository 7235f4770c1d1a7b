import type { Audit, Implied, SweepStep } from '../audit.ts'

/** The parts of an audit that its finding is written from. */
export interface SummaryFacts
  extends Pick<
    Audit,
    'outcome' | 'asserted' | 'other_dates' | 'plausible' | 'window' | 'sightlines' | 'sweep' | 'limits'
  > {
  /** By the default model, one for each line. */
  implied: readonly Implied[]
  /** Indices of the lines that do not fit by themselves. */
  misfits: readonly number[]
  /** The step at a tolerance as large as the misfit; null where that is not known. */
  atOffset: SweepStep | null
  /** What was filled in for each line and decides whether it fits. */
  taken: readonly (readonly TakenAs[])[]
  /** Whether direction does not answer errors in proportion at the asserted date: close to the meridian, over crags. */
  isUnsteady: boolean
  /** Whether a plan without a word on its north was taken as true. */
  northTaken: boolean
}

/** A thing the claim leaves open, what it was taken as, and the readings of it with which the line would fit. */
export interface TakenAs {
  what: string
  used: string
  fitsWith: readonly string[]
}

export const NOT_DECIDED = 'This audit does not decide which tolerance the builders had.'
