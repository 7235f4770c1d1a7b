import type { Audit } from '../../audit/audit.ts'
import { bodiesOf, hasRisingStar } from '../wording/bodies.ts'

/**
 * What `has` and `lacks` of a `when` may ask for. Of the targets: `sun`, `moon`, `stars` (one alone or two, which
 * `two_stars` are), `star_rising` where a star rises or sets, `horizon` where anything does, `meridian` where an
 * altitude is measured, `air` where refraction plays a part.
 */
export const CONDITIONS: Readonly<Record<string, (audit: Audit) => boolean>> = {
  air: (audit) => audit.sightlines.some(({ body }) => body !== 'two stars'),
  alternatives: (audit) => audit.alternatives.length > 0,
  assumptions: (audit) => audit.assumptions.length > 0,
  budget: (audit) => audit.budget.length > 0,
  checks: (audit) => audit.checks.length > 0,
  findings: (audit) => audit.findings.length > 0,
  horizon: (audit) =>
    audit.sightlines.some(({ body, measures }) => body !== 'two stars' && measures === 'azimuth'),
  meridian: (audit) => audit.sightlines.some(({ measures }) => measures === 'altitude'),
  moon: (audit) => audit.sightlines.some(({ body }) => body === 'moon'),
  notes: (audit) => typeof audit.claim.notes === 'string' && audit.claim.notes.trim() !== '',
  other_dates: (audit) => audit.other_dates.length > 0,
  reproduction: (audit) => audit.reproduction.length > 0,
  several_sightlines: (audit) => audit.sightlines.length > 1,
  source: (audit) => audit.source !== null,
  star_rising: hasRisingStar,
  stars: (audit) => bodiesOf(audit).stars,
  sun: (audit) => audit.sightlines.some(({ body }) => body === 'sun'),
  two_stars: (audit) => audit.sightlines.some(({ body }) => body === 'two stars'),
  warnings: (audit) => audit.warnings.length > 0,
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
