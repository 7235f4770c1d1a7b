import type { Uncertain } from '../../inference/horizon-branch.ts'
import { modelSpreadSdDeg, NUTATION_SD_DEG } from '../../sky/solstice-declination.ts'

/**
 * The errors of a declination that rests on the obliquity, which every such target shares.
 *
 * @param per Change of the declination with the obliquity, degrees per degree, with its sign.
 */
export function obliquityErrors(year: number, per: number): Uncertain['errors'] {
  return [
    { source: 'model of the obliquity', sdDeg: per * modelSpreadSdDeg(year), shared: true },
    { source: 'nutation', sdDeg: per * NUTATION_SD_DEG, shared: true },
  ]
}
