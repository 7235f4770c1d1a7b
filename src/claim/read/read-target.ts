import { isMap, isSeq } from 'yaml'
import { foldWord } from '../../quantity/near-miss.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Target } from '../claim.ts'
import { EXAMPLES } from '../keys.ts'
import { type Context, type Field, peek, reportError } from './field.ts'
import { readMapping, reportMissingKey } from './read-mapping.ts'
import { readMoonTarget } from './read-moon-target.ts'
import { readSpanTarget } from './read-span-target.ts'
import { reportUnknownBody, starNamed } from './read-star.ts'
import { readStarPairTarget } from './read-star-pair-target.ts'
import { readStarTarget } from './read-star-target.ts'
import { readSunTarget } from './read-sun-target.ts'
import { plainText, scalarText } from './read-text.ts'
import { SPAN_EVENT } from './season.ts'

const BODIES = ['sun', 'moon'] as const
const PLANETS = new Set(['mercury', 'venus', 'mars', 'jupiter', 'saturn', 'uranus', 'neptune'])
const OTHER_NAMES: ReadonlyMap<string, (typeof BODIES)[number]> = new Map([
  ['sol', 'sun'],
  ['thesun', 'sun'],
  ['luna', 'moon'],
  ['themoon', 'moon'],
])

/** Where the body is not known, what else the target lacks or holds is no matter. */
const ANY_KEY = {
  body: 'optional',
  bodies: 'optional',
  event: 'optional',
  day: 'optional',
  sense: 'optional',
  at: 'optional',
  disc: 'optional',
  altitude: 'optional',
  above: 'optional',
} as const

/** Reads what the line is said to mark: the Sun, the Moon, a star, or two stars. */
export function readTarget(field: Field | undefined, context: Context): Target | null {
  if (field === undefined) return null
  switch (kindOf(field, context)) {
    case 'sun':
      return readSunTarget(field, context)
    case 'sun at both solstices':
      return readSpanTarget(field, context)
    case 'moon':
      return readMoonTarget(field, context)
    case 'star':
      return readStarTarget(field, context)
    case 'two stars':
      return readStarPairTarget(field, context)
    case null:
      return refuse(field, context)
  }
}

function kindOf(field: Field, context: Context): Target['body'] | null {
  if (isMap(field.node) && field.node.has('bodies')) return 'two stars'
  const body = plainText({ ...field, node: peek(field, 'body') })
  if (body === null) return null
  const known = BODIES.find((name) => name === foldWord(body))
  const event = plainText({ ...field, node: peek(field, 'event') })
  if (known === 'sun' && foldWord(event ?? '') === foldWord(SPAN_EVENT)) return 'sun at both solstices'
  return known ?? (starNamed(body, context) === null ? null : 'star')
}

function refuse(field: Field, context: Context): null {
  const fields = readMapping(field, ANY_KEY, context)
  if (fields === null) return null
  const body = fields.get('body')
  if (!fields.has('body') && !fields.has('bodies'))
    reportMissingKey(field, 'body', EXAMPLES.body ?? null, context)
  if (body === undefined) return null
  if (isSeq(body.node)) {
    const advice = { expected: 'bodies for two stars, or one body', suggestion: 'bodies', at: body.keyAt }
    reportError(context, body, 'not-text', '`body` is one body, and here is a list', advice)
    return null
  }
  const text = scalarText(body, context, 'sun, moon or a star')
  if (text !== null) reportBody(body, text, context)
  return null
}

function reportBody(field: Field, text: string, context: Context): void {
  const otherName = OTHER_NAMES.get(foldWord(text))
  if (otherName !== undefined)
    reportError(context, field, 'unknown-body', `${quoted(text)} is called ${quoted(otherName)} here`, {
      expected: otherName,
      suggestion: otherName,
    })
  else if (PLANETS.has(foldWord(text)))
    reportError(context, field, 'unknown-body', `${quoted(text)} is a planet, and those are not computed`, {
      expected: 'sun, moon or a star',
    })
  else reportUnknownBody(field, text, BODIES, context)
}
