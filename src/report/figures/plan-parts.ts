import type { Audit, PlanLine } from '../../audit/audit.ts'
import { planSources } from './plan-source.ts'

/** More lines than these shrink to nothing in one figure, and are shared out. */
const MOST_IN_ONE = 5
const MOST_EACH = 4

/**
 * The audit once for each figure that its plan takes, with that figure's lines and the points they use, in the plan's
 * order: itself where there are five lines at most, else four at most in each; none where no line has a place on a plan.
 */
export function planParts(audit: Audit): Audit[] {
  const lines = planSources(audit).map(({ line }) => line)
  if (lines.length === 0) return []
  if (lines.length <= MOST_IN_ONE) return [audit]
  const each = Math.ceil(lines.length / Math.ceil(lines.length / MOST_EACH))
  const starts = Array.from({ length: Math.ceil(lines.length / each) }, (_, part) => part * each)
  return starts.map((start) => partOf(audit, lines.slice(start, start + each)))
}

function partOf(audit: Audit, lines: readonly PlanLine[]): Audit {
  const { plan } = audit
  const used = new Set(lines.flatMap(({ from, to, span }) => [from, to, span?.to ?? null]))
  const kept = plan.points.map((_, index) => index).filter((index) => used.has(index))
  const moved = (index: number | null) => (index === null ? null : kept.indexOf(index))
  return {
    ...audit,
    plan: {
      ...plan,
      points: kept.map((index) => plan.points[index]!),
      lines: lines.map((line) => ({
        ...line,
        ...{ from: moved(line.from), to: moved(line.to) },
        span: line.span === null ? null : { ...line.span, to: moved(line.span.to) },
      })),
    },
  }
}
