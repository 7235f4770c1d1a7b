import { extent } from 'd3-array'
import type { HorizonMark } from './horizon-source.ts'

/** A part of the sky, degrees on it: `across` from the line, to the right positive. */
export interface Extent {
  across: readonly [number, number]
  altitudes: readonly [number, number]
}

/** What a mark takes up; `acrossPerAzimuth` is how much of the sky a degree of azimuth is there. */
export function extentOf(
  { azimuthDeg, altitudeDeg, radiusDeg }: HorizonMark,
  lineDeg: number,
  acrossPerAzimuth: number,
): Extent {
  const across = (azimuthDeg - lineDeg) * acrossPerAzimuth
  const radius = radiusDeg ?? 0
  return {
    across: [across - radius, across + radius],
    altitudes: [altitudeDeg - radius, altitudeDeg + radius],
  }
}

/** The least that holds them all. */
export function unionOf(extents: readonly Extent[]): Extent {
  return {
    across: extent(extents.flatMap(({ across }) => across)) as [number, number],
    altitudes: extent(extents.flatMap(({ altitudes }) => altitudes)) as [number, number],
  }
}
