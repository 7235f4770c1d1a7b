import { MOON_WOBBLE_ARCMIN } from '../sky/moon.ts'
import { labelOfStar } from '../sky/star-catalogue.ts'
import type { Gap } from './gap.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { MOON_DISTANCE } from './targets/disc-altitude.ts'
import { MOON_WOBBLE } from './targets/moon.ts'
import { STAR_CATALOGUE } from './targets/star.ts'
import { placeOf } from './targets/star-pair.ts'
import { HALF_DAY } from './targets/sun.ts'

/** The errors that this program gives a target of its own, because no claim states them. */
export function gapsOfTarget({ target }: SightlineInputs, of: string): Gap[] {
  const gap = (source: string, used: string, basis: string): Gap => ({
    what: `${source}${of}`,
    said: 'omitted',
    used,
    basis,
    change: null,
    budgetSource: source,
  })
  switch (target.body) {
    case 'sun': {
      const isSolstice = target.event.name === 'june solstice' || target.event.name === 'december solstice'
      if (isSolstice) return []
      return [
        gap(
          HALF_DAY,
          'up to half a day, rectangular',
          'a rising falls at any hour of the day meant; our choice',
        ),
      ]
    }
    case 'sun at both solstices':
      return []
    case 'moon':
      return [
        gap(
          MOON_WOBBLE,
          `${MOON_WOBBLE_ARCMIN}′ to either side every 173 days`,
          'its phase is not known; 6.4′ as one standard deviation',
        ),
        gap(
          MOON_DISTANCE,
          'the mean, ± 4 %',
          'its distance at the time is not known; parallax and width follow it',
        ),
      ]
    case 'star':
      return [gap(STAR_CATALOGUE, CATALOGUE_USED, CATALOGUE_BASIS)]
    case 'two stars':
      return target.stars.map((star) => gap(placeOf(labelOfStar(star)), CATALOGUE_USED, CATALOGUE_BASIS))
  }
}

const CATALOGUE_USED = '0.5″, and 7.5 mas for every year from 2000'
const CATALOGUE_BASIS =
  'what proper motions of the Bright Star Catalogue are commonly good to; more for stars with a close companion'
