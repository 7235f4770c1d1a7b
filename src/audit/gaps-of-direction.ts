import type { Claim, Direction, Sightline, Span } from '../claim/claim.ts'
import { DEG } from '../quantity/degrees.ts'
import { formatArcmin } from '../quantity/format-angle.ts'
import { formatCm } from '../quantity/format-length.ts'
import { isUnstated, type Unstated } from '../quantity/unstated.ts'
import { DEFAULTS } from './defaults.ts'
import type { Gap } from './gap.ts'
import { northGaps } from './gaps-of-north.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { pointNamed, pointSdM } from './survey/place-of-point.ts'
import { surveyedSpan } from './survey/surveyed-span.ts'
import { tieOf } from './survey/tie-of.ts'
import { turnedLine } from './turned-line.ts'

/** What one sightline leaves open of its direction: its uncertainty, and north. */
export function directionGaps(
  claim: Claim,
  { direction }: Sightline,
  inputs: SightlineInputs,
  of: string,
): Gap[] {
  switch (direction.by) {
    case 'altitude':
      return measuredGap(direction.altitudeDeg.sd, {
        what: `uncertainty of the altitude${of}`,
        basis: 'a careful survey of worn stone; our choice',
        sdDeg: DEFAULTS.altitudeSdDeg,
        words: (sd) => `an altitude ${sd} higher or lower`,
      })
    case 'azimuth':
      return measuredGap(direction.azimuthDeg.sd, {
        what: `uncertainty of the azimuth${of}`,
        basis: 'a careful survey of worn stone, north included; our choice',
        sdDeg: DEFAULTS.azimuthSdDeg,
        words: (sd) => `the line ${sd} further left or right`,
      })
    case 'points':
      return [
        ...pointGaps(claim, [direction.from, direction.to], (name) => turnOfLine(claim, name, inputs), [
          'the line',
          'further left or right',
        ]),
        ...tieGaps(claim, direction, inputs),
        ...northGaps(claim, direction, inputs),
      ]
    case 'span':
      return spanGaps(claim, direction, of)
  }
}

/** A line from the plan to a place on the Earth rests on where the plan is. */
function tieGaps(
  claim: Claim,
  { from, to }: Extract<Direction, { by: 'points' }>,
  { lengthM }: SightlineInputs,
): Gap[] {
  const kinds = [from, to].map((name) => pointNamed(claim, name).by)
  const tie = tieOf(claim)
  const isMixed = kinds.includes('plan') && !kinds.every((kind) => kind === 'plan')
  if (tie === null || lengthM === null || !isMixed) return []
  const sdM = DEFAULTS.pointSdM.geographic
  const turnDeg = sdM / lengthM / DEG
  return [
    {
      what: `uncertainty of where ${tie.name} is on the Earth`,
      said: 'omitted',
      used: `± ${formatCm(sdM * 100)}`,
      basis: BASIS_OF_POINT.geographic,
      change: {
        words: `the line ${formatArcmin(turnDeg * 60)} further left or right`,
        of: turnedLine(turnDeg),
      },
    },
  ]
}

function spanGaps(claim: Claim, { span }: Extract<Direction, { by: 'span' }>, of: string): Gap[] {
  if (span.by === 'points') {
    const { from, june, december } = span
    return pointGaps(claim, [from, june, december], (name) => turnOfSpan(claim, name, span), [
      'the angle',
      'wider or narrower',
    ])
  }
  return measuredGap(span.angleDeg.sd, {
    what: `uncertainty of the angle${of}`,
    basis: 'a careful survey of worn stone; our choice',
    sdDeg: DEFAULTS.azimuthSdDeg,
    words: (sd) => `an angle ${sd} wider or narrower`,
  })
}

function measuredGap(
  said: number | Unstated,
  {
    what,
    basis,
    sdDeg,
    words,
  }: { what: string; basis: string; sdDeg: number; words: (sd: string) => string },
): Gap[] {
  if (!isUnstated(said)) return []
  const sd = formatArcmin(sdDeg * 60)
  return [{ what, said, used: `± ${sd}`, basis, change: { words: words(sd), of: turnedLine(sdDeg) } }]
}

const BASIS_OF_POINT = {
  plan: 'a taped or tachymetric survey of stones with worn edges; our choice',
  geographic: 'a hand-held satellite receiver, or coordinates off a map; our choice',
  grid: 'coordinates off a large-scale map or a satellite survey; our choice',
} as const

/** @param turnDeg What one standard deviation of a point turns the line by, or widens the angle. */
function pointGaps(
  claim: Claim,
  names: readonly string[],
  turnDeg: (name: string) => number,
  [what, ways]: readonly [string, string],
): Gap[] {
  return [...new Set(names)].flatMap((name): Gap[] => {
    const point = claim.points.get(name)
    if (point === undefined || !isUnstated(point.uncertaintyM)) return []
    const turn = turnDeg(name)
    return [
      {
        what: `uncertainty of the point ${name}`,
        said: point.uncertaintyM,
        used: `± ${formatCm(DEFAULTS.pointSdM[point.by] * 100)}`,
        basis: BASIS_OF_POINT[point.by],
        change: { words: `${what} ${formatArcmin(turn * 60)} ${ways}`, of: turnedLine(turn) },
      },
    ]
  })
}

function turnOfLine(claim: Claim, name: string, { lengthM }: SightlineInputs): number {
  return lengthM === null ? 0 : pointSdM(pointNamed(claim, name)) / lengthM / DEG
}

/** The standard deviation of the angle where no other point had any. */
function turnOfSpan(claim: Claim, name: string, span: Extract<Span, { by: 'points' }>): number {
  const points = new Map(
    [...claim.points].map(([held, point]) => [held, held === name ? point : { ...point, uncertaintyM: 0 }]),
  )
  return surveyedSpan({ ...claim, points }, span).sdDeg
}
