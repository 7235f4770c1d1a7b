import { wrap180 } from '../../quantity/degrees.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Point } from '../claim.ts'
import { type Context, type Field, reportError } from './field.ts'
import { isBeyondGrid } from './is-beyond-grid.ts'
import { PLACES, type PlaceKind } from './point-kinds.ts'
import type { ReadPoint, ReadPoints } from './read-points.ts'
import type { Surroundings } from './surroundings.ts'

/**
 * Reports, at a field that names one of them, two points that no line can join: apart in kind, or at one place. True
 * where it finds nothing wrong.
 */
export function checkJoin(
  field: Field,
  from: string,
  to: string,
  around: Surroundings,
  context: Context,
): boolean {
  const [a, b] = [around.points.byName.get(from), around.points.byName.get(to)]
  if (a === undefined || b === undefined || a.kind === null || b.kind === null) return true
  const lacking = lackingLink(a.kind, b.kind, around) ?? lackingReach(a, b, around)
  if (lacking !== null) {
    const message = `${where(a)} and ${where(b)}${lacking.why}`
    reportError(context, field, 'cannot-join', message, { expected: lacking.expected })
    return false
  }
  if (a.point === null || b.point === null || !isSamePlace(a.point, b.point)) return true
  const message = `${quoted(from)} and ${quoted(to)} stand at the same place`
  const differ = PLACES[a.kind].keys.join(' or ')
  reportError(context, field, 'points-coincide', message, { expected: `two points that differ in ${differ}` })
  return false
}

/** What two kinds of points lack to be joined, or null. */
function lackingLink(
  a: PlaceKind,
  b: PlaceKind,
  { points, grid, hasGrid }: Surroundings,
): { why: string; expected: string } | null {
  if (a === b) return null
  const kinds = [a, b]
  if (kinds.includes('grid') && hasGrid && grid?.by === 'convergence')
    return {
      why: ': with its convergence alone the grid has no place on the Earth',
      expected: 'a grid with its projection, such as grid: {zone: UTM 55 S}',
    }
  if (!kinds.includes('plan') || !points.isWhole || mayBeTied(points)) return null
  return {
    why: ': nothing says where the plan is on the Earth',
    expected:
      'latitude and longitude at one point of the plan as well, such as {east: 0 m, north: 0 m, latitude: 41°16′12″ N, longitude: 23°05′ E}',
  }
}

/** What a grid lacks to be joined to a place that its projection does not reach; a plan has the place of its tie. */
function lackingReach(
  a: ReadPoint,
  b: ReadPoint,
  { points, grid }: Surroundings,
): { why: string; expected: string } | null {
  const other = [a, b].find(({ kind }) => kind !== 'grid')
  if (grid?.by !== 'projection' || other === undefined || ![a.kind, b.kind].includes('grid')) return null
  const place = other.kind === 'plan' ? tieOf(points) : onEarth(other.point)
  if (place === null || !isBeyondGrid(place, grid.projection)) return null
  return {
    why: ': the projection of the grid does not reach so far',
    expected: 'the grid of the place; the zone, or E for W, may have slipped',
  }
}

/** Where the plan is on the Earth. */
function tieOf({ byName }: ReadPoints): { latitudeDeg: number; longitudeDeg: number } | null {
  const ties = [...byName.values()].map(({ point }) => (point?.by === 'plan' ? point.tie : null))
  return ties.find((tie) => tie !== null) ?? null
}

/** Where a point says that it is on the Earth. */
function onEarth(point: Point | null): { latitudeDeg: number; longitudeDeg: number } | null {
  if (point?.by === 'plan') return point.tie
  return point?.by === 'geographic' ? point : null
}

/** Whether a point of the plan is a tie, or may have been meant for one. */
function mayBeTied({ byName }: ReadPoints): boolean {
  const all = [...byName.values()]
  return all.some(
    ({ kind, fields }) => kind === 'plan' && PLACES.geographic.keys.some((key) => fields?.has(key)),
  )
}

function where({ field, kind }: ReadPoint): string {
  return kind === null ? quoted(field.name) : `${quoted(field.name)} is ${PLACES[kind].called}`
}

/** Places of two kinds are compared only at the tie: others come together by rounding at most. */
function isSamePlace(a: Point, b: Point): boolean {
  if (a.by === 'plan' && b.by === 'plan') return a.eastM === b.eastM && a.northM === b.northM
  if (a.by === 'grid' && b.by === 'grid') return a.eastingM === b.eastingM && a.northingM === b.northingM
  const [here, there] = [a, b].map(onEarth)
  if (here == null || there == null || here.latitudeDeg !== there.latitudeDeg) return false
  const isPole = Math.abs(here.latitudeDeg) === 90
  return isPole || wrap180(here.longitudeDeg - there.longitudeDeg) === 0
}
