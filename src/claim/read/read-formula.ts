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

/** What people call the held models; `a or b` where one name stands for two. */
const CALLED: readonly (readonly [RegExp, string])[] = [
  [/^vondrak(2011)?$/, 'vondrak2011'],
  [/^laskar$/, 'laskar1986 or laskar2004'],
  [/^la(skar)?2004$/, 'laskar2004'],
  [/^laskar1986$/, 'laskar1986'],
  [/^(p03)?(iau2006)?$|^capitaine(2003)?$/, 'p03'],
  [/^(lieske(1977)?)?(iau1976)?$/, 'iau1976'],
  [/^newcomb(1895)?$/, 'newcomb1895'],
]

/** Reads the claimant's obliquity model. A table that this program does not have is kept by its name. */
export function readFormula(field: Field | undefined, context: Context): Formula | Unstated {
  const text = readText(field, context)
  if (field === undefined || text === null) return 'omitted'
  if (isUnknown(text)) return 'unknown'
  const model = MODEL_NAMES.find((name) => name === foldWord(text))
  if (model !== undefined) return { model }
  const suggestion = calledOtherwise(text) ?? nearMiss(text, MODEL_NAMES, 2)
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

/** The held model meant by its author alone, or by its name written another way: `Newcomb`, `Vondrák et al. (2011)`. */
function calledOtherwise(text: string): string | null {
  const plain = text
    .normalize('NFD')
    .toLowerCase()
    .replace(/\bet al\b|['’]s\b|\b(?:formulae?|tables?|model|theory|obliquity|precession)\b/g, '')
    .replace(/[^a-z0-9]+/g, '')
  return plain === '' ? null : (CALLED.find(([pattern]) => pattern.test(plain))?.[1] ?? null)
}
