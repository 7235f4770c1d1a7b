import type { Table } from 'mdast'
import type { Audit, SightlineAudit } from '../../audit/audit.ts'
import { table } from '../nodes.ts'
import { measuredArcmin, measuredDegrees } from '../wording/measured-angle.ts'

/** From each built line to a declination, step by step. */
export function linesTable(audit: Audit): Table[] {
  if (audit.sightlines.length === 0) return []
  return [
    table<SightlineAudit>(
      ['From the line to a declination; each ± is one standard deviation, the builders’ own error left out.'],
      [
        { head: 'Sightline', cell: (line) => line.name, width: 1.3 },
        { head: 'Azimuth', cell: (line) => measuredDegrees(line.azimuth_deg), width: 1.5 },
        { head: 'Horizon', cell: (line) => measuredDegrees(line.altitude_deg), width: 1.3 },
        { head: 'Refraction', cell: (line) => measuredArcmin(line.refraction_arcmin), width: 1.3 },
        {
          head: 'Half the Sun’s width',
          cell: (line) => measuredArcmin(line.semidiameter_arcmin),
          width: 1.3,
        },
        {
          head: 'Centre’s true altitude',
          cell: (line) => measuredDegrees(line.centre_altitude_deg),
          width: 1.4,
        },
        { head: 'Declination', cell: (line) => measuredDegrees(line.declination_deg), width: 1.4 },
      ],
      audit.sightlines,
    ),
  ]
}
