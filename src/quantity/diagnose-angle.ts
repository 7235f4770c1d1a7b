import type { AngleKind } from './angle-kind.ts'
import { misread, trimmedStretch } from './misread.ts'
import type { MisreadCode } from './misread-codes.ts'
import { quoted } from './quoted.ts'
import type { Reading } from './reading.ts'

interface Symptom {
  pattern: RegExp
  code: MisreadCode
  /** What is wrong; follows the quoted text. */
  complaint: string
  /** The text as it should be, from the pattern's groups; null where that cannot be guessed. */
  repair: ((groups: readonly string[], kind: AngleKind) => string) | null
}

const SYMPTOMS: readonly Symptom[] = [
  {
    pattern: /±|\+\s*\/\s*-|\+-|\bwithin\b/i,
    code: 'unexpected-tolerance',
    complaint: 'states an uncertainty, which has no place here',
    repair: null,
  },
  {
    pattern: /^([-–+]?\d+),(\d[^,]*)$/,
    code: 'decimal-comma',
    complaint: 'has a comma inside a number',
    repair: ([whole, fraction]) => `${whole}.${fraction}`,
  },
  {
    pattern: /^([-–+]?(?:\d+(?:\.\d+)?|\.\d+))$/,
    code: 'unit-missing',
    complaint: 'is a number without a unit',
    repair: ([number], { usualUnit }) => `${number}${usualUnit}`,
  },
  {
    pattern: /^([-–+]?\d+)[ :](\d+(?:\.\d+)?)$/,
    code: 'unit-missing',
    complaint: 'does not say its units',
    repair: ([degrees, minutes]) => `${degrees}°${minutes}′`,
  },
  {
    pattern: /^([-–+]?\d+):(\d+):(\d+(?:\.\d+)?)$/,
    code: 'unit-missing',
    complaint: 'does not say its units',
    repair: ([degrees, minutes, seconds]) => `${degrees}°${minutes}′${seconds}″`,
  },
  {
    pattern: /^([-–+]?\d+) ?° ?(\d+(?:\.\d+)?)$/,
    code: 'unit-missing',
    complaint: 'lacks the unit of its last part',
    repair: ([degrees, minutes]) => `${degrees}°${minutes}′`,
  },
  {
    pattern: /^([-–+]?(?:\d+ ?° ?)?\d+) ?′ ?(\d+(?:\.\d+)?)$/,
    code: 'unit-missing',
    complaint: 'lacks the unit of its last part',
    repair: ([before, seconds]) => `${before}′${seconds}″`,
  },
]

/** Says why a text is no angle, and where possible what was meant. `plain` is the text in plain characters. */
export function diagnoseAngle(text: string, plain: string, kind: AngleKind): Reading<never> {
  const { value, letter } = withoutLetter(plain.trim(), kind)
  const expected = `${kind.name} such as ${kind.example}`
  for (const { pattern, code, complaint, repair } of SYMPTOMS) {
    const match = pattern.exec(value)
    if (match === null) continue
    const repaired = repair?.(match.slice(1), kind).replace(/^[-–]/, '−') ?? null
    const suggestion = repaired === null ? null : withLetter(repaired, letter, kind)
    return misread(code, `${quoted(text.trim())} ${complaint}`, trimmedStretch(text), {
      expected,
      suggestion,
    })
  }
  return misread('not-readable', `${quoted(text.trim())} is not ${kind.name}`, trimmedStretch(text), {
    expected,
  })
}

function withLetter(repaired: string, letter: string | null, { needsLetter, letters }: AngleKind): string {
  if (letter !== null) return `${repaired} ${letter}`
  if (needsLetter !== true || letters === null) return repaired
  return letters.map((either) => `${repaired.replace(/^[−+]/, '')} ${either}`).join(' or ')
}

/** `41.27N` and `N 41 16` are what they are without their letter; a letter of another angle stays. */
function withoutLetter(value: string, { letters }: AngleKind): { value: string; letter: string | null } {
  const match = /^(?:([NSEW])\s*(\S.*)|(.*\S)\s*([NSEW]))$/i.exec(value)
  const letter = (match?.[1] ?? match?.[4])?.toUpperCase() ?? ''
  const rest = match?.[2] ?? match?.[3] ?? ''
  const isOwn = letters?.includes(letter) === true && !/^[-–+]/.test(rest)
  return isOwn ? { value: rest, letter } : { value, letter: null }
}
