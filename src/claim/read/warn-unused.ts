import type { Claim, Horizon } from '../claim.ts'
import { type Context, type Field, reportWarning } from './field.ts'
import type { PlaceKind } from './point-kinds.ts'
import type { ReadPoints } from './read-points.ts'
import { restsOnGrid } from './rests-on-grid.ts'

type Lines = Claim['sightlines']

/** Warns of a north where no line begins or ends on the plan. */
export function warnUnusedNorth(
  field: Field | undefined,
  sightlines: Lines,
  points: ReadPoints,
  context: Context,
): void {
  if (field === undefined || sightlines.length === 0) return
  const lines = sightlines.filter(({ direction }) => direction.by === 'points')
  if (touches(lines, 'plan', points)) return
  const isDirection = sightlines.some(({ direction }) => direction.by === 'azimuth')
  const message = '`north` is not used: no sightline runs between points of the plan'
  reportWarning(context, field, 'unused-key', message, {
    expected: isDirection ? 'the uncertainty of north as part of the ± of each azimuth' : 'a file without it',
    at: field.keyAt,
  })
}

/** Warns of a grid where no line begins or ends on it, and the north of the plan is not that of the grid. */
export function warnUnusedGrid(
  field: Field | undefined,
  { sightlines, points, north }: { sightlines: Lines; points: ReadPoints; north: Claim['north'] },
  context: Context,
): void {
  if (field === undefined || sightlines.length === 0 || touches(sightlines, 'grid', points)) return
  if (restsOnGrid(north)) return
  const message = '`grid` is not used: no sightline begins or ends at a point of the grid'
  reportWarning(context, field, 'unused-key', message, { expected: 'a file without it', at: field.keyAt })
}

/** Whether a line is named by a point of the kind, or by one whose kind could not be told. */
function touches(sightlines: Lines, kind: PlaceKind, { byName }: ReadPoints): boolean {
  const names = sightlines.flatMap(({ direction, horizon }) => [
    ...namesOf(direction),
    ...horizonsOf(direction, horizon).flatMap((each) => (each.by === 'point' ? [each.point] : [])),
  ])
  return names.some((name) => {
    const found = byName.get(name)?.kind ?? null
    return found === null || found === kind
  })
}

function namesOf(direction: Lines[number]['direction']): readonly string[] {
  if (direction.by === 'points') return [direction.from, direction.to]
  return direction.by === 'span' && direction.span.by === 'points'
    ? [direction.span.from, direction.span.june, direction.span.december]
    : []
}

function horizonsOf(
  direction: Lines[number]['direction'],
  horizon: Lines[number]['horizon'],
): readonly Horizon[] {
  const { june, december } =
    direction.by === 'span' ? direction.horizons : { june: horizon, december: horizon }
  return [june, december].filter((each) => typeof each !== 'string')
}
