import { DEG, wrap180 } from '../../quantity/degrees.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Grid, Structure } from '../claim.ts'
import { EXAMPLES } from '../keys.ts'
import { type Field, reportError, reportWarning } from './field.ts'
import { PLACES, type PointKey } from './point-kinds.ts'
import type { ReadPoint, ReadPoints } from './read-points.ts'
import { plainText } from './read-text.ts'

/** From here on a place is taken to be no part of the view from the structure, degrees; a summit 110 km off still is. */
const FAR_DEG = 1
/** UTM zones reach some 700 km from their meridian where they are at their widest, metres; a choice of this program. */
const GRID_REACH_M = 1_000_000
/** Of a meridian, metres: 10,001.966 km from the equator to a pole on WGS 84. */
const METRES_PER_DEGREE = 10_001_966 / 90

/** Reports what is wrong with points by what else the file says: a second tie, a grid missing or out of reach. */
export function checkPoints(
  points: ReadPoints,
  { grid, hasGrid, structure }: { grid: Grid | null; hasGrid: boolean; structure: Structure | null },
): void {
  const all = [...points.byName.values()]
  checkTies(all)
  if (!hasGrid) reportNoGrid(all)
  if (grid?.by === 'projection') for (const each of all) checkReach(each, grid.projection)
  if (structure !== null) warnFar(all, structure)
}

function checkTies(points: readonly ReadPoint[]): void {
  const [first, ...others] = points.filter(({ point }) => point?.by === 'plan' && point.tie !== null)
  for (const { field, fields, context } of others) {
    const name = quoted(first?.field.name ?? '')
    const message = `${name} says already where the plan is on the Earth`
    const at = fields?.get('latitude')?.keyAt ?? field.keyAt
    const expected = 'latitude and longitude at one point of the plan'
    reportError(context, fields?.get('latitude') ?? field, 'tie-twice', message, { expected, at })
  }
}

/** Once for all points that need it. */
function reportNoGrid(points: readonly ReadPoint[]): void {
  const [first, ...others] = points.filter(({ kind }) => kind === 'grid')
  const field = first === undefined ? undefined : placeField(first, PLACES.grid.keys)
  if (first === undefined || field === undefined) return
  const stand = others.length === 0 ? 'stands' : `and ${others.length} more stand`
  const message = `the file has no \`grid\`, on which ${quoted(first.field.name)} ${stand}`
  const missing = { ...field, path: 'grid' }
  const expected = EXAMPLES.grid ?? null
  reportError(first.context, missing, 'missing-key', message, { expected, at: field.keyAt })
}

/** An easting with the number of its zone before it, or one of another grid, lies beyond what the projection is good for. */
function checkReach(
  { point, fields, context }: ReadPoint,
  {
    falseEastingM,
    falseNorthingM,
    latitudeOfOriginDeg,
    scale,
  }: Extract<Grid, { by: 'projection' }>['projection'],
): void {
  if (point?.by !== 'grid') return
  const tell = (key: PointKey, what: string, expected: string) => {
    const field = fields?.get(key)
    if (field === undefined) return
    const message = `${quoted(plainText(field) ?? '')} ${what}`
    reportError(context, field, 'out-of-range', message, { expected })
  }
  const awayM = Math.abs(point.eastingM - falseEastingM)
  if (awayM > GRID_REACH_M)
    tell(
      'easting',
      `lies ${Math.round(awayM / 1000)} km from the central meridian of the grid`,
      `an easting from ${kilometres(falseEastingM - GRID_REACH_M)} to ${kilometres(falseEastingM + GRID_REACH_M)}`,
    )
  const latitude = latitudeOfOriginDeg + (point.northingM - falseNorthingM) / scale / METRES_PER_DEGREE
  // A degree of the meridian is up to 0.5 % longer or shorter than its mean.
  if (Math.abs(latitude) > 89.5) tell('northing', 'lies beyond a pole of the grid', 'a northing of this grid')
}

/** Once for all points that are far, at the coordinate that is farther off. */
function warnFar(points: readonly ReadPoint[], structure: Structure): void {
  const far = points.flatMap((read) => {
    const { point } = read
    const place = point?.by === 'geographic' ? point : point?.by === 'plan' ? point.tie : null
    const away = place == null ? null : awayFrom(structure, place)
    return away === null || Math.hypot(...away) <= FAR_DEG ? [] : [{ read, away }]
  })
  const [first] = far
  if (first === undefined) return
  const { read, away } = first
  const [northDeg, eastDeg] = away.map(Math.abs) as [number, number]
  const field = read.fields?.get(northDeg < eastDeg ? 'longitude' : 'latitude') ?? read.field
  const others =
    far.length === 1
      ? ''
      : `, and ${far.length === 2 ? '1 more lies' : `${far.length - 1} more lie`} far off too`
  const message = `${quoted(read.field.name)} lies ${Math.hypot(...away).toFixed(1)}° from the structure${others}`
  reportWarning(read.context, field, 'far-from-structure', message, {
    expected: 'a place near it; letters, signs and order of latitude and longitude may have slipped',
  })
}

/** How far north and how far east of the structure a place is, degrees of a great circle. */
function awayFrom(
  { latitudeDeg, longitudeDeg }: Structure,
  place: { latitudeDeg: number; longitudeDeg: number },
): [number, number] {
  const turn = longitudeDeg === null ? 0 : wrap180(place.longitudeDeg - longitudeDeg)
  return [place.latitudeDeg - latitudeDeg, turn * Math.cos(latitudeDeg * DEG)]
}

function placeField({ fields }: ReadPoint, keys: readonly PointKey[]): Field | undefined {
  return keys.map((key) => fields?.get(key)).find((field) => field !== undefined)
}

function kilometres(metres: number): string {
  return `${Math.round(metres / 1000)} km`.replace('-', '−')
}
