import type { Claim, Horizon, Sightline } from '../claim/claim.ts'
import { DEG, wrap360 } from '../quantity/degrees.ts'
import { formatArcmin } from '../quantity/format-angle.ts'
import { formatCm } from '../quantity/format-length.ts'
import { isUnstated, type Unstated } from '../quantity/unstated.ts'
import { horizonFromDistance } from '../site/horizon-from-distance.ts'
import { seaDip } from '../site/sea-dip.ts'
import { skylineOf } from '../site/skyline.ts'
import { MEAN_EARTH_RADIUS_M, TERRESTRIAL_REFRACTION } from '../site/terrestrial-refraction.ts'
import { NORTH_SD_DEG } from '../site/true-north.ts'
import { DEFAULTS } from './defaults.ts'
import type { Gap } from './gap.ts'
import { raisedHorizon } from './raised-horizon.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { pointNamed, pointSdM } from './survey/place-of-point.ts'

/** What a horizon is called, and of which line it is where there are several. */
interface HorizonName {
  noun: string
  of: string
}

/** Makes a change to the line whose horizon it is: of an angle, to one of its two. */
type OnSide = (
  change: (side: SightlineInputs) => SightlineInputs,
) => (line: SightlineInputs) => SightlineInputs

const ONLY_SIDE: OnSide = (change) => change

/** What a sightline leaves open of its horizon; of an angle, of both. */
export function horizonGaps(
  claim: Claim,
  { horizon, direction }: Sightline,
  inputs: SightlineInputs,
  of: string,
): Gap[] {
  const { pair } = inputs
  if (pair === null || direction.by !== 'span') {
    const heights =
      direction.by === 'points' && !isUnstated(horizon) && horizon.by === 'point'
        ? heightGaps(claim, [direction.from, horizon.point], inputs)
        : []
    return [...gapsOf(horizon, inputs, { noun: 'the horizon', of }, ONLY_SIDE), ...heights]
  }
  return (['june', 'december'] as const).flatMap((side) => {
    const onSide: OnSide = (change) => (line) =>
      line.pair === null ? line : { ...line, pair: { ...line.pair, [side]: change(line.pair[side]) } }
    const month = side === 'june' ? 'June' : 'December'
    return gapsOf(direction.horizons[side], pair[side], { noun: `the ${month} horizon`, of }, onSide)
  })
}

function gapsOf(
  horizon: Horizon | Unstated,
  { horizonSdDeg, horizon: settled }: SightlineInputs,
  name: HorizonName,
  onSide: OnSide,
): Gap[] {
  const moved = (deg: number, instead?: string): Gap['change'] => ({
    words: instead ?? `a horizon ${formatArcmin(deg * 60)} higher or lower`,
    of: (line) => [deg, -deg].map((raise) => onSide((side) => raisedHorizon(side, raise))(line)),
  })
  const sd = formatArcmin(horizonSdDeg * 60)
  if (isUnstated(horizon)) {
    return [
      {
        what: `altitude of ${name.noun}${name.of}`,
        said: horizon,
        used: `level, 0° ± ${sd}`,
        basis: 'a level horizon, widened for hills that nobody measured; our choice',
        change: moved(horizonSdDeg),
      },
    ]
  }
  switch (horizon.by) {
    case 'altitude':
      return isUnstated(horizon.altitudeDeg.sd)
        ? [
            {
              what: `uncertainty of ${name.noun}’s altitude${name.of}`,
              said: horizon.altitudeDeg.sd,
              used: `± ${sd}`,
              basis: 'a careful reading with a theodolite or clinometer of a clear skyline; our choice',
              change: moved(horizonSdDeg),
            },
          ]
        : []
    case 'profile': {
      const said = horizon.nodes.map(({ sdDeg }) => sdDeg).find(isUnstated)
      const beyond = [turnedGap(name, onSide), ...(goesRound(horizon) ? [] : [beyondGap(name)])]
      return said === undefined
        ? beyond
        : [
            ...beyond,
            {
              what: `uncertainty of ${name.noun}’s profile${name.of}`,
              said,
              used: `± ${formatArcmin(DEFAULTS.horizonSdDeg * 60)}`,
              basis: 'a careful reading with a theodolite or clinometer of a clear skyline; our choice',
              change: moved(DEFAULTS.horizonSdDeg),
            },
          ]
    }
    case 'distance':
      return [...distanceGaps(horizon, name, moved), bendingGap(horizon.distanceM.value, name, moved)]
    case 'point':
      return settled.distanceM === null ? [] : [bendingGap(settled.distanceM, name, moved)]
    case 'sea':
      return [...eyeGaps(horizon, name, moved), seaGap(horizon.eyeM.value, name, moved)]
  }
}

function goesRound({ nodes }: Extract<Horizon, { by: 'profile' }>): boolean {
  return skylineOf(nodes.map((node) => ({ ...node, sdDeg: 0 }))).isClosed
}

