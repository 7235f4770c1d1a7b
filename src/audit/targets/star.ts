import { horizonBranch, type Uncertain } from '../../inference/horizon-branch.ts'
import type { Branch } from '../../inference/sight.ts'
import { formatNumber } from '../../quantity/format-number.ts'
import { closeCompanionOf } from '../../sky/close-companions.ts'
import { firstVisibility } from '../../sky/first-visibility.ts'
import type { ObliquityModelName } from '../../sky/obliquity-models.ts'
import { PRECESSION_MODELS } from '../../sky/precession-models.ts'
import { NUTATION_SD_DEG } from '../../sky/solstice-declination.ts'
import { labelOfStar, type Star } from '../../sky/star-catalogue.ts'
import { starDeclinationSdDeg } from '../../sky/star-error.ts'
import { starDeclinationDeg, starTrack } from '../../sky/star-place.ts'
import { unsteadinessOf } from '../../sky/unsteady-stars.ts'
import { refractionAt } from '../refraction-at.ts'
import type { SettledTarget, SightlineInputs } from '../sightline-inputs.ts'
import { meridianBranch } from './meridian-branch.ts'
import { placeOnLine } from './place-on-line.ts'
import { skylineBranch } from './skyline-branch.ts'
import type { TargetModel } from './target-model.ts'

type SettledStar = Extract<SettledTarget, { body: 'star' }>

/** Models of precession that a date of a star can be had from. */
export const STAR_MODELS: readonly ObliquityModelName[] = ['vondrak2011', 'p03']

/** Name of the catalogue's error in the budget. */
export const STAR_CATALOGUE = 'the star catalogue'

/** A star rising or setting where it is seen, or on the meridian. */
export function starTarget(inputs: SightlineInputs, target: SettledStar): TargetModel {
  const { star, at } = target
  const declination = declinationOf(inputs, star)
  const altitude = altitudeOf(inputs, target)
  const name = labelOfStar(star)
  return {
    event: `${at} of ${name}`,
    description: `${at} of ${name}${sightedWords(inputs, target, altitude)}`,
    branches: [branchOf(inputs, target, declination, altitude)],
    declinationDeg: (year) => declination(year).deg,
    altitudeDeg: () =>
      altitude === null
        ? null
        : { deg: altitude.deg, sdDeg: Math.hypot(...altitude.errors.map(({ sdDeg }) => sdDeg)) },
    onLine: onLineOf(inputs, target),
    seenAt: apparentAltitude(inputs, target),
    semidiameter: () => null,
    models: STAR_MODELS,
    notes: () => [`${name} has magnitude ${formatNumber(star.magnitude, 2)}.`],
    warnings: starWarnings(star),
  }
}

function branchOf(
  inputs: SightlineInputs,
  { star, at, sighted }: SettledStar,
  declination: (year: number) => Uncertain,
  altitude: Uncertain | null,
): Branch {
  if (at === 'rising' || at === 'setting') {
    const seenFrom = sighted.by === 'rule' ? visibleFrom(star, sighted.rule) : null
    if (inputs.horizon.nodes !== null && seenFrom !== null) {
      return skylineBranch(inputs, { at, declination, seenFrom, altitudeErrors: () => [], ...POINT })
    }
    return horizonBranch({ latitudeDeg: inputs.latitudeDeg, at, altitude: () => altitude, declination })
  }
  const culmination = at === 'upper culmination' ? 'upper' : 'lower'
  return meridianBranch(inputs, { culmination, declination, aboveCentreArcmin: () => 0, parallaxArcsec: 0 })
}

/** A star has neither width nor parallax. */
const POINT = { aboveCentreArcmin: () => 0, parallaxArcsec: 0 }

function onLineOf(inputs: SightlineInputs, { star, at, sighted }: SettledStar): TargetModel['onLine'] {
  if ((at !== 'rising' && at !== 'setting') || inputs.horizon.nodes === null || sighted.by !== 'rule')
    return null
  const seenFrom = visibleFrom(star, sighted.rule)
  return seenFrom === null ? null : placeOnLine(inputs, { at, seenFrom, ...POINT })
}

