import type { Unstated } from './unstated.ts'

/** A measured value and its standard deviation, both in the unit its holder's name states. */
export interface Measured {
  value: number
  /** One standard deviation. A hard limit `within a` is rectangular, a/√3 (JCGM 100:2008, 4.3.7). */
  sd: number | Unstated
}
