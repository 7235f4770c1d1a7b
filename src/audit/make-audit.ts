import type { Claim } from '../claim/claim.ts'
import { isUnstated } from '../quantity/unstated.ts'
import type { SkyPlace } from '../sky/sky-place.ts'
import { listAssumptions } from './assumptions.ts'
import type { Audit, SightlineAudit, Sweep } from './audit.ts'
import { auditAlternatives } from './audit-alternatives.ts'
import { auditBudget, auditBudgetCheck } from './audit-budget.ts'
import { auditChecks } from './audit-checks.ts'
import { auditImplied } from './audit-implied.ts'
import { auditLimits } from './audit-limits.ts'
import { auditPlacements } from './audit-placements.ts'
import { auditPlan } from './audit-plan.ts'
import { auditRefractionCheck } from './audit-refraction-check.ts'
import { auditReproduction, modelsOfDates, modelsToTry } from './audit-reproduction.ts'
import { auditSightline } from './audit-sightline.ts'
import { auditSweep, groundOf, sweepStep } from './audit-sweep.ts'
import { auditToday } from './audit-today.ts'
import { auditTracks } from './audit-tracks.ts'
import { nearestYear } from './dated-label.ts'
import { deepFreeze } from './deep-freeze.ts'
import { DEFAULTS, YEARS_BEYOND_WINDOW } from './defaults.ts'
import { isUnsteady } from './is-unsteady.ts'
import { verdictOf } from './outcome.ts'
import { referencesOf } from './references.ts'
import { auditSecondWindow } from './second-window.ts'
import { type SettledClaim, settleClaim, yardstickOf } from './settle-claim.ts'
import { statedOr } from './stated-or.ts'
import { writeSummary } from './summary/write-summary.ts'
import { takenAs } from './taken-as.ts'
import { listWarnings } from './warnings.ts'
import { writeFindings } from './write-findings.ts'

/** What an audit needs besides the claim: where it came from, and the clock. */
export interface AuditContext {
  /** Version of the program. */
  version: string
  /** Base name of the claim file. */
  file: string
  /** SHA-256 of the claim file's bytes, hexadecimal. */
  sha256: string
  now: Date
  /** Warnings of the reader of the claim file. */
  readingWarnings: readonly string[]
}

/** Audits a claim: settles its gaps, looks for its dates, sweeps over build tolerances and words the findings. */
export function makeAudit(claim: Claim, context: AuditContext): Audit {
  const settled = settleClaim(claim)
  const { lines, sights, joint, dates, year, plausible, yardstick, wantedArcmin } = settled
  const { asserted, others, window } = dates
  const present = context.now.getUTCFullYear()
  const ground = groundOf(joint, dates)
  const sweep = auditSweep(ground, dates, yardstick, wantedArcmin)
  const limits = auditLimits(ground, dates, yardstick.marker)
  const sightlines = lines.map((line) =>
    auditSightline(line, asserted, ownSweep(line, settled), auditRefractionCheck(claim, line, window, year)),
  )
  const implied = lines.flatMap((line) =>
    modelsOfDates(claim, line).map((model) => auditImplied(line, model, window, present, year)),
  )
  const ours = implied.filter(({ model }) => model === 'vondrak2011')
  const checks = auditChecks(
    claim.claimed,
    lines[0]!,
    sightlines[0]!,
    modelsToTry(claim, lines[0]!)[0]!,
    year,
  )
  const reproduction = auditReproduction(claim, lines, window)
  const { outcome, misfits } = verdictOf({
    sights,
    joint,
    dates,
    ground,
    limits,
    plausibleArcmin: tolerancesWithin(sweep, plausible),
  })
  const facts = { outcome, asserted, other_dates: others, plausible, window, sightlines, sweep, limits }
  const offset = largestOffset(misfits.map((i) => sightlines[i]!))
  const atOffset = offset === null ? null : sweepStep(ground, dates, yardstick, offset)
  const taken = lines.map((line, i) => takenAs(claim.sightlines[i]!, line, asserted))
  return deepFreeze({
    datestone: context.version,
    made_on: context.now.toISOString().slice(0, 10),
    file: context.file,
    input_sha256: context.sha256,
    attachments: claim.attachments,
    claim: claim.echo,
    statement: claim.statement,
    source: claim.source,
    structure: structureOf(claim),
    assumed_precision_arcmin: isUnstated(claim.assumedPrecisionArcmin) ? null : claim.assumedPrecisionArcmin,
    ...facts,
    summary: writeSummary({
      ...facts,
      implied: ours,
      misfits,
      atOffset,
      taken,
      northTaken: isNorthTaken(claim),
      isUnsteady: lines.some((line) => isUnsteady(line, year)),
    }),
    findings: writeFindings({ ...facts, implied, checks, reproduction }),
    assumptions: listAssumptions(claim, lines, window),
    plan: auditPlan(claim, lines),
    placements: lines.flatMap((line) => auditPlacements(line, asserted, others, present)),
    tracks: lines.flatMap((line) => tracksOf(line, window)),
    implied,
    checks,
    reproduction,
    second_window: auditSecondWindow(joint, dates, wantedArcmin),
    ...budgetOf(settled, ours[0]!.dates),
    alternatives: lines.flatMap((line) => auditAlternatives(line, window, year)),
    chance: null,
    today: lines.map((line) => auditToday(line, placeOf(claim), context.now, year)),
    warnings: listWarnings(claim, settled, ours, sweep, context.readingWarnings),
    references: referencesOf(claim, lines),
  })
}

