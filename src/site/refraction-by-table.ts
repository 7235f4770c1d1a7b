import { LOWEST_SKYLINE_DEG } from './skyline.ts'

/** Altitudes at which refraction is asked, degrees apart. */
const STEP_DEG = 0.1

/**
 * Refraction made quick for many altitudes near each other: asked every tenth of a degree, when first needed, and by
 * a cubic through four of these in between. Within 0.001′ above the horizontal; below, where rays come near the floor
 * at which the modelled air changes its gradient, within 0.03′ down to −1.5°.
 */
export function refractionByTable(
  refractionArcmin: (apparentAltitudeDeg: number) => number,
): (apparentAltitudeDeg: number) => number {
  const known = new Map<number, number>()
  const at = (step: number) => {
    const found = known.get(step)
    if (found !== undefined) return found
    const asked = refractionArcmin(step * STEP_DEG)
    known.set(step, asked)
    return asked
  }
  return (apparentAltitudeDeg) => {
    const place = apparentAltitudeDeg / STEP_DEG
    const first = Math.max(Math.ceil(LOWEST_SKYLINE_DEG / STEP_DEG), Math.floor(place) - 1)
    return cubicThrough(at(first), at(first + 1), at(first + 2), at(first + 3), place - first)
  }
}

/** Lagrange's polynomial through values at 0, 1, 2 and 3. */
function cubicThrough(y0: number, y1: number, y2: number, y3: number, x: number): number {
  const [x1, x2, x3] = [x - 1, x - 2, x - 3]
  return (-y0 * x1 * x2 * x3) / 6 + (y1 * x * x2 * x3) / 2 - (y2 * x * x1 * x3) / 2 + (y3 * x * x1 * x2) / 6
}
