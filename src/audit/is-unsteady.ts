import type { SightlineInputs } from './sightline-inputs.ts'
import { targetModel } from './targets/target-model.ts'

/** Whether a line's direction does not answer errors in proportion in a year: close to the meridian, or over crags. */
export function isUnsteady(line: SightlineInputs, year: number): boolean {
  const sides = line.pair === null ? [line] : [line.pair.june, line.pair.december]
  return sides.some((side) =>
    targetModel(side).branches.some((branch) => (branch.curve?.(year) ?? []).length > 0),
  )
}
