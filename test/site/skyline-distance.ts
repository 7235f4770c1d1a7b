import { DEG, wrap180, wrap360 } from '../../src/quantity/degrees.ts'
import type { TrueSkyline } from '../../src/site/true-skyline.ts'

type Vector = readonly [north: number, east: number, up: number]

/** A direction; degrees. */
export interface Place {
  azimuthDeg: number
  altitudeDeg: number
}

/** Length of the chords that stand for the skyline, degrees. */
const CHORD_DEG = 1 / 60
/** Farther parts than this are not looked at, degrees. */
const SIGHT_DEG = 1.2

/**
 * Distance of places from a skyline, degrees, negative below it, with the azimuth of the point that is nearest: by
 * vectors, from every bit of the skyline nearby.
 */
export function skylineDistance(
  skyline: TrueSkyline,
): (place: Place) => { distanceDeg: number; nearestAzimuthDeg: number } {
  const { nodes } = skyline
  const chords = chordsOf(skyline)
  return (place) => {
    const here = vectorOf(place)
    let [nearest, nearestAzimuthDeg] = [Infinity, Number.NaN]
    for (const { azimuthDeg, turnDeg, from, along } of chords) {
      if (Math.abs(wrap180(azimuthDeg - place.azimuthDeg)) * Math.cos(place.altitudeDeg * DEG) > SIGHT_DEG)
        continue
      const apart = minus(here, from)
      const share = Math.min(1, Math.max(0, dot(apart, along) / dot(along, along)))
      const chord = Math.hypot(...minus(apart, [along[0] * share, along[1] * share, along[2] * share]))
      if (chord < nearest) [nearest, nearestAzimuthDeg] = [chord, azimuthDeg + share * turnDeg]
    }
    const azimuth = nodes[0].azimuthDeg + wrap360(place.azimuthDeg - nodes[0].azimuthDeg)
    const next = nodes.findIndex((node) => node.azimuthDeg >= azimuth)
    const [from, to] = [nodes[next - 1], nodes[next]]
    const share = (azimuth - from.azimuthDeg) / (to.azimuthDeg - from.azimuthDeg)
    const isBelow = place.altitudeDeg < from.altitudeDeg + share * (to.altitudeDeg - from.altitudeDeg)
    const distance = (2 * Math.asin(nearest / 2)) / DEG
    return { distanceDeg: isBelow ? -distance : distance, nearestAzimuthDeg: wrap360(nearestAzimuthDeg) }
  }
}

interface Chord {
  azimuthDeg: number
  turnDeg: number
  from: Vector
  along: Vector
}

function chordsOf({ nodes }: TrueSkyline): Chord[] {
  return nodes.slice(1).flatMap((to, i) => {
    const from = nodes[i]
    const [turn, rise] = [to.azimuthDeg - from.azimuthDeg, to.altitudeDeg - from.altitudeDeg]
    const chords = Math.ceil(Math.hypot(turn, rise) / CHORD_DEG)
    const at = (share: number) =>
      vectorOf({ azimuthDeg: from.azimuthDeg + share * turn, altitudeDeg: from.altitudeDeg + share * rise })
    return Array.from({ length: chords }, (_, k) => ({
      azimuthDeg: from.azimuthDeg + (k / chords) * turn,
      turnDeg: turn / chords,
      from: at(k / chords),
      along: minus(at((k + 1) / chords), at(k / chords)),
    }))
  })
}

function minus(a: Vector, b: Vector): Vector {
  return [a[0] - b[0], a[1] - b[1], a[2] - b[2]]
}

function dot(a: Vector, b: Vector): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2]
}

function vectorOf({ azimuthDeg, altitudeDeg }: Place): Vector {
  const [a, h] = [azimuthDeg * DEG, altitudeDeg * DEG]
  return [Math.cos(h) * Math.cos(a), Math.cos(h) * Math.sin(a), Math.sin(h)]
}
