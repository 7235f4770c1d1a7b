import { findStar } from '../../src/sky/find-star.ts'
import type { Star } from '../../src/sky/star-catalogue.ts'

/** The star of a name that the catalogue is known to have. */
export function namedStar(name: string): Star {
  const { star } = findStar(name)
  if (star === null) throw new Error(`no star ${name}`)
  return star
}
