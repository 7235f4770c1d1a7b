import { precessionMatrix } from './precession-matrix.ts'
import { shortPrecessionMatrix } from './short-precession.ts'
import type { Matrix } from './vector.ts'

/** A model of the precession of the equator and the equinox. */
export interface PrecessionModel {
  /** As the report prints it. */
  label: string
  /** Rotation from the mean equator and equinox of J2000 to those of a Julian epoch. */
  matrix: (year: number) => Matrix
  /** Years in which the model may be used, and whose statement that is. */
  range: { from: number; to: number; basis: string }
}

/** Named as the obliquity models of the same theories. */
export type PrecessionModelName = 'vondrak2011' | 'p03'

/** The long-term model that this program rests on, and the short one that most programs use. */
export const PRECESSION_MODELS: Readonly<Record<PrecessionModelName, PrecessionModel>> = {
  vondrak2011: {
    label: 'Vondrák 2011',
    matrix: precessionMatrix,
    range: { from: -198_000, to: 202_000, basis: 'within 200,000 years of 2000, as its authors state' },
  },
  // The pole and the equinox stay within 4″ of Vondrák 2011 there; at −5000 they part by 4′, at −10000 by 1.5°.
  p03: {
    label: 'IAU 2006 (P03)',
    matrix: shortPrecessionMatrix,
    range: { from: -1000, to: 5000, basis: 'a few millennia about 2000, taken here as 3,000 years' },
  },
}
