import type { Claim } from '../claim/claim.ts'
import { crossingYears } from '../inference/implied-dates.ts'
import { isUnstated } from '../quantity/unstated.ts'
import { bennettRefractionArcmin } from '../site/bennett.ts'
import { refractionArcmin } from '../site/refraction.ts'
import { MOON_PARALLAX_ARCMIN } from '../sky/moon.ts'
import type { RefractionCheck } from './audit.ts'
import { nearestYear } from './dated-label.ts'
import { YEARS_BEYOND_WINDOW } from './defaults.ts'
import { airOf } from './settle-sightline.ts'
import { sightOf } from './sight-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import { usesHorizon } from './uses-horizon.ts'

/** A refraction within so much of the sea-level figure is taken to be that figure, arcminutes. */
const SAME_ARCMIN = 1.5
/** The air that Bennett's textbook figure is for. */
const TEXTBOOK = { temperatureC: 10, pressureHpa: 1010 }
const STEP = 20

/**
 * The refraction that a claim took for one line, held against a ray trace through the air of the place, and what the
 * difference is worth in years. Null where the claim states none, or the line meets no horizon, or two.
 */
export function auditRefractionCheck(
  claim: Claim,
  line: SightlineInputs,
  window: { from: number; to: number },
  near: number,
): RefractionCheck | null {
  const stated = statedRefractionArcmin(claim, line)
  if (stated === null || !usesHorizon(line) || line.pair !== null) return null
  const air = airOf(claim)
  const traced = refractionArcmin(line.horizonDeg, air, line.latitudeDeg)
  // Textbooks go no lower than the level.
  const altitudeDeg = Math.max(0, line.horizonDeg)
  const seaLevel = bennettRefractionArcmin(altitudeDeg, TEXTBOOK.temperatureC, TEXTBOOK.pressureHpa)
  const dateBy = (arcmin: number) => {
    const from = window.from - YEARS_BEYOND_WINDOW
    const to = window.to + YEARS_BEYOND_WINDOW
    const own: SightlineInputs = {
      ...line,
      refraction: { by: 'ray trace', air },
      refractionShiftArcmin: arcmin - traced,
    }
    return nearestYear(crossingYears(sightOf(own), from, to, STEP), near)
  }
  const [byStated, byTraced] = [dateBy(stated), dateBy(traced)]
  return {
    stated_arcmin: stated,
    traced_arcmin: traced,
    sea_level_arcmin: seaLevel,
    is_sea_level: Math.abs(stated - seaLevel) <= SAME_ARCMIN && Math.abs(traced - seaLevel) > SAME_ARCMIN,
    effect_years: byStated === null || byTraced === null ? null : byStated - byTraced,
  }
}

/**
 * As the claim uses it, with the Moon's parallax that was taken off put back (the Sun's 0.15′ is less than anybody prints),
 * or as its source prints it of the first line.
 */
function statedRefractionArcmin(
  { atmosphere, claimed, sightlines }: Claim,
  line: SightlineInputs,
): number | null {
  const { refractionArcmin: used } = atmosphere
  if (!isUnstated(used)) return used + (line.target.body === 'moon' ? MOON_PARALLAX_ARCMIN : 0)
  return sightlines[0]!.name === line.name ? (claimed.refractionArcmin?.value ?? null) : null
}
