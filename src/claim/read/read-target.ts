import { isMap } from 'yaml'
import { foldWord } from '../../quantity/near-miss.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Target } from '../claim.ts'
import { INSTEAD, KEYS } from '../keys.ts'
import { type Context, type Field, reportError } from './field.ts'
import { DISC_EXPECTED, readDisc } from './read-disc.ts'
import { readMapping } from './read-mapping.ts'
import { readStatable } from './read-quantity.ts'
import { plainText, scalarText } from './read-text.ts'
import { readWord } from './read-word.ts'

const EVENTS = {
  words: ['june solstice', 'december solstice'],
  later: [
    'equinox',
    'zenith passage',
    'june to december solstice',
    'northern major standstill',
    'southern major standstill',
    'northern minor standstill',
    'southern minor standstill',
  ],
} as const
const CROSSINGS = {
  words: ['rising', 'setting'],
  later: ['noon', 'upper culmination', 'lower culmination'],
  hints: {
    rise: 'rising',
    sunrise: 'rising',
    rises: 'rising',
    set: 'setting',
    sunset: 'setting',
    sets: 'setting',
  },
} as const

const SEASON = /^(?:summersolstice|wintersolstice|midsummer|midwinter)$/

/** Reads what the line is said to mark. This version knows the Sun at a solstice. */
export function readTarget(field: Field | undefined, context: Context): Target | null {
  if (field === undefined) return null
  const fields = readMapping(field, isOtherBody(field) ? OTHER_BODY : KEYS.target, context, INSTEAD.target)
  if (fields === null || !isSun(fields.get('body'), context)) return null
  const event = readEvent(fields.get('event'), context)
  const at = readWord(fields.get('at'), CROSSINGS, context)
  const disc = readStatable(fields.get('disc'), readDisc, DISC_EXPECTED, context)
  return event === null || at === null ? null : { body: 'sun', event, at, disc }
}

/** A body this version does not know is refused by itself; what its event lacks is no matter. */
const OTHER_BODY = { ...KEYS.target, event: 'optional', at: 'optional' } as const

function isOtherBody({ node }: Field): boolean {
  const body = isMap(node) ? node.get('body') : undefined
  return body !== undefined && foldWord(String(body)) !== 'sun'
}

function isSun(field: Field | undefined, context: Context): boolean {
  if (field === undefined) return true
  const body = scalarText(field, context, 'sun')
  if (body === null || foldWord(body) === 'sun') return body !== null
  reportError(context, field, 'not-in-this-version', `this version does not compute ${quoted(body)}`, {
    expected: 'sun',
  })
  return false
}

/** Summer and winter depend on the hemisphere, which a claim should not leave to its reader. */
function readEvent(field: Field | undefined, context: Context): Target['event'] | null {
  const text = field === undefined ? null : plainText(field)
  const season = SEASON.exec(foldWord(text ?? ''))
  if (field === undefined || text === null || season === null) return readWord(field, EVENTS, context)
  const isSummer = season[0].includes('summer')
  const [north, south] = isSummer ? EVENTS.words : ([EVENTS.words[1], EVENTS.words[0]] as const)
  reportError(context, field, 'unknown-word', `${quoted(text)} falls in another month south of the equator`, {
    expected: `${north} (in the north) or ${south} (in the south)`,
    suggestion: `${north} or ${south}`,
  })
  return null
}
