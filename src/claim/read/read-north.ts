import { foldWord } from '../../quantity/near-miss.ts'
import { quoted } from '../../quantity/quoted.ts'
import { readAngle } from '../../quantity/read-angle.ts'
import { readUncertainty } from '../../quantity/read-uncertainty.ts'
import type { Unstated } from '../../quantity/unstated.ts'
import type { Grid, North } from '../claim.ts'
import { EXAMPLES, KEYS } from '../keys.ts'
import { type Context, type Field, reportError, reportWarning } from './field.ts'
import { CONVERGENCE, DIRECTION_UNCERTAINTY } from './kinds.ts'
import { measuredAngle } from './measured-angle.ts'
import { type CompassHelp, readCompass } from './read-compass.ts'
import { type Fields, readMapping, reportMissingKey, reportOutOfPlace } from './read-mapping.ts'
import { isUnknown, readQuantity } from './read-quantity.ts'
import { readReceivers } from './read-receivers.ts'
import { plainText } from './read-text.ts'
import { readWord } from './read-word.ts'

type NorthKey = keyof typeof KEYS.north
type NorthFields = Fields<NorthKey>

export const NORTH_WAYS = ['compass', 'gps', 'sun', 'star', 'plan', 'grid'] as const
const WAYS = {
  words: NORTH_WAYS,
  hints: {
    magnetic: 'compass',
    needle: 'compass',
    gnss: 'gps',
    theodolite: 'sun',
    'total station': 'sun',
    solar: 'sun',
    'sun azimuth': 'sun',
    polaris: 'star',
    'pole star': 'star',
    stars: 'star',
    map: 'plan',
    drawing: 'plan',
    'grid north': 'grid',
    utm: 'grid',
  },
} as const
const OF_A_COMPASS = 'it belongs to north by a compass'
const OF_RECEIVERS = 'it belongs to north by two GPS positions'
/** The way of finding north that each key belongs to. */
const BELONGS: Readonly<Partial<Record<NorthKey, { way: North['from']; why: string }>>> = {
  date: { way: 'compass', why: OF_A_COMPASS },
  declination: { way: 'compass', why: OF_A_COMPASS },
  baseline: { way: 'gps', why: OF_RECEIVERS },
  accuracy: { way: 'gps', why: OF_RECEIVERS },
  convergence: { way: 'grid', why: 'it belongs to the north of a grid' },
}

/** Reads how the plan's north was found, or `unknown`. */
export function readNorth(
  field: Field | undefined,
  { grid, hasGrid, ...help }: CompassHelp & { grid: Grid | null; hasGrid: boolean },
  context: Context,
): North | Unstated {
  if (field === undefined) return 'omitted'
  if (isUnknown(plainText(field) ?? '')) return 'unknown'
  const way = bareWay(field)
  if (way !== null) return refuseBareWay(field, way, context)
  const fields = readMapping(field, KEYS.north, context)
  if (fields === null) return 'omitted'
  const from = readWord(fields.get('from'), WAYS, context)
  if (from !== null) refuseForeign(from, fields, context)
  const convergence = readConvergence(fields, context)
  if (from === 'grid' && !fields.has('convergence')) {
    if (!hasGrid) reportNoGrid(field, context)
    if (grid?.by === 'projection' && !help.hasLongitude) reportNoLongitude(fields, grid.name, context)
  }
  const compass = readCompass(fields, from === 'compass' ? help : null, context)
  const receivers = readReceivers(field, fields, from === 'gps', context)
  const uncertaintyDeg = readOwnUncertainty(fields, context)
  return from === null ? 'omitted' : { from, uncertaintyDeg, ...compass, convergence, ...receivers }
}

/** The way that a word by itself means; null where it is none. */
function bareWay(field: Field): North['from'] | null {
  const text = foldWord(plainText(field) ?? '')
  const hint = Object.entries(WAYS.hints).find(([other]) => foldWord(other) === text)?.[1]
  return NORTH_WAYS.find((way) => way === text) ?? hint ?? null
}

function refuseBareWay(field: Field, way: North['from'], context: Context): 'omitted' {
  const text = plainText(field)?.trim() ?? ''
  reportError(context, field, 'not-a-mapping', `${quoted(text)} is not a mapping of keys to values`, {
    expected: 'the key that it belongs to',
    suggestion: `{from: ${way}}`,
  })
  return 'omitted'
}

function readOwnUncertainty(fields: NorthFields, context: Context): number | Unstated {
  const read = (text: string) => readUncertainty(text, (size) => readAngle(size, DIRECTION_UNCERTAINTY))
  const expected = 'an angle such as 0.5°, or unknown'
  const uncertainty = readQuantity(fields.get('uncertainty'), read, expected, context) ?? 'omitted'
  if (typeof uncertainty === 'number')
    for (const key of ['baseline', 'accuracy'] as const) {
      const entry = fields.get(key)
      if (entry === undefined) continue
      reportWarning(
        context,
        entry,
        'unused-key',
        `${quoted(key)} is not used, since \`uncertainty\` is given`,
        {
          expected: 'either uncertainty, or baseline and accuracy',
          at: entry.keyAt,
        },
      )
    }
  return uncertainty
}

function readConvergence(fields: NorthFields, context: Context): North['convergence'] {
  const read = measuredAngle(CONVERGENCE, DIRECTION_UNCERTAINTY)
  const expected = `${CONVERGENCE.name} such as ${CONVERGENCE.example}`
  return readQuantity(fields.get('convergence'), read, expected, context)
}

function refuseForeign(from: North['from'], fields: NorthFields, context: Context): void {
  for (const key of Object.keys(BELONGS) as NorthKey[]) {
    const entry = fields.get(key)
    const home = BELONGS[key]
    if (entry === undefined || home === undefined || home.way === from) continue
    const message = `${quoted(key)} has no place here: ${home.why}`
    reportOutOfPlace(entry, { message, expected: `${quoted(key)} beside from: ${home.way}` }, context)
  }
}

function reportNoGrid(field: Field, context: Context): void {
  reportMissingKey(
    field,
    'convergence',
    `convergence: ${CONVERGENCE.example}, or ${EXAMPLES.grid} in the file`,
    context,
  )
}

/** A projection gives the convergence of a place. */
function reportNoLongitude(fields: NorthFields, grid: string, context: Context): void {
  const field = fields.get('from')
  if (field === undefined) return
  const message = `the convergence of ${grid} depends on the longitude, and \`structure\` has no \`longitude\``
  const expected = `longitude: 23°05′ E under structure, or convergence: ${CONVERGENCE.example} here`
  reportError(context, { ...field, path: 'structure.longitude' }, 'missing-key', message, { expected })
}
