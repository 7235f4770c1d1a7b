import type { AngleKind } from '../../quantity/angle-kind.ts'
import type { Measured } from '../../quantity/measured.ts'
import { readAngle } from '../../quantity/read-angle.ts'
import { readMeasured } from '../../quantity/read-measured.ts'
import type { Reading } from '../../quantity/reading.ts'

/** A reader of angles with their uncertainty, degrees. */
export function measuredAngle(kind: AngleKind, uncertainty: AngleKind): (text: string) => Reading<Measured> {
  return (text) =>
    readMeasured(
      text,
      (value) => readAngle(value, kind),
      (size) => readAngle(size, uncertainty),
    )
}
