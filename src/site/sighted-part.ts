import { DEG } from '../quantity/degrees.ts'

/** What of a thing is sighted, as seen by one who looks along the line. */
export interface SightedPart {
  /** Across the line, metres. */
  widthM: number
  part: 'left' | 'middle' | 'right'
}

/**
 * How far the sighted line is turned from the line of the middles of two things, degrees, clockwise positive:
 * atan((s₂ − s₁)/D), with each part's distance s to the right of its middle, ± half the width.
 *
 * @param lengthM Distance D between the middles, metres.
 * @param parts `from` the thing at the eye, `to` the far one; left and right for both as the eye looks along the line.
 * Throws a RangeError where the distance is not above zero or a width is below zero.
 */
export function lineTurnDeg(lengthM: number, parts: { from: SightedPart; to: SightedPart }): number {
  if (!(lengthM > 0 && Number.isFinite(lengthM)))
    throw new RangeError(`the distance is ${lengthM} m; write metres above zero`)
  return Math.atan((rightOfMiddleM(parts.to) - rightOfMiddleM(parts.from)) / lengthM) / DEG
}

function rightOfMiddleM({ widthM, part }: SightedPart): number {
  if (!(widthM >= 0 && Number.isFinite(widthM)))
    throw new RangeError(`the width is ${widthM} m; write metres, zero or more`)
  switch (part) {
    case 'left':
      return -widthM / 2
    case 'middle':
      return 0
    case 'right':
      return widthM / 2
  }
}
