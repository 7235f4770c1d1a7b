import { cubicSpline } from './cubic-spline.ts'
import { LASKAR_2004_OBLIQUITY } from './laskar-2004-table.ts'
import { polynomial } from './long-term-poles.ts'
import { meanObliquityDeg } from './mean-obliquity.ts'

/** A model of the mean obliquity of the ecliptic. */
export interface ObliquityModel {
  /** As the report prints it. */
  label: string
  /** Degrees, at a Julian epoch. Outside `computable` the result is not defined. */
  obliquityDeg: (year: number) => number
  /** Years in which the model may be used, and whose statement that is. */
  range: { from: number; to: number; basis: string }
  /** Years in which it gives a number at all. */
  computable: { from: number; to: number }
}

export type ObliquityModelName =
  | 'vondrak2011'
  | 'laskar2004'
  | 'laskar1986'
  | 'p03'
  | 'iau1976'
  | 'newcomb1895'

const ANY_YEAR = { from: -200_000, to: 200_000 }
const LASKAR_2004_SPAN = { from: LASKAR_2004_OBLIQUITY[0]![0], to: LASKAR_2004_OBLIQUITY.at(-1)![0] }

/** A polynomial of arcseconds in centuries from `epoch`, as a function of the year in degrees. */
function fromPolynomial(epoch: number, centuries: number, coefficients: readonly number[]) {
  return (year: number) => polynomial(coefficients, (year - epoch) / (100 * centuries)) / 3600
}

/**
 * The models of the mean obliquity that dating claims have used, and the two that this program rests on.
 * The two cubic polynomials carry no range that their authors are known to have stated: the range here is
 * where they stay within 10″ of Vondrák 2011.
 */
export const OBLIQUITY_MODELS: Readonly<Record<ObliquityModelName, ObliquityModel>> = {
  // Vondrák, Capitaine & Wallace 2011, A&A 534, A22; corrigendum 2012, A&A 541, C1.
  vondrak2011: {
    label: 'Vondrák 2011',
    obliquityDeg: meanObliquityDeg,
    range: { from: -198_000, to: 202_000, basis: 'within 200,000 years of 2000, as its authors state' },
    computable: ANY_YEAR,
  },
  // Laskar et al. 2004, A&A 428, 261: the printed table, every 1,000 years.
  laskar2004: {
    label: 'Laskar 2004',
    obliquityDeg: cubicSpline(LASKAR_2004_OBLIQUITY),
    range: { ...LASKAR_2004_SPAN, basis: 'the stretch of its table that this program holds' },
    computable: LASKAR_2004_SPAN,
  },
  // Laskar 1986, A&A 157, 59, table 8; the variable is 10,000 Julian years.
  laskar1986: {
    label: 'Laskar 1986',
    obliquityDeg: fromPolynomial(
      2000,
      100,
      [84381.448, -4680.93, -1.55, 1999.25, -51.38, -249.67, -39.05, 7.12, 27.87, 5.79, 2.45],
    ),
    range: { from: -8000, to: 12_000, basis: 'within 10,000 years of 2000, as its author states' },
    computable: ANY_YEAR,
  },
  // IAU 2006, Capitaine, Wallace & Chapront 2003, A&A 412, 567.
  p03: {
    label: 'IAU 2006 (P03)',
    obliquityDeg: fromPolynomial(2000, 1, [84381.406, -46.836769, -0.0001831, 0.0020034, -5.76e-7, -4.34e-8]),
    range: { from: -1000, to: 5000, basis: 'a few millennia about 2000, taken here as 3,000 years' },
    computable: ANY_YEAR,
  },
  // Lieske, Lederle, Fricke & Morando 1977, A&A 58, 1.
  iau1976: {
    label: 'IAU 1976',
    obliquityDeg: fromPolynomial(2000, 1, [84381.448, -46.815, -0.00059, 0.001813]),
    range: { from: -1500, to: 6000, basis: 'none stated that we know of; within 10″ of Vondrák 2011' },
    computable: ANY_YEAR,
  },
  // Newcomb 1895, Elements of the Four Inner Planets; the almanacs' formula from about 1900 to 1983.
  newcomb1895: {
    label: 'Newcomb 1895',
    obliquityDeg: fromPolynomial(1900, 1, [84428.26, -46.845, -0.0059, 0.00181]),
    range: { from: -1500, to: 6000, basis: 'none stated that we know of; within 10″ of Vondrák 2011' },
    computable: ANY_YEAR,
  },
}
