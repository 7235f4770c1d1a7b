/** A stretch of calendar years as a text states it. Years are astronomical: 0 is 1 BCE. */
export interface YearRange {
  from: number
  to: number
  /** As written. */
  text: string
  /** Half-width in years that this program gave a `c.` date; 0 where the text itself states the range. */
  circaYears: number
}
