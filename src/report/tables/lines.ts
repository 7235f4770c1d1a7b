import type { Table } from 'mdast'
import type { Audit, SightlineAudit, Value } from '../../audit/audit.ts'
import { type Column, table } from '../nodes.ts'
import { measuredArcmin, measuredDegrees } from '../wording/measured-angle.ts'

/** Stands where a line has no such step. */
const NONE = '–'

/** From each built line to a declination, step by step; a step that no line has is left out. */
export function linesTable(audit: Audit): Table[] {
  const { sightlines } = audit
  if (sightlines.length === 0) return []
  return [
    table<SightlineAudit>(
      [
        sightlines.every(({ declination_deg }) => declination_deg === null)
          ? 'The line as measured; each ± is one standard deviation, the builders’ own error left out.'
          : 'From the line to a declination; each ± is one standard deviation, the builders’ own error left out.',
      ],
      columnsFor(sightlines).filter(({ cell }) => sightlines.some((line) => cell(line) !== NONE)),
      sightlines,
    ),
  ]
}

function columnsFor(lines: readonly SightlineAudit[]): Column<SightlineAudit>[] {
  return [
    { head: 'Sightline', cell: (line) => line.name, width: 1.3 },
    { head: 'Azimuth', cell: azimuth, width: 1.5 },
    { head: 'Angle', cell: ({ angle_deg: deg }) => degrees(deg), width: 1.5 },
    { head: altitudeHead(lines), cell: altitude, width: 1.3 },
    { head: 'Refraction', cell: refraction, width: 1.3 },
    { head: discHead(lines), cell: ({ semidiameter_arcmin: half }) => arcmin(half), width: 1.3 },
    { head: trueAltitudeHead(lines), cell: ({ centre_altitude_deg: deg }) => degrees(deg), width: 1.4 },
    { head: 'Declination', cell: ({ declination_deg: deg }) => degrees(deg), width: 1.4 },
  ]
}

/** An altitude is measured on the meridian, where the azimuth is no result. */
function azimuth({ measures, azimuth_deg }: SightlineAudit): string {
  if (azimuth_deg === null) return NONE
  if (measures === 'azimuth') return measuredDegrees(azimuth_deg)
  return azimuth_deg.value === 0 ? 'north, on the meridian' : 'south, on the meridian'
}

/** The direction of two stars one above the other does not depend on height or air. */
function altitude({ body, altitude_deg, solstices }: SightlineAudit): string {
  if (solstices !== null) return eachSolstice(solstices, ({ altitude_deg }) => measuredDegrees(altitude_deg))
  return body === 'two stars' ? NONE : degrees(altitude_deg)
}

function refraction({ body, refraction_arcmin, solstices }: SightlineAudit): string {
  if (solstices !== null) {
    return eachSolstice(solstices, ({ refraction_arcmin }) => measuredArcmin(refraction_arcmin))
  }
  return body === 'two stars' ? NONE : arcmin(refraction_arcmin)
}

type Solstices = NonNullable<SightlineAudit['solstices']>

/** The two lines of an angle: `June 1°00′ ± 1′; December 1°20′ ± 1′`. */
function eachSolstice(solstices: Solstices, cell: (one: Solstices[number]) => string): string {
  return solstices.map((one) => `${one.solstice} ${cell(one)}`).join('; ')
}

function arcmin(value: Value | null): string {
  return value === null ? NONE : measuredArcmin(value)
}

function degrees(value: Value | null): string {
  return value === null ? NONE : measuredDegrees(value)
}

function altitudeHead(lines: readonly SightlineAudit[]): string {
  const measures = new Set(lines.map((line) => line.measures))
  if (measures.size > 1 && measures.has('altitude')) return 'Horizon, or altitude measured'
  if (lines.some(isSeenAbove)) return 'Horizon, or where seen'
  return measures.has('altitude') ? 'Altitude measured' : 'Horizon'
}

/** A star that is first seen higher than the skyline is. */
function isSeenAbove({ body, altitude_deg, skyline }: SightlineAudit): boolean {
  return (
    body === 'star' &&
    skyline !== null &&
    altitude_deg !== null &&
    altitude_deg.value > skyline.at_line_deg.value
  )
}

function discHead(lines: readonly SightlineAudit[]): string {
  const bodies = new Set(
    lines.flatMap(({ body }) =>
      body === 'star' || body === 'two stars' ? [] : [body === 'moon' ? 'moon' : 'sun'],
    ),
  )
  if (bodies.size > 1) return 'Half the disc’s width'
  return bodies.has('moon') ? 'Half the Moon’s width' : 'Half the Sun’s width'
}

function trueAltitudeHead(lines: readonly SightlineAudit[]): string {
  return lines.some(({ semidiameter_arcmin }) => semidiameter_arcmin !== null)
    ? 'Centre’s true altitude'
    : 'True altitude'
}
