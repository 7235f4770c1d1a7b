import { wrap360 } from '../../quantity/degrees.ts'
import { refractionByTable } from '../../site/refraction-by-table.ts'
import { type Skyline, type SkylineNode, skylineOf, skylineWidthDeg } from '../../site/skyline.ts'
import { type SkylineCrossings, skylineCrossings } from '../../site/skyline-crossing.ts'
import { between, type SkylinePath, skylinePath } from '../../site/skyline-path.ts'
import { trueSkyline } from '../../site/true-skyline.ts'
import { DEFAULTS } from '../defaults.ts'
import { refractionAt } from '../refraction-at.ts'
import type { SightlineInputs } from '../sightline-inputs.ts'
import type { SkylineTarget } from './skyline-branch.ts'

/** The skyline of a line with what it is taken to be beyond the ends of its profile. */
export interface KnownSkyline {
  apparent: Skyline
  /** Refraction at an apparent altitude in degrees, and whether the parallax has been taken off it already. */
  refractionArcmin: (altitudeDeg: number) => number
  isLessParallax: boolean
  /** Where bodies cross it, by their declination, for one size of disc. */
  crossings: (aboveCentreArcmin: number) => SkylineCrossings
  /** Where the centre of a disc of one size stands when it is sighted at an azimuth; null where it never is. */
  placeAt: (azimuthDeg: number, aboveCentreArcmin: number) => CentreOnSkyline | null
}

/** Where the centre of a disc stands, geocentric and true, and its declination there; degrees. */
export interface CentreOnSkyline {
  azimuthDeg: number
  altitudeDeg: number
  declinationDeg: number
}

/** How far a profile is carried on beyond its ends, degrees: precession takes a star further than the Sun ever goes. */
const CARRIED_ON_DEG = { disc: 20, star: 60 }
const WHOLE_TURN_DEG = 358

/** Tables of crossings are dear, and one audit asks for the same ones again and again: kept with the profile itself. */
const TABLES = new WeakMap<object, Map<string, SkylineCrossings>>()

/**
 * The skyline of a line's profile. Beyond its ends it is taken to go on level, as uncertain as one that nobody
 * measured; a star is not seen below the altitude of its first sight, so that for one the skyline is no lower.
 * Throws an Error where the line has no profile.
 */
export function knownSkyline(
  inputs: SightlineInputs,
  { at, parallaxArcsec, seenFrom }: Pick<SkylineTarget, 'at' | 'parallaxArcsec' | 'seenFrom'>,
): KnownSkyline {
  const { horizon, horizonShiftDeg, latitudeDeg, refraction, refractionShiftArcmin } = inputs
  if (horizon.nodes === null) throw new Error('a skyline without a profile is level')
  const nodes = carriedOn(horizon.nodes, CARRIED_ON_DEG[seenFrom === null ? 'disc' : 'star']).map((node) => ({
    ...node,
    altitudeDeg: node.altitudeDeg + horizonShiftDeg,
  }))
  const apparent = skylineOf(seenFrom === null ? nodes : heldAbove(nodes, seenFrom))
  const state = JSON.stringify([
    at,
    parallaxArcsec,
    seenFrom,
    horizonShiftDeg,
    latitudeDeg,
    refraction,
    refractionShiftArcmin,
  ])
  const held = TABLES.get(horizon.nodes) ?? new Map<string, SkylineCrossings>()
  TABLES.set(horizon.nodes, held)
  const refractionArcmin = refractionByTable((altitude) => refractionAt(inputs, altitude).arcmin)
  const isLessParallax = refraction.by === 'claim'
  const inTrueAltitudes = once(() => trueSkyline(apparent, refractionArcmin))
  const sightingOf = (aboveCentreArcmin: number) => ({
    latitudeDeg,
    at,
    aboveCentreArcmin,
    parallaxArcsec: isLessParallax ? 0 : parallaxArcsec,
  })
  return {
    apparent,
    refractionArcmin,
    isLessParallax,
    crossings: (aboveCentreArcmin) => {
      const key = `${aboveCentreArcmin} ${state}`
      const known = held.get(key)
      if (known !== undefined) return known
      const table = skylineCrossings(inTrueAltitudes(), sightingOf(aboveCentreArcmin))
      held.set(key, table)
      return table
    },
    placeAt: (azimuthDeg, aboveCentreArcmin) => {
      const path = skylinePath(inTrueAltitudes(), sightingOf(aboveCentreArcmin))
      return placeOnPath(path, aboveCentreArcmin > 0 ? path.contacts : path.azimuths, azimuthDeg)
    },
  }
}