function placeOf({ structure }: Claim): SkyPlace {
  return {
    latitudeDeg: structure.latitudeDeg,
    longitudeDeg: structure.longitudeDeg,
    heightM: statedOr(structure.elevationM, DEFAULTS.elevationM),
  }
}

function structureOf({ structure }: Claim): Audit['structure'] {
  return {
    name: structure.name,
    latitude_deg: structure.latitudeDeg,
    longitude_deg: structure.longitudeDeg,
    elevation_m: statedOr(structure.elevationM, DEFAULTS.elevationM),
  }
}

/** Each of several lines has a sweep of its own besides the joint one. */
function ownSweep(
  line: SettledClaim['lines'][number],
  { lines, sights, dates, year, wantedArcmin }: SettledClaim,
): Sweep | null {
  if (lines.length === 1) return null
  const ground = groundOf([sights[lines.indexOf(line)]!], dates)
  return auditSweep(ground, dates, yardstickOf(line, year, line.lengthM), wantedArcmin)
}

function tracksOf(line: SettledClaim['lines'][number], window: { from: number; to: number }) {
  const from = window.from - YEARS_BEYOND_WINDOW
  const to = window.to + YEARS_BEYOND_WINDOW
  return auditTracks(line, from, to)
}

/** At the implied date nearest the asserted one of the first line; empty where no date fits. */
function budgetOf(
  { lines, year, dates: { window } }: SettledClaim,
  dates: readonly { year: number }[],
): Pick<Audit, 'budget' | 'budget_check'> {
  const line = lines[0]!
  const nearest = nearestYear(
    dates.map((date) => date.year),
    year,
  )
  if (nearest === null) return { budget: [], budget_check: null }
  const budget = auditBudget(line, nearest)
  const span = { from: window.from - YEARS_BEYOND_WINDOW, to: window.to + YEARS_BEYOND_WINDOW }
  return { budget, budget_check: auditBudgetCheck(line, nearest, budget, span) }
}

/** Of some lines, how far the target stood from them where it came nearest; null where one was not to be seen. */
function largestOffset(sightlines: readonly SightlineAudit[]): number | null {
  const offsets = sightlines.map((line) => line.closest_in_asserted?.offset_arcmin ?? null)
  if (offsets.length === 0 || offsets.some((offset) => offset === null)) return null
  return Math.max(...offsets.map((offset) => Math.abs(offset!)))
}

/** The tolerances of a sweep that lie in the plausible range. */
function tolerancesWithin({ steps }: Sweep, { low_arcmin, high_arcmin }: Audit['plausible']): number[] {
  return steps
    .map((step) => step.tolerance_arcmin)
    .filter((tolerance) => low_arcmin <= tolerance && tolerance <= high_arcmin)
}

/** A plan that says nothing of its north is taken as true where a line runs between its points. */
function isNorthTaken({ north, sightlines, points }: Claim): boolean {
  return (
    north === 'omitted' &&
    sightlines.some(
      ({ direction }) =>
        direction.by === 'points' &&
        [direction.from, direction.to].every((name) => points.get(name)?.by === 'plan'),
    )
  )
}
