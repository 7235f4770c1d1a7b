import type { Audit } from '../../audit/audit.ts'
import { formatCm } from '../../quantity/format-length.ts'

/** Head of a column of distances: at the marker where the line's length is known, else at the stand-in for it. */
export function markerPlace({ sweep: { marker } }: Audit): string {
  const distance = formatCm(marker.distance_m * 100)
  return marker.measured ? `At the marker, ${distance} off` : `At ${distance}`
}
