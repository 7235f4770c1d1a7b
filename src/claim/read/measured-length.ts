import type { Measured } from '../../quantity/measured.ts'
import { readMeasured } from '../../quantity/read-measured.ts'
import { readUnit } from '../../quantity/read-unit.ts'
import type { Reading } from '../../quantity/reading.ts'
import type { UnitKind } from '../../quantity/unit-kind.ts'

/** A reader of lengths with their uncertainty, metres. */
export function measuredLength(kind: UnitKind, uncertainty: UnitKind): (text: string) => Reading<Measured> {
  return (text) =>
    readMeasured(
      text,
      (value) => readUnit(value, kind),
      (size) => readUnit(size, uncertainty),
    )
}