/** Declination of a star with what the catalogue and nutation leave open. */
export function declinationOf(inputs: SightlineInputs, star: Star): (year: number) => Uncertain {
  const deg = inputs.model === 'p03' ? shortDeclination(star) : starDeclinationDeg(star)
  return (year) => ({
    deg: deg(year),
    errors: [
      { source: STAR_CATALOGUE, sdDeg: starDeclinationSdDeg(star, year) },
      { source: 'nutation', sdDeg: NUTATION_SD_DEG },
    ],
  })
}

function shortDeclination(star: Star): (year: number) => number {
  const track = starTrack(star, PRECESSION_MODELS.p03.matrix)
  return (year) => track(year).decDeg
}

/** The apparent altitude at which the star is seen; null where it is too faint ever to be seen, or on the meridian. */
function apparentAltitude(
  inputs: SightlineInputs,
  { star, sighted, at }: SettledStar,
): { deg: number; sdDeg: number } | null {
  if (at === 'upper culmination' || at === 'lower culmination') return null
  return sighted.by === 'altitude' ? sighted : firstSeen(inputs, star, sighted.rule)
}

/** True altitude at which the star is sighted; null where it is too faint ever to be seen, or on the meridian. */
function altitudeOf(inputs: SightlineInputs, target: SettledStar): Uncertain | null {
  const apparent = apparentAltitude(inputs, target)
  if (apparent === null) return null
  const refraction = refractionAt(inputs, apparent.deg)
  return {
    deg: apparent.deg - refraction.arcmin / 60,
    errors: [
      {
        source: 'altitude at which the star is seen',
        sdDeg: apparent.sdDeg * (1 - refraction.perDegree / 60),
      },
      { source: 'refraction of the day', sdDeg: inputs.refractionSdArcmin / 60 },
    ],
  }
}

/** The greater of the horizon and the altitude at which the star is first visible. */
function firstSeen(
  { horizonDeg, horizonSdDeg }: SightlineInputs,
  star: Star,
  rule: Parameters<typeof firstVisibility>[1],
): { deg: number; sdDeg: number } | null {
  const visible = visibleFrom(star, rule)
  if (visible === null) return null
  return visible.deg > horizonDeg ? visible : { deg: horizonDeg, sdDeg: horizonSdDeg }
}

function visibleFrom(
  { magnitude }: Star,
  rule: Parameters<typeof firstVisibility>[1],
): { deg: number; sdDeg: number } | null {
  const visible = firstVisibility(magnitude, rule)
  return visible === null ? null : { deg: visible.altitudeDeg, sdDeg: visible.sdDeg }
}

function sightedWords(
  inputs: SightlineInputs,
  { star, sighted, at }: SettledStar,
  altitude: Uncertain | null,
): string {
  if (at === 'upper culmination' || at === 'lower culmination') return ''
  if (altitude === null) return ', too faint to be seen'
  if (sighted.by === 'altitude') return ` at an apparent altitude of ${formatNumber(sighted.deg, 2)}°`
  const { deg } = firstSeen(inputs, star, sighted.rule)!
  const rule =
    sighted.rule === 'extinction' ? 'by extinction' : 'by the rule of as many degrees as magnitudes'
  return deg === inputs.horizonDeg
    ? ' on the horizon'
    : `, ${at === 'rising' ? 'first' : 'last'} visible at ${formatNumber(deg, 2)}° ${rule}`
}

/** What is doubtful about a star: a companion that moves it, a changing light. */
export function starWarnings(star: Star): string[] {
  const name = labelOfStar(star)
  const companion = closeCompanionOf(star)
  const unsteady = unsteadinessOf(star)
  return [
    ...(companion === null
      ? []
      : [
          `${name} moves about a close companion, which the catalogue’s straight motion does not follow: up to some ${companion.driftArcsecPerYear}″ a year, counted in the uncertainty.`,
        ]),
    ...(unsteady === null
      ? []
      : [
          `${name} changes its light between magnitudes ${unsteady.brightest} and ${unsteady.faintest}; where it is first visible changes with it.`,
        ]),
  ]
}
