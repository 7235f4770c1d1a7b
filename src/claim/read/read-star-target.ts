import type { Measured } from '../../quantity/measured.ts'
import type { Unstated } from '../../quantity/unstated.ts'
import type { StarTarget } from '../claim.ts'
import { KEYS } from '../keys.ts'
import { isOnMeridian } from '../on-meridian.ts'
import type { Context, Field } from './field.ts'
import { ALTITUDE_UNCERTAINTY, APPARENT_ALTITUDE } from './kinds.ts'
import { measuredAngle } from './measured-angle.ts'
import { ALTITUDE_IN_SIGHTLINE, outOfPlaceInTarget } from './out-of-place-in-target.ts'
import { readMapping, reportOutOfPlace } from './read-mapping.ts'
import { readStatable } from './read-quantity.ts'
import { readStar } from './read-star.ts'
import { readWord } from './read-word.ts'
import { STAR_MOMENTS } from './star-moments.ts'

const MOMENTS = {
  words: STAR_MOMENTS,
  hints: {
    rise: 'rising',
    rises: 'rising',
    set: 'setting',
    sets: 'setting',
    noon: 'upper culmination',
    culmination: 'upper culmination',
    transit: 'upper culmination',
    'upper transit': 'upper culmination',
    'lower transit': 'lower culmination',
  },
} as const

/** Reads a target of a star: rising or setting, with the altitude at which it was sighted, or on the meridian. */
export function readStarTarget(field: Field, context: Context): StarTarget | null {
  const outOfPlace = outOfPlaceInTarget(field, 'star')
  const fields = readMapping(field, KEYS.starTarget, context, { outOfPlace })
  const body = fields?.get('body')
  if (fields === null || body === undefined) return null
  const star = readStar(body, context)
  const at = readWord(fields.get('at'), MOMENTS, context)
  const altitudeDeg = readSightedAltitude(fields.get('altitude'), context)
  if (star === null || at === null) return null
  const target: StarTarget = { body: 'star', star, at, altitudeDeg }
  const altitude = fields.get('altitude')
  if (altitude === undefined || !isOnMeridian(target)) return target
  const message = '`altitude` has no place here: at a culmination it is what the sightline states'
  reportOutOfPlace(altitude, { message, expected: ALTITUDE_IN_SIGHTLINE }, context)
  return target
}

function readSightedAltitude(field: Field | undefined, context: Context): Measured | Unstated {
  const read = measuredAngle(APPARENT_ALTITUDE, ALTITUDE_UNCERTAINTY)
  return readStatable(field, read, 'an altitude such as 3° ± 0.5°, or unknown', context)
}
