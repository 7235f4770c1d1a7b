import type { EllipsoidName } from '../claim.ts'
import type { Context, Field } from './field.ts'
import { readWord } from './read-word.ts'

export const ELLIPSOID_NAMES = [
  'WGS84',
  'GRS80',
  'Airy 1830',
  'Bessel 1841',
  'Clarke 1866',
  'Clarke 1880 (IGN)',
  'International 1924',
  'Krassovsky 1940',
] as const satisfies readonly EllipsoidName[]

const ELLIPSOIDS = {
  words: ELLIPSOID_NAMES,
  aliases: {
    'WGS 1984': 'WGS84',
    'GRS 1980': 'GRS80',
    Airy: 'Airy 1830',
    Bessel: 'Bessel 1841',
    International: 'International 1924',
    Hayford: 'International 1924',
    'Hayford 1909': 'International 1924',
    'Clarke 1880 IGN': 'Clarke 1880 (IGN)',
    Krassovsky: 'Krassovsky 1940',
    Krassowsky: 'Krassovsky 1940',
    'Krassowsky 1940': 'Krassovsky 1940',
    Krasovsky: 'Krassovsky 1940',
    'Krasovsky 1940': 'Krassovsky 1940',
  },
  /** The frames of surveys that are reckoned on one, and names that leave open which is meant. */
  hints: {
    ETRS89: 'GRS80',
    GDA94: 'GRS80',
    GDA2020: 'GRS80',
    NAD83: 'GRS80',
    NAD27: 'Clarke 1866',
    OSGB36: 'Airy 1830',
    ED50: 'International 1924',
    'Clarke 1880': 'Clarke 1880 (IGN)',
    Clarke: 'Clarke 1866',
  },
} as const

/** Reads the name of the figure of the Earth that a grid is reckoned on; null where there is none to read. */
export function readEllipsoid(field: Field | undefined, context: Context): EllipsoidName | null {
  return readWord<EllipsoidName>(field, ELLIPSOIDS, context)
}
