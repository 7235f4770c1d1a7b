import type { Claim } from '../claim/claim.ts'
import { isUnstated } from '../quantity/unstated.ts'
import { modelsToTry } from './audit-reproduction.ts'
import type { SightlineInputs } from './sightline-inputs.ts'

/** Works that every audit rests on. */
const ALWAYS = ['vondrak2011', 'kullback1951', 'jcgm100']

/** Keys of the works that an audit rests on, in the order of the alphabet. */
export function referencesOf(claim: Claim, lines: readonly SightlineInputs[]): string[] {
  const { refractionArcmin, refractionUncertaintyArcmin } = claim.atmosphere
  const needsAir = lines.some(({ target }) => target.body !== 'two stars')
  return [
    ...new Set([
      ...ALWAYS,
      ...lines.flatMap((line) => modelsToTry(claim, line)),
      ...lines.flatMap(worksOf),
      ...worksOfSurvey(claim),
      ...(claim.otherDates.length > 0 ? ['kass1995'] : []),
      ...(needsAir && isUnstated(refractionArcmin) ? ['auer2000', 'hohenkerk1985', 'bennett1982'] : []),
      ...(needsAir && isUnstated(refractionUncertaintyArcmin) ? ['sampson2003', 'schaefer1990'] : []),
      ...(isUnstated(claim.plausiblePrecision) ? ['petrie1883', 'ruggles1984'] : []),
    ]),
  ].sort()
}

/** Works that the directions between points rest on. */
function worksOfSurvey({ points, grid, north, sightlines }: Claim): string[] {
  const used = sightlines.flatMap(({ direction }) => {
    if (direction.by === 'points') return [direction.from, direction.to]
    if (direction.by !== 'span' || direction.span.by !== 'points') return []
    return [direction.span.from, direction.span.june, direction.span.december]
  })
  const kinds = new Set(used.map((name) => points.get(name)?.by))
  const isProjected = grid?.by === 'projection'
  const isOnEarth = kinds.has('geographic') || (kinds.has('grid') && isProjected)
  const isGridNorth = !isUnstated(north) && north.from === 'grid' && north.convergence === null
  const isModelled = !isUnstated(north) && north.date !== null && kinds.has('plan')
  return [
    ...(isOnEarth ? ['karney2013'] : []),
    ...(isProjected && (kinds.has('grid') || isGridNorth) ? ['karney2011'] : []),
    ...(isModelled ? ['chulliat2025'] : []),
  ]
}

/** Works that one kind of target rests on. */
function worksOf({ target }: SightlineInputs): string[] {
  switch (target.body) {
    case 'sun':
    case 'sun at both solstices':
      return ['laskar2004']
    case 'moon':
      return ['laskar2004']
    case 'star':
      return ['hoffleit1991', ...(target.sighted.by === 'rule' ? ['rozenberg1966'] : [])]
    case 'two stars':
      return ['hoffleit1991']
  }
}
