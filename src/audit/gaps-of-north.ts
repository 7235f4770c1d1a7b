import type { Claim, Direction } from '../claim/claim.ts'
import { formatArcmin, formatDegrees } from '../quantity/format-angle.ts'
import { isUnstated } from '../quantity/unstated.ts'
import { NORTH_SD_DEG } from '../site/true-north.ts'
import type { Gap } from './gap.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { northOfPlan } from './survey/north-of-plan.ts'
import { surveyedLine } from './survey/surveyed-line.ts'
import { turnedLine } from './turned-line.ts'

/** What a line between points leaves open of the north that its direction rests on. */
export function northGaps(
  claim: Claim,
  { from, to }: Extract<Direction, { by: 'points' }>,
  inputs: SightlineInputs,
): Gap[] {
  const kinds = [from, to].map((name) => claim.points.get(name)?.by)
  if (kinds.every((kind) => kind === 'plan')) return ofPlan(claim)
  const isOnUnknownGrid = kinds.every((kind) => kind === 'grid') && claim.grid?.by === 'convergence'
  if (isOnUnknownGrid) return ofConvergence(claim)
  if (!kinds.includes('plan')) return []
  // Of a line from the plan to a place on the Earth only the part on the plan turns with its north.
  const effectDeg = claim.north === 'omitted' ? turnByCompass(claim, from, to) : inputs.northSdDeg
  return Math.abs(effectDeg) > SMALLEST_TURN_DEG ? ofPlan(claim, Math.abs(effectDeg)) : []
}

/** 0.4″: a plan's north that turns a line by less is not worth a row. */
const SMALLEST_TURN_DEG = 1e-4

/** What a compass's error of the plan's north would turn a line by. */
function turnByCompass(claim: Claim, from: string, to: string): number {
  return surveyedLine({ ...claim, north: 'unknown' }, from, to).northSdDeg
}

/** @param effectDeg By how much the line turns, where only a part of it lies on the plan. */
function ofPlan(claim: Claim, effectDeg?: number): Gap[] {
  const { north } = claim
  const compass = NORTH_SD_DEG.compass
  if (north === 'omitted') {
    return [
      {
        what: 'the plan’s north',
        said: 'omitted',
        used: 'true north, without error',
        basis: 'the claim’s own premise: it says nothing of how north was found',
        change: {
          words: `${northMoved(compass)}, the best a compass does`,
          of: turnedLine(effectDeg ?? compass),
        },
      },
    ]
  }
  const { sdDeg } = northOfPlan(claim)
  const uncertainty = north === 'unknown' ? 'unknown' : north.uncertaintyDeg
  const gaps: Gap[] = isUnstated(uncertainty)
    ? [
        {
          what: 'uncertainty of the plan’s north',
          said: uncertainty,
          used: `± ${formatArcmin(sdDeg * 60)}`,
          basis: basisOfNorth(claim),
          change: { words: northMoved(sdDeg), of: turnedLine(effectDeg ?? sdDeg) },
        },
      ]
    : []
  return north !== 'unknown' && north.from === 'compass' && north.declination === null
    ? [...gaps, magneticGap()]
    : gaps
}

function northMoved(deg: number): string {
  return `north ${formatArcmin(deg * 60)} further left or right`
}

function basisOfNorth({ north }: Claim): string {
  if (north === 'omitted' || north === 'unknown') return 'a compass at its best; our choice'
  switch (north.from) {
    case 'compass':
      return 'a compass at its best, and its declination; our choice'
    case 'gps':
      return 'two satellite positions good to 2 cm, 100 m apart, unless the claim says otherwise; our choice'
    case 'sun':
      return 'a theodolite on the Sun; our choice'
    case 'star':
      return 'a theodolite on a star; our choice'
    case 'plan':
      return 'arrows on printed plans are off by degrees, and often magnetic; our choice'
    case 'grid':
      return 'grid north off a map or a control network; our choice'
  }
}

/** What a declination left on would do is worth a look: it is several degrees in many places. */
const DECLINATION_LEFT_ON_DEG = 3

function magneticGap(): Gap {
  return {
    what: 'whether the compass bearings were corrected for declination',
    said: 'omitted',
    used: 'corrected',
    basis: 'the claim’s own premise: it gives azimuths, not bearings',
    change: {
      words: `a declination of ${formatDegrees(DECLINATION_LEFT_ON_DEG, 'minute')} left on`,
      of: turnedLine(DECLINATION_LEFT_ON_DEG),
    },
  }
}

function ofConvergence({ grid }: Claim): Gap[] {
  if (grid?.by !== 'convergence' || !isUnstated(grid.convergenceDeg.sd)) return []
  return [
    {
      what: 'uncertainty of the grid’s convergence',
      said: grid.convergenceDeg.sd,
      used: `± ${formatArcmin(NORTH_SD_DEG.grid * 60)}`,
      basis: 'grid north off a map or a control network; our choice',
      change: { words: northMoved(NORTH_SD_DEG.grid), of: turnedLine(NORTH_SD_DEG.grid) },
    },
  ]
}
