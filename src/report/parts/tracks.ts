import type { BlockContent } from 'mdast'
import type { Audit, SightlineAudit } from '../../audit/audit.ts'
import { formatArcmin, formatDegrees } from '../../quantity/format-angle.ts'
import { formatCm } from '../../quantity/format-length.ts'
import { formatNumber } from '../../quantity/format-number.ts'
import { formatYear } from '../../quantity/format-year.ts'
import { paragraph, strong } from '../nodes.ts'
import { fixed } from '../wording/fixed.ts'
import { noEvent } from '../wording/no-event.ts'
import { offsetFromLine, whatPoints } from '../wording/offset-from-line.ts'
import { sunWidthShare } from '../wording/sun-width-share.ts'

/** A movement under this many arcminutes a century, 12″ in 1,000 years, is told as standing still. */
const STILL_ARCMIN_PER_CENTURY = 0.02

/** For each sightline: its target, the air it was seen through, and how fast it moves. */
export function tracksPart(audit: Audit): BlockContent[] {
  return audit.sightlines.map((line) => {
    const sentences = [
      ...[target(line), air(line), ...line.notes],
      ...[atAsserted(line, audit), closest(line), drift(line)],
    ]
    return paragraph(strong(`${line.name}.`), ` ${sentences.filter((sentence) => sentence !== '').join(' ')}`)
  })
}

function target({ target, length_m }: SightlineAudit): string {
  const length = length_m === null ? '' : ` The line is ${formatCm(length_m * 100)} long.`
  return `Target: ${target}.${length}`
}

/** Air lifts two stars one above the other straight up, and so does not turn their direction. */
function air({ body, air }: SightlineAudit): string {
  if (body === 'two stars') return ''
  if (air === null) return 'The refraction is the one the claim file gives.'
  const { pressure_hpa, temperature_c, humidity } = air
  const wet = humidity === 0 ? 'dry air' : `${fixed(humidity * 100, 0)} % humidity`
  return `Refraction is traced for ${fixed(pressure_hpa, 0)} hPa, ${fixed(temperature_c, 0)} °C and ${wet}.`
}

function atAsserted(line: SightlineAudit, audit: Audit): string {
  const { measures, direction_at_asserted_deg: direction, offset_at_asserted_arcmin: arcmin } = line
  if (direction === null || arcmin === null) {
    return `At the asserted date (${audit.asserted.printed}) there was ${noEvent(line)}.`
  }
  const where = offsetFromLine({ arcmin, sdArcmin: line.offset_at_asserted_sd_arcmin, measures })
  return `At the asserted date the target stood at ${placed(measures)} ${formatDegrees(direction, 'minute')}; ${whatPoints(measures, 'now')} ${where}.`
}

/** Where the middle of the asserted date says too little of it: the year in it in which the line fits best. */
function closest(line: SightlineAudit): string {
  const { closest_in_asserted: best, offset_at_asserted_arcmin: arcmin, measures } = line
  if (best === null) return ''
  const gain = arcmin === null ? Number.POSITIVE_INFINITY : Math.abs(arcmin) - Math.abs(best.offset_arcmin)
  if (gain < best.sd_arcmin / 2) return ''
  const where = offsetFromLine({ arcmin: best.offset_arcmin, sdArcmin: best.sd_arcmin, measures })
  return `Of the asserted years the line fits ${formatYear(best.year)} best; ${whatPoints(measures, 'now')} ${where} as it stood then.`
}

/** An angle has an article where a direction has none. */
function placed(measures: SightlineAudit['measures']): string {
  return measures === 'angle' ? 'an angle of' : measures
}

function drift({ drift, length_m, measures }: SightlineAudit): string {
  if (drift === null) return ''
  const { arcmin_per_century, cm_per_century, sun_widths_per_millennium, years_per_arcmin } = drift
  if (Math.abs(arcmin_per_century) < STILL_ARCMIN_PER_CENTURY) return 'It then all but stood still.'
  const place = length_m === null ? 'at 100 m' : 'at the marker'
  return [
    `It then moved ${formatArcmin(Math.abs(arcmin_per_century))} a century ${towards(arcmin_per_century, measures)}, which is `,
    `${formatCm(Math.abs(cm_per_century))} ${place}, or ${sunWidthShare(sun_widths_per_millennium)} in 1,000 years. `,
    `Each minute of arc stands for ${formatNumber(Math.abs(years_per_arcmin), 2)} years.`,
  ].join('')
}

function towards(movement: number, measures: SightlineAudit['measures']): string {
  if (measures === 'altitude') return movement > 0 ? 'upwards' : 'downwards'
  if (measures === 'angle') return movement > 0 ? 'wider' : 'narrower'
  return movement > 0 ? 'to the right' : 'to the left'
}