/** A point's uncertainty is that of its height too, where it is the eye or the skyline. */
function heightGaps(claim: Claim, names: readonly string[], { horizon }: SightlineInputs): Gap[] {
  return names.flatMap((name): Gap[] => {
    const point = pointNamed(claim, name)
    if (!isUnstated(point.uncertaintyM) || horizon.distanceM === null) return []
    const deg = pointSdM(point) / horizon.distanceM / DEG
    return [
      {
        what: `uncertainty of the height of ${name}`,
        said: point.uncertaintyM,
        used: `± ${formatCm(pointSdM(point) * 100)}`,
        basis: 'as good as its place; our choice',
        change: {
          words: `a horizon ${formatArcmin(deg * 60)} higher or lower`,
          of: (line) => [raisedHorizon(line, deg), raisedHorizon(line, -deg)],
        },
      },
    ]
  })
}

/** A profile that was taken with a compass is turned as a whole, which on a slope moves the gleam. */
function turnedGap({ noun, of }: HorizonName, onSide: OnSide): Gap {
  const turned = (deg: number) =>
    onSide((side) => {
      const nodes = side.horizon.nodes?.map((node) => ({
        ...node,
        azimuthDeg: wrap360(node.azimuthDeg + deg),
      }))
      return { ...side, horizon: { ...side.horizon, nodes: nodes ?? null } }
    })
  return {
    what: `north of ${noun}’s profile${of}`,
    said: 'omitted',
    used: 'true north, without error',
    basis: 'the claim’s own premise: it gives azimuths',
    change: {
      words: `the profile turned by ${formatArcmin(NORTH_SD_DEG.compass * 60)} to either side, the best a compass does`,
      of: (line) => [turned(NORTH_SD_DEG.compass)(line), turned(-NORTH_SD_DEG.compass)(line)],
    },
  }
}

function beyondGap({ noun, of }: HorizonName): Gap {
  return {
    what: `${noun} beyond the profile${of}`,
    said: 'omitted',
    used: `level, as high as its end, ± ${formatArcmin(DEFAULTS.unknownHorizonSdDeg * 60)}`,
    basis: 'nothing is known of it; our choice',
    change: null,
    instead: 'moves a date only where the target clears the horizon there',
  }
}

type Moved = (deg: number, words?: string) => Gap['change']

function distanceGaps(
  { distanceM, riseM }: Extract<Horizon, { by: 'distance' }>,
  name: HorizonName,
  moved: Moved,
): Gap[] {
  const altitude = (distance: number, rise: number) =>
    horizonFromDistance({
      distanceM: distance,
      distanceSdM: 0,
      heightDifferenceM: rise,
      heightDifferenceSdM: 0,
    }).deg
  const own = altitude(distanceM.value, riseM.value)
  const distanceSd = DEFAULTS.distanceSdShare * distanceM.value
  const byDistance = Math.abs(altitude(distanceM.value + distanceSd, riseM.value) - own)
  const byRise = Math.abs(altitude(distanceM.value, riseM.value + DEFAULTS.riseSdM) - own)
  const ofDistance: Gap[] = isUnstated(distanceM.sd)
    ? [
        {
          what: `uncertainty of ${name.noun}’s distance${name.of}`,
          said: distanceM.sd,
          used: `± ${formatCm(distanceSd * 100)}`,
          basis: 'a hundredth, as read off a map; our choice',
          change: moved(byDistance),
        },
      ]
    : []
  const ofRise: Gap[] = isUnstated(riseM.sd)
    ? [
        {
          what: `uncertainty of ${name.noun}’s height above the eye${name.of}`,
          said: riseM.sd,
          used: `± ${formatCm(DEFAULTS.riseSdM * 100)}`,
          basis: 'half the step of a map’s contours, trees left out; our choice',
          change: moved(byRise),
        },
      ]
    : []
  return [...ofDistance, ...ofRise]
}

/** What one standard deviation of the coefficient does: d/2R · sd, to first order an angle in itself. */
function bendingGap(distanceM: number, name: HorizonName, moved: Moved): Gap {
  const { coefficient, sd } = TERRESTRIAL_REFRACTION
  return {
    what: `refraction along the ground towards ${name.noun}${name.of}`,
    said: 'omitted',
    used: `coefficient ${coefficient} ± ${sd}`,
    basis: 'Gauss’s mean, with the range of clear days; our choice',
    change: moved((distanceM * sd) / (2 * MEAN_EARTH_RADIUS_M) / DEG, `a coefficient ${sd} more or less`),
  }
}

function eyeGaps({ eyeM }: Extract<Horizon, { by: 'sea' }>, name: HorizonName, moved: Moved): Gap[] {
  if (!isUnstated(eyeM.sd)) return []
  const shift = Math.abs(seaDip(eyeM.value + DEFAULTS.eyeSdM).deg - seaDip(eyeM.value).deg)
  return [
    {
      what: `uncertainty of the eye’s height above the sea${name.of}`,
      said: eyeM.sd,
      used: `± ${formatCm(DEFAULTS.eyeSdM * 100)}`,
      basis: 'tides and coasts move; our choice',
      change: moved(shift),
    },
  ]
}

function seaGap(eyeM: number, name: HorizonName, moved: Moved): Gap {
  const { coefficient, sd } = TERRESTRIAL_REFRACTION
  const shift = Math.abs(seaDip(eyeM, 0, coefficient + sd).deg - seaDip(eyeM).deg)
  return {
    what: `refraction along the water${name.of}`,
    said: 'omitted',
    used: `coefficient ${coefficient} ± ${sd}`,
    basis: 'Gauss’s mean, with the range of clear days; our choice',
    change: moved(shift, `a coefficient ${sd} more or less`),
  }
}