/** @param sighted What the azimuth is of, along the path: the points touched, or the centres. */
function placeOnPath(path: SkylinePath, sighted: Float64Array, azimuthDeg: number): CentreOnSkyline | null {
  const azimuth = sighted[0]! + wrap360(azimuthDeg - sighted[0]!)
  const next = sighted.findIndex((place) => place >= azimuth)
  if (next <= 0) return null
  const step = sighted[next]! - sighted[next - 1]!
  const passing = { index: next - 1, share: step === 0 ? 0 : (azimuth - sighted[next - 1]!) / step }
  return {
    azimuthDeg: wrap360(between(path.azimuths, passing)),
    altitudeDeg: between(path.altitudes, passing),
    declinationDeg: between(path.declinations, passing),
  }
}

function once<T>(make: () => T): () => T {
  let made: { value: T } | null = null
  return () => {
    made ??= { value: make() }
    return made.value
  }
}

/** A profile with a level piece beyond each end. */
function carriedOn(nodes: readonly SkylineNode[], by: number): SkylineNode[] {
  const [first, last] = [nodes[0]!, nodes.at(-1)!]
  const width = skylineWidthDeg(nodes)
  const room = Math.min(by, (WHOLE_TURN_DEG - width) / 2)
  // A profile of nearly the whole horizon goes round to its first node.
  if (room <= STEP_DEG) return width === 360 ? [...nodes] : [...nodes, first]
  const away = (node: SkylineNode, turnDeg: number): SkylineNode => ({
    azimuthDeg: wrap360(node.azimuthDeg + turnDeg),
    altitudeDeg: node.altitudeDeg,
    sdDeg: Math.max(DEFAULTS.unknownHorizonSdDeg, node.sdDeg),
  })
  return [away(first, -room), away(first, -STEP_DEG), ...nodes, away(last, STEP_DEG), away(last, room)]
}

/** So far beyond the last measured node the skyline counts as unmeasured. */
const STEP_DEG = 0.01

/** The skyline nowhere lower than an altitude, with a node wherever it passes it. */
function heldAbove(nodes: readonly SkylineNode[], floor: { deg: number; sdDeg: number }): SkylineNode[] {
  const held = (node: SkylineNode): SkylineNode =>
    node.altitudeDeg > floor.deg ? node : { ...node, altitudeDeg: floor.deg, sdDeg: floor.sdDeg }
  return nodes.flatMap((node, i) => {
    const next = nodes[i + 1]
    if (next === undefined) return [held(node)]
    const [a, b] = [node.altitudeDeg - floor.deg, next.altitudeDeg - floor.deg]
    if (a * b >= 0) return [held(node)]
    const azimuthDeg = wrap360(node.azimuthDeg + (a / (a - b)) * wrap360(next.azimuthDeg - node.azimuthDeg))
    // A node that stands on the floor but for rounding is the place where the skyline passes it.
    if (azimuthDeg === wrap360(node.azimuthDeg) || azimuthDeg === wrap360(next.azimuthDeg))
      return [held(node)]
    return [held(node), { azimuthDeg, altitudeDeg: floor.deg, sdDeg: floor.sdDeg }]
  })
}
