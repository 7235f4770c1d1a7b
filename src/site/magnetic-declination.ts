import { model } from 'geomagnetism'
import { checkedPoint, type GeographicPoint } from './geographic-point.ts'

/** Where a compass pointed. */
export interface MagneticDeclination {
  /** From true north to magnetic north, positive where magnetic north lies east. */
  deg: number
  /** Of the model, with the magnetism of the ground; not that of the compass and its reading. */
  sdDeg: number
  /** The edition of the World Magnetic Model, such as `WMM-2020`. */
  model: string
}

/** A day within the first edition that the package holds, and one within the last. */
const IN_FIRST = new Date('2016-01-01T00:00:00Z')
const IN_LAST = new Date('2026-01-01T00:00:00Z')

/** The first and the last moment that the editions of the World Magnetic Model at hand cover between them. */
export const MAGNETIC_MODEL_SPAN: { readonly from: string; readonly to: string } = {
  from: model(IN_FIRST).start_date.toISOString(),
  to: model(IN_LAST).end_date.toISOString(),
}

/**
 * Standard deviation of declination by edition: √(a² + (b/H)²), a in degrees, b in degree-nanoteslas, with the
 * horizontal field H (WMM2015, WMM2020 and WMM2025 technical reports, error model, section 3; from memory).
 */
const ERROR_MODELS: Readonly<Record<number, readonly [number, number]>> = {
  2015: [0.23, 5430],
  2020: [0.26, 5625],
  2025: [0.26, 5417],
}

/**
 * Magnetic declination at a place on a day by the edition of the World Magnetic Model that covers the day; null
 * where none does.
 *
 * @param place Its height in metres; whether above the sea or the ellipsoid makes less than 0.01°.
 * Source: Chulliat et al. 2020 and 2025, The US/UK World Magnetic Model, as `geomagnetism` has them. Throws a
 * RangeError where the place or the date is none.
 */
export function magneticDeclination(
  place: GeographicPoint & { heightM: number },
  date: Date,
): MagneticDeclination | null {
  const { latitudeDeg, longitudeDeg, heightM } = checkedPoint(place)
  if (!Number.isFinite(heightM)) throw new RangeError(`the height is ${heightM}; write metres`)
  if (Number.isNaN(date.getTime())) throw new RangeError('the date is none; write one such as 2021-06-15')
  if (date < new Date(MAGNETIC_MODEL_SPAN.from) || date > new Date(MAGNETIC_MODEL_SPAN.to)) return null
  const edition = model(date)
  const { decl, h } = edition.point([latitudeDeg, longitudeDeg, heightM / 1000])
  return { deg: decl, sdDeg: modelSdDeg(edition.epoch, h), model: edition.name }
}

function modelSdDeg(epoch: number, horizontalNt: number): number {
  const figures = ERROR_MODELS[epoch]
  if (figures === undefined) throw new RangeError(`no error is stated for the magnetic model of ${epoch}`)
  const [steady, overField] = figures
  return Math.hypot(steady, overField / horizontalNt)
}
