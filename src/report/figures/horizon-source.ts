import type { Audit, Placement, SightlineAudit, Skyline, Value } from '../../audit/audit.ts'
import { altitudeOfSkyline } from './horizon-skyline.ts'
import { onTurnOf } from './track-source.ts'

/** A placement as it is drawn; angles in degrees, azimuths on that turn on which they lie nearest the line. */
export interface HorizonMark {
  placement: Placement
  /** Counts the independent dates, from 0; null for the asserted date and today. */
  independent: number | null
  directionDeg: number
  /** Least and greatest direction over the whole date. */
  rangeDeg: readonly [number, number]
  /** Middle of the disc, or the star. */
  azimuthDeg: number
  altitudeDeg: number
  /** Null for a star. */
  radiusDeg: number | null
}

/** What the horizon figure of one sightline is drawn from. */
export interface HorizonSource {
  sightline: SightlineAudit
  skyline: Skyline
  line: Value
  marks: readonly HorizonMark[]
  /** Dates at which the target has no direction. */
  unseen: readonly Placement[]
  /** The build tolerances held plausible, least and greatest. */
  plausibleArcmin: readonly [number, number]
  /** Arcminutes of azimuth that the Sun's width spans, as the sweep has it; null where the audit does not say. */
  sunWidthArcmin: number | null
}

/** Whether a sightline has a skyline that its target stands on. */
export function hasHorizon({ measures, skyline, azimuth_deg }: SightlineAudit): boolean {
  return measures === 'azimuth' && skyline !== null && azimuth_deg !== null
}

/** Throws a RangeError where the audit has no such sightline, or one without a skyline. */
export function horizonSource(audit: Audit, name: string): HorizonSource {
  const sightline = audit.sightlines.find((each) => each.name === name)
  const line = sightline?.azimuth_deg ?? null
  const skyline = sightline?.skyline ?? null
  if (sightline === undefined || skyline === null || line === null) {
    throw new RangeError(`the audit has no skyline of a sightline \`${name}\``)
  }
  const placements = audit.placements.filter((each) => each.sightline === name)
  const independent = placements.filter(({ kind }) => kind === 'independent')
  return {
    ...{ sightline, skyline, line },
    marks: placements.flatMap((placement) => markOf(placement, independent, sightline, skyline, line.value)),
    unseen: placements.filter(({ direction_deg }) => direction_deg === null),
    plausibleArcmin: [audit.plausible.low_arcmin, audit.plausible.high_arcmin],
    sunWidthArcmin: sunWidthOf(audit, sightline),
  }
}

function markOf(
  placement: Placement,
  independent: readonly Placement[],
  sightline: SightlineAudit,
  skyline: Skyline,
  lineDeg: number,
): HorizonMark[] {
  const { direction_deg, direction_range_deg, disc } = placement
  if (direction_deg === null) return []
  const directionDeg = onTurnOf(lineDeg, direction_deg)
  const [from, to] = (direction_range_deg ?? [direction_deg, direction_deg]).map((deg) =>
    onTurnOf(directionDeg, deg),
  ) as [number, number]
  const place =
    disc === null
      ? {
          azimuthDeg: directionDeg,
          altitudeDeg: starAltitude(directionDeg, sightline, skyline),
          radiusDeg: null,
        }
      : {
          azimuthDeg: onTurnOf(lineDeg, disc.azimuth_deg),
          altitudeDeg: disc.altitude_deg,
          radiusDeg: disc.semidiameter_arcmin / 60,
        }
  const rank = independent.indexOf(placement)
  return [
    {
      ...{ placement, independent: rank < 0 ? null : rank, directionDeg, ...place },
      rangeDeg: [Math.min(from, to), Math.max(from, to)],
    },
  ]
}

/** A star stands on the skyline, or over it where its light comes through the air only higher up. */
function starAltitude(azimuthDeg: number, { altitude_deg }: SightlineAudit, skyline: Skyline): number {
  const onSkyline = altitudeOfSkyline(skyline, azimuthDeg)
  const isHigher = altitude_deg !== null && altitude_deg.value > skyline.at_line_deg.value
  return isHigher ? Math.max(altitude_deg.value, onSkyline) : onSkyline
}

function sunWidthOf({ sweep }: Audit, { sweep: own }: SightlineAudit): number | null {
  const step = (own ?? sweep).steps.find(({ tolerance_sun_widths }) => tolerance_sun_widths > 0)
  return step === undefined ? null : step.tolerance_arcmin / step.tolerance_sun_widths
}
