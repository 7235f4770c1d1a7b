import { extent } from 'd3-array'
import { nearLine, onTurnOf, type TrackSource } from './track-source.ts'

/** The directions that a track figure shows. */
export interface TrackRange {
  /** Degrees, about the line; may pass 0 or 360. */
  shown: readonly [number, number]
  /** Whether the target's course goes on beyond that. */
  isCut: boolean
  /** Of the whole course, degrees likewise. */
  whole: readonly [number, number]
}

/** A course that swings further than this is drawn in part, lest the line and what is near it shrink to nothing. */
const MOST_DEG = 50
/** A course that goes on by less than this share of what is shown is drawn whole. */
const SMALL_REST = 0.2
/** A course that hardly moves is to look so. */
const LEAST_DEG = 1
const MARGIN = 0.06

/**
 * All of the tracks by the audit's own model and the line, with as much of its band as does not press the tracks into less than half of the
 * height. Of a course that swings further than 50° or so, the part about the line, and with it where the target stood at
 * the asserted date and at its nearest.
 */
export function trackRange(source: TrackSource): TrackRange {
  const { value, sd } = source.tracks[0].line_deg
  const curves = source.tracks.flatMap(nearLine).filter((deg) => deg !== null)
  const whole = extent([...curves, value]) as [number, number]
  const [low, high] = atLeast(partOf(whole, wantedOf(source)))
  const span = high - low
  const band = Math.min(2.2 * sd, span / 2)
  const isCut = low > whole[0] || high < whole[1]
  return {
    shown: [
      Math.min(low, value - band) - (low > whole[0] ? 0 : span * MARGIN),
      Math.max(high, value + band) + (high < whole[1] ? 0 : span * MARGIN),
    ],
    isCut,
    whole,
  }
}

/** What must be seen: the line, the target at the asserted date, its nearest approach. */
function wantedOf({ sightline, tracks, implied }: TrackSource): [number, number] {
  const { value } = tracks[0].line_deg
  const asserted = sightline.direction_at_asserted_deg
  const nearest = implied?.nearest_approach?.offset_arcmin ?? null
  return extent([
    value,
    ...(asserted === null ? [] : [onTurnOf(value, asserted)]),
    ...(nearest === null ? [] : [value - nearest / 60]),
  ]) as [number, number]
}

function partOf(whole: readonly [number, number], wanted: readonly [number, number]): [number, number] {
  const room = Math.max(MOST_DEG, (wanted[1] - wanted[0]) * 1.3)
  if (whole[1] - whole[0] <= room * (1 + SMALL_REST)) return [...whole]
  const low = (wanted[0] + wanted[1] - room) / 2
  const from = Math.max(whole[0], Math.min(low, whole[1] - room))
  return [from, from + room]
}

function atLeast([low, high]: readonly [number, number]): [number, number] {
  const lack = Math.max(0, LEAST_DEG - (high - low)) / 2
  return [low - lack, high + lack]
}
