import type { Audit, Skyline } from '../../audit/audit.ts'
import { bodiesOf, hasRisingStar } from '../wording/bodies.ts'

/**
 * What `has` and `lacks` of a `when` may ask for. Of the targets: `sun`, `moon`, `stars` (one alone or two, which
 * `two_stars` are), `star_rising` where a star rises or sets, `horizon` where anything does, `meridian` where an
 * altitude is measured, `air` where refraction plays a part. Of the survey: `places_on_earth` where geodesics give a
 * direction, `angle`, `distant_horizon`, `skyline_profile`.
 */
export const CONDITIONS: Readonly<Record<string, (audit: Audit) => boolean>> = {
  air: (audit) => audit.sightlines.some(({ body }) => body !== 'two stars'),
  alternatives: (audit) => audit.alternatives.length > 0,
  angle: (audit) => audit.sightlines.some(({ measures }) => measures === 'angle'),
  assumptions: (audit) => audit.assumptions.length > 0,
  budget: (audit) => audit.budget.length > 0,
  checks: (audit) => audit.checks.length > 0,
  distant_horizon: (audit) => hasSkylineFrom(audit, ['distance', 'point', 'sea']),
  findings: (audit) => audit.findings.length > 0,
  horizon: (audit) =>
    audit.sightlines.some(({ body, measures }) => body !== 'two stars' && measures !== 'altitude'),
  meridian: (audit) => audit.sightlines.some(({ measures }) => measures === 'altitude'),
  moon: (audit) => audit.sightlines.some(({ body }) => body === 'moon'),
  notes: (audit) => typeof audit.claim.notes === 'string' && audit.claim.notes.trim() !== '',
  other_dates: (audit) => audit.other_dates.length > 0,
  places_on_earth: (audit) => audit.references.includes('karney2013'),
  reproduction: (audit) => audit.reproduction.length > 0,
  several_sightlines: (audit) => audit.sightlines.length > 1,
  skyline_profile: (audit) => hasSkylineFrom(audit, ['profile']),
  source: (audit) => audit.source !== null,
  star_rising: hasRisingStar,
  stars: (audit) => bodiesOf(audit).stars,
  sun: (audit) => audit.sightlines.some(({ body }) => body === 'sun' || body === 'sun at both solstices'),
  survey: (audit) => audit.plan.lines.length > 0 || audit.sightlines.some(({ skyline }) => skyline !== null),
  today: (audit) => audit.today.length > 0,
  today_sun: (audit) =>
    audit.sightlines.some(({ body }) => body === 'sun' || body === 'sun at both solstices') &&
    audit.today.some(({ next }) => next !== null),
  two_stars: (audit) => audit.sightlines.some(({ body }) => body === 'two stars'),
  warnings: (audit) => audit.warnings.length > 0,
}

function hasSkylineFrom({ sightlines }: Audit, ways: readonly Skyline['from'][]): boolean {
  return sightlines.some(({ skyline }) => skyline !== null && ways.includes(skyline.from))
}

/** Whether every condition of a `when` holds for this audit. */
export function conditionsHold(
  attributes: Readonly<Record<string, string | null | undefined>>,
  audit: Audit,
): boolean {
  const words = (name: string) => (attributes[name] ?? '').split(/\s+/).filter((word) => word !== '')
  const outcomes = words('outcome')
  return (
    words('has').every((name) => CONDITIONS[name]!(audit)) &&
    words('lacks').every((name) => !CONDITIONS[name]!(audit)) &&
    (outcomes.length === 0 || outcomes.includes(audit.outcome))
  )
}
