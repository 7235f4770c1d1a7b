import { DEG } from '../quantity/degrees.ts'

/** Where a small angle is turned into a distance: the length of the line, or 100 m where none is known. */
export interface Marker {
  distance_m: number
  measured: boolean
}

export function markerOf(lengthM: number | null): Marker {
  return lengthM === null ? { distance_m: 100, measured: false } : { distance_m: lengthM, measured: true }
}

/** The distance that an angle in arcminutes spans at the marker, centimetres, as the crow flies. */
export function centimetres(arcmin: number, { distance_m }: Marker): number {
  return 200 * distance_m * Math.sin(((arcmin / 60) * DEG) / 2)
}

/** An angle along the horizon in widths of the Sun's disc, which at an altitude spans 1/cos h of its width. */
export function sunWidths(arcmin: number, semidiameterArcmin: number, altitudeDeg: number): number {
  return (arcmin * Math.cos(altitudeDeg * DEG)) / (2 * semidiameterArcmin)
}
