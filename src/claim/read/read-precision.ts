import { TOLERANCE } from '../../quantity/angle-kind.ts'
import { mapReading, misread, trimmedStretch } from '../../quantity/misread.ts'
import { nearMiss } from '../../quantity/near-miss.ts'
import { quoted } from '../../quantity/quoted.ts'
import { readAngle } from '../../quantity/read-angle.ts'
import { readAngleRange } from '../../quantity/read-angle-range.ts'
import type { Reading } from '../../quantity/reading.ts'
import type { Unstated } from '../../quantity/unstated.ts'
import type { Claim } from '../claim.ts'
import type { Context, Field } from './field.ts'
import { toArcmin } from './read-disc.ts'
import { readList } from './read-list.ts'
import { readQuantity, readStatable } from './read-quantity.ts'

const PRECISION_EXPECTED = 'exact, an angle such as 10′, or unknown'

/** Reads the precision that the claim gives the builders: `exact` (0), an angle, or `unknown`; arcminutes. */
export function readAssumedPrecision(field: Field | undefined, context: Context): number | Unstated {
  const read = (text: string) => {
    const reading = readTolerance(text)
    return !reading.ok && reading.misread.code === 'not-readable' ? noPrecision(text) : reading
  }
  return readStatable(field, read, PRECISION_EXPECTED, context)
}

function noPrecision(text: string) {
  const isExact = /^(?:exact\w*|precise(?:ly)?|perfect(?:ly)?)$/i.test(text.trim())
  return misread(
    'not-readable',
    `${quoted(text.trim())} is neither an angle nor exact`,
    trimmedStretch(text),
    {
      expected: PRECISION_EXPECTED,
      suggestion: isExact ? 'exact' : nearMiss(text, ['exact', 'unknown']),
    },
  )
}

/** Reads the range of build tolerances to sweep over, arcminutes. */
export function readPlausiblePrecision(
  field: Field | undefined,
  context: Context,
): Claim['plausiblePrecision'] {
  const read = (text: string) =>
    mapReading(readAngleRange(text, TOLERANCE), ({ lowDeg, highDeg }) => ({
      lowArcmin: toArcmin(lowDeg),
      highArcmin: toArcmin(highDeg),
    }))
  return readStatable(field, read, 'a range such as 10′ to 1°, or unknown', context)
}

/** Reads the build tolerances that the sweep must include, arcminutes, ascending, each once. */
export function readTolerances(field: Field | undefined, context: Context): readonly number[] {
  const expected = 'a list such as [5′, 10′, 20′]'
  const entries = readList(field, context, expected) ?? []
  const read = entries.map((entry) => readQuantity(entry, readTolerance, 'an angle such as 10′', context))
  return [...new Set(read.filter((tolerance) => tolerance !== null))].sort((a, b) => a - b)
}

function readTolerance(text: string): Reading<number> {
  if (text.trim().toLowerCase() === 'exact') return { ok: true, value: 0 }
  return mapReading(readAngle(text, TOLERANCE), toArcmin)
}
