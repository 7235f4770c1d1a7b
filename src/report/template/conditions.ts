import type { Audit } from '../../audit/audit.ts'

/** What `has` and `lacks` of a `when` may ask for. */
export const CONDITIONS: Readonly<Record<string, (audit: Audit) => boolean>> = {
  alternatives: (audit) => audit.alternatives.length > 0,
  assumptions: (audit) => audit.assumptions.length > 0,
  budget: (audit) => audit.budget.length > 0,
  checks: (audit) => audit.checks.length > 0,
  findings: (audit) => audit.findings.length > 0,
  notes: (audit) => typeof audit.claim.notes === 'string' && audit.claim.notes.trim() !== '',
  other_dates: (audit) => audit.other_dates.length > 0,
  reproduction: (audit) => audit.reproduction.length > 0,
  several_sightlines: (audit) => audit.sightlines.length > 1,
  source: (audit) => audit.source !== null,
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
