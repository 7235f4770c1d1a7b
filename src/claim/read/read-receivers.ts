import { DEG } from '../../quantity/degrees.ts'
import { formatCm } from '../../quantity/format-length.ts'
import { misread, trimmedStretch } from '../../quantity/misread.ts'
import { quoted } from '../../quantity/quoted.ts'
import { readUncertainty } from '../../quantity/read-uncertainty.ts'
import { readUnit } from '../../quantity/read-unit.ts'
import type { Reading } from '../../quantity/reading.ts'
import type { North } from '../claim.ts'
import { EXAMPLES, type KEYS } from '../keys.ts'
import { type Context, type Field, reportError } from './field.ts'
import { BASELINE, DIRECTION_UNCERTAINTY, POINT_UNCERTAINTY } from './kinds.ts'
import { type Fields, reportMissingKey } from './read-mapping.ts'
import { readQuantity } from './read-quantity.ts'
import { plainText } from './read-text.ts'

/** Reads how far apart two GPS positions were, and how exact each; the one needs the other. */
export function readReceivers(
  north: Field,
  fields: Fields<keyof typeof KEYS.north>,
  isAsked: boolean,
  context: Context,
): Pick<North, 'baselineM' | 'accuracyM'> {
  const readBaseline = (text: string) => readUnit(text, BASELINE)
  const baselineM = readQuantity(fields.get('baseline'), readBaseline, 'a length such as 60 m', context)
  const accuracyM = readQuantity(fields.get('accuracy'), readAccuracy, 'a length such as 2 cm', context)
  if (isAsked)
    for (const [key, other] of [
      ['baseline', 'accuracy'],
      ['accuracy', 'baseline'],
    ] as const)
      if (fields.has(key) && !fields.has(other))
        reportMissingKey(north, other, EXAMPLES[other] ?? null, context)
  const accuracy = fields.get('accuracy')
  const isUsed = isAsked && !fields.has('uncertainty')
  if (isUsed && accuracy !== undefined && baselineM !== null && accuracyM !== null)
    checkAccuracy(accuracy, accuracyM, baselineM, context)
  return { baselineM, accuracyM }
}

/** Two positions leave north open by √2 times the accuracy of each over their distance (JCGM 100:2008, section 5). */
function checkAccuracy(field: Field, accuracyM: number, baselineM: number, context: Context): void {
  const mostM = (DIRECTION_UNCERTAINTY.highDeg * DEG * baselineM) / Math.SQRT2
  if (accuracyM <= mostM) return
  const apart = formatCm(baselineM * 100)
  const message = `${quoted(plainText(field) ?? '')} of positions ${apart} apart leaves north open by more than ${DIRECTION_UNCERTAINTY.highDeg}°`
  reportError(context, field, 'out-of-range', message, {
    expected: `at most ${formatCm(mostM * 100)} at this distance, or positions farther apart`,
  })
}

function readAccuracy(text: string): Reading<number> {
  const reading = readUncertainty(text, (size) => readUnit(size, { ...POINT_UNCERTAINTY, example: '2 cm' }))
  if (!reading.ok || reading.value !== 'unknown') return reading as Reading<number>
  return misread('not-readable', `${quoted(text.trim())} is not an accuracy`, trimmedStretch(text), {
    expected: 'a length such as 2 cm; north from gps alone where it is not known',
  })
}
