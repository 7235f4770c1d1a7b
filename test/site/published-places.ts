import { GRS80 } from '../../src/site/ellipsoid.ts'
import type { GeographicPoint } from '../../src/site/geographic-point.ts'
import { utmGrid } from './utm-grid.ts'

/** Degrees, minutes and seconds of an angle as degrees, with its sign apart. */
export function sexagesimal(sign: 1 | -1, degrees: number, minutes: number, seconds: number): number {
  return sign * (degrees + minutes / 60 + seconds / 3600)
}

/**
 * The worked example of the Geocentric Datum of Australia technical manual (ICSM), chapters 4 to 6, on GRS 80: two
 * pillars in Victoria. Printed: 54,972.271 m and 306°52′05.37″ from the first to the second.
 */
export const FLINDERS_PEAK: GeographicPoint = {
  latitudeDeg: sexagesimal(-1, 37, 57, 3.7203),
  longitudeDeg: sexagesimal(1, 144, 25, 29.5244),
}
export const BUNINYONG: GeographicPoint = {
  latitudeDeg: sexagesimal(-1, 37, 39, 10.1561),
  longitudeDeg: sexagesimal(1, 143, 55, 35.3839),
}
export const FLINDERS_TO_BUNINYONG = { azimuthDeg: sexagesimal(1, 306, 52, 5.37), lengthM: 54_972.271 }

/** The same on the Map Grid of Australia, zone 55; the figures of Buninyong from memory, good to 1 mm. */
export const MGA_55 = utmGrid(55, 'S', GRS80)
export const FLINDERS_PEAK_ON_GRID = { eastingM: 273_741.297, northingM: 5_796_489.777 }
export const BUNINYONG_ON_GRID = { eastingM: 228_854.052, northingM: 5_828_259.038 }
