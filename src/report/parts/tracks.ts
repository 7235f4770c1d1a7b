import type { BlockContent } from 'mdast'
import type { Audit, SightlineAudit } from '../../audit/audit.ts'
import { formatArcmin, formatDegrees } from '../../quantity/format-angle.ts'
import { formatCm } from '../../quantity/format-length.ts'
import { formatNumber } from '../../quantity/format-number.ts'
import { paragraph, strong } from '../nodes.ts'
import { fixed } from '../wording/fixed.ts'
import { offsetFromLine } from '../wording/offset-from-line.ts'
import { sunWidthShare } from '../wording/sun-width-share.ts'

/** For each sightline: its target, the air it was seen through, and how fast it moves along the horizon. */
export function tracksPart(audit: Audit): BlockContent[] {
  return audit.sightlines.map((line) => {
    const sentences = [target(line), air(line), dwell(line), atAsserted(line, audit), drift(line)]
    return paragraph(strong(`${line.name}.`), ` ${sentences.filter((sentence) => sentence !== '').join(' ')}`)
  })
}

function target({ target, length_m }: SightlineAudit): string {
  const length = length_m === null ? '' : ` The line is ${formatCm(length_m * 100)} long.`
  return `Target: ${target}.${length}`
}

function air({ air }: SightlineAudit): string {
  if (air === null) return 'The refraction is the one the claim file gives.'
  const { pressure_hpa, temperature_c, humidity } = air
  const wet = humidity === 0 ? 'dry air' : `${fixed(humidity * 100, 0)} % humidity`
  return `Refraction is traced for ${fixed(pressure_hpa, 0)} hPa, ${fixed(temperature_c, 0)} °C and ${wet}.`
}

function dwell({ dwell_days }: SightlineAudit): string {
  if (dwell_days === null) return ''
  const days = Math.round(dwell_days)
  const span = days <= 1 ? 'about one day' : `${days} days`
  return `Around the solstice the Sun’s place on the horizon stays within 1′ of its extreme for ${span}.`
}

function atAsserted(line: SightlineAudit, audit: Audit): string {
  const { azimuth_at_asserted_deg: azimuth, offset_at_asserted_arcmin: offset } = line
  if (azimuth === null || offset === null) {
    return `At the asserted date (${audit.asserted.printed}) the target does not reach this altitude at all.`
  }
  const where = offsetFromLine(offset, line.offset_at_asserted_sd_arcmin)
  return `At the asserted date the target stood at azimuth ${formatDegrees(azimuth, 'minute')}; the line points ${where}.`
}

function drift({ drift, length_m }: SightlineAudit): string {
  if (drift === null) return ''
  const { arcmin_per_century, cm_per_century, sun_widths_per_millennium, years_per_arcmin } = drift
  const side = arcmin_per_century > 0 ? 'right' : 'left'
  const place = length_m === null ? 'at 100 m' : 'at the marker'
  return [
    `It then moved ${formatArcmin(Math.abs(arcmin_per_century))} a century to the ${side}, which is `,
    `${formatCm(Math.abs(cm_per_century))} ${place}, or ${sunWidthShare(sun_widths_per_millennium)} in 1,000 years. `,
    `Each minute of arc stands for ${formatNumber(Math.abs(years_per_arcmin), 2)} years.`,
  ].join('')
}
