import type { Claim, Sightline } from '../claim/claim.ts'
import { formatArcmin } from '../quantity/format-angle.ts'
import { formatCm } from '../quantity/format-length.ts'
import { isUnstated, type Unstated } from '../quantity/unstated.ts'
import { DEFAULTS } from './defaults.ts'
import type { Gap } from './gap.ts'
import { northSdDeg } from './settle-sightline.ts'
import type { SightlineInputs } from './sightline-inputs.ts'

/** What one sightline leaves open of its direction: its uncertainty, and north. */
export function directionGaps(
  claim: Claim,
  sightline: Sightline,
  inputs: SightlineInputs,
  of: string,
): Gap[] {
  const turned = (deg: number) => (line: SightlineInputs) => [
    { ...line, measuredDeg: line.measuredDeg + deg },
    { ...line, measuredDeg: line.measuredDeg - deg },
  ]
  const { direction } = sightline
  if (direction.by === 'altitude') {
    if (!isUnstated(direction.altitudeDeg.sd)) return []
    const sd = formatArcmin(DEFAULTS.altitudeSdDeg * 60)
    return [
      {
        what: `uncertainty of the altitude${of}`,
        said: direction.altitudeDeg.sd,
        used: `± ${sd}`,
        basis: 'a careful survey of worn stone; our choice',
        change: { words: `an altitude ${sd} higher or lower`, of: turned(DEFAULTS.altitudeSdDeg) },
      },
    ]
  }
  if (direction.by === 'azimuth') {
    if (!isUnstated(direction.azimuthDeg.sd)) return []
    const sd = formatArcmin(DEFAULTS.azimuthSdDeg * 60)
    return [
      {
        what: `uncertainty of the azimuth${of}`,
        said: direction.azimuthDeg.sd,
        used: `± ${sd}`,
        basis: 'a careful survey of worn stone, north included; our choice',
        change: { words: `the line ${sd} further left or right`, of: turned(DEFAULTS.azimuthSdDeg) },
      },
    ]
  }
  const points = [direction.from, direction.to].flatMap((name) => {
    const said = claim.points.get(name)?.uncertaintyM
    return said === undefined || !isUnstated(said) ? [] : [{ name, said }]
  })
  const lineSd = formatArcmin(inputs.measuredSdDeg * 60)
  const pointGaps = points.map(
    ({ name, said }): Gap => ({
      what: `uncertainty of the point ${name}`,
      said,
      used: `± ${formatCm(DEFAULTS.pointSdM * 100)}`,
      basis: 'a taped or tachymetric survey of stones with worn edges; our choice',
      change: { words: `the line ${lineSd} further left or right`, of: turned(inputs.measuredSdDeg) },
    }),
  )
  return [...pointGaps, ...northGap(claim, turned)]
}

function northGap(
  claim: Claim,
  turned: (deg: number) => (line: SightlineInputs) => SightlineInputs[],
): Gap[] {
  const { north } = claim
  const compass = DEFAULTS.northSdDeg.compass
  const sd = northSdDeg(claim)
  const words = (deg: number) => `north ${formatArcmin(deg * 60)} further left or right`
  if (north === 'omitted') {
    return [
      {
        what: 'the plan’s north',
        said: 'omitted',
        used: 'true north, without error',
        basis: 'the claim’s own premise: it says nothing of how north was found',
        change: { words: `${words(compass)}, the best a compass does`, of: turned(compass) },
      },
    ]
  }
  if (north !== 'unknown' && !isUnstated(north.uncertaintyDeg)) return []
  return [
    {
      what: 'uncertainty of the plan’s north',
      said: north === 'unknown' ? 'unknown' : (north.uncertaintyDeg as Unstated),
      used: `± ${formatArcmin(sd * 60)}`,
      basis:
        north === 'unknown'
          ? 'a compass at its best; our choice'
          : `usual for north from ${north.from}; our choice`,
      change: { words: words(sd), of: turned(sd) },
    },
  ]
}
