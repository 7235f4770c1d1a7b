import { foldWord, nearMiss } from '../../quantity/near-miss.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Unstated } from '../../quantity/unstated.ts'
import type { Formula, ObliquityModelName } from '../claim.ts'
import { type Context, type Field, reportError, reportWarning } from './field.ts'
import { isUnknown } from './read-quantity.ts'
import { readText } from './read-text.ts'

export const MODEL_NAMES: readonly ObliquityModelName[] = [
  'vondrak2011',
  'laskar2004',
  'laskar1986',
  'p03',
  'iau1976',
  'newcomb1895',
]

/** Reads the claimant's obliquity model. A table that this program does not have is kept by its name. */
export function readFormula(field: Field | undefined, context: Context): Formula | Unstated {
  const text = readText(field, context)
  if (field === undefined || text === null) return 'omitted'
  if (isUnknown(text)) return 'unknown'
  const model = MODEL_NAMES.find((name) => name === foldWord(text))
  if (model !== undefined) return { model }
  const suggestion = nearMiss(text, MODEL_NAMES, 2)
  const expected = `one of ${MODEL_NAMES.join(', ')}, or the author and year of another table`
  if (suggestion === null)
    reportWarning(
      context,
      field,
      'formula-lacking',
      `${quoted(text)} is a table this program does not have`,
      {
        expected: `${expected}, whose step is then reported as not testable`,
      },
    )
  else
    reportError(context, field, 'unknown-word', `there is no formula ${quoted(text)} here`, {
      expected,
      suggestion,
    })
  return { lacking: text }
}
