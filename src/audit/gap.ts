import type { Unstated } from '../quantity/unstated.ts'
import type { SightlineInputs } from './sightline-inputs.ts'

/** One gap that was filled, and the changes of it whose effect on the date is looked at. */
export interface Gap {
  what: string
  said: Unstated
  used: string
  basis: string
  /** What the effect is of; null where the gap moves no date. */
  change: { words: string; of: (inputs: SightlineInputs) => SightlineInputs[] } | null
  /** An error that this program adds of its own: its name in the budget, which tells its effect. */
  budgetSource?: string
  /** Where it moves no date: what it moves instead. */
  instead?: string
}
