import type { BlockContent } from 'mdast'
import type { Audit, SightlineAudit } from '../../audit/audit.ts'
import { formatArcmin } from '../../quantity/format-angle.ts'
import { formatNumber } from '../../quantity/format-number.ts'
import { paragraph, strong } from '../nodes.ts'
import { measuredDegrees } from '../wording/measured-angle.ts'

/** How the directions and the horizons follow from what was surveyed. */
export function surveyPart(audit: Audit): BlockContent[] {
  return [
    ...northOf(audit),
    ...audit.sightlines.flatMap((line) => {
      const sentences = [...line.survey, measured(line), ...horizons(line), ...refraction(line)]
      return [paragraph(strong(`${line.name}.`), ` ${sentences.join(' ')}`)]
    }),
  ]
}

function northOf({ plan }: Audit): BlockContent[] {
  if (plan.north === null) return []
  const { words, sd_deg } = plan.north
  const error = sd_deg === 0 ? '' : `, ± ${formatArcmin(sd_deg * 60)}`
  const shared = sd_deg === 0 ? '' : ' All lines between points of the plan share its error.'
  return [paragraph(`North of the plan: ${words}${error}.${shared}`)]
}

function measured({ azimuth_deg, angle_deg, altitude_deg, measures }: SightlineAudit): string {
  if (angle_deg !== null) {
    return `Angle between its two lines: ${measuredDegrees(angle_deg)}; no north has a part in it.`
  }
  if (measures === 'altitude' && altitude_deg !== null) return `Altitude: ${measuredDegrees(altitude_deg)}.`
  return azimuth_deg === null ? '' : `Azimuth: ${measuredDegrees(azimuth_deg)}.`
}

function horizons({ skyline, solstices }: SightlineAudit): string[] {
  if (solstices !== null) {
    return solstices.map(
      ({ solstice, horizon, altitude_deg }) =>
        `${solstice} horizon: ${horizon}; ${measuredDegrees(altitude_deg)}.`,
    )
  }
  if (skyline === null) return []
  return [`Horizon: ${skyline.words}; where the line meets it ${measuredDegrees(skyline.at_line_deg)}.`]
}

/** The refraction that the claim took, where it is not what the air of the place gives. */
function refraction({ refraction_check }: SightlineAudit): string[] {
  if (refraction_check === null) return []
  const { stated_arcmin, traced_arcmin, sea_level_arcmin, is_sea_level, effect_years } = refraction_check
  const source = is_sea_level
    ? ` That is the textbook figure for sea level (${formatArcmin(sea_level_arcmin)} by Bennett 1982), which the height of the place does not have.`
    : ` The textbook figure for sea level is ${formatArcmin(sea_level_arcmin)} (Bennett 1982).`
  const years =
    effect_years === null
      ? ''
      : `; with the claim’s figure the date comes out ${formatNumber(Math.abs(effect_years), 2)} years ${effect_years < 0 ? 'earlier' : 'later'} than with the traced one`
  return [
    `The claim takes the refraction as ${formatArcmin(stated_arcmin)}; a ray trace through the air of the place gives ${formatArcmin(traced_arcmin)}, a difference of ${formatArcmin(Math.abs(stated_arcmin - traced_arcmin))}${years}.${source}`,
  ]
}
