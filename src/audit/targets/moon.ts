import type { Uncertain } from '../../inference/horizon-branch.ts'
import {
  MOON_NEARNESS_SD,
  MOON_PARALLAX_ARCMIN,
  MOON_SEMIDIAMETER_ARCMIN,
  MOON_WOBBLE_SD_ARCMIN,
  STANDSTILL_CYCLE_YEARS,
  type StandstillEvent,
  standstillDeclinationDeg,
} from '../../sky/moon.ts'
import type { SettledTarget, SightlineInputs } from '../sightline-inputs.ts'
import { discWords } from '../words.ts'
import { type DiscBody, discAltitude } from './disc-altitude.ts'
import { discBranch, discOnLine } from './disc-branch.ts'
import { obliquityErrors } from './obliquity-errors.ts'
import { SUN_MODELS } from './sun.ts'
import type { TargetModel } from './target-model.ts'

/** Name of the wobble's error in the budget. */
export const MOON_WOBBLE = 'the wobble of the Moon’s path'

/** The Moon at a standstill, rising or setting. */
export function moonTarget(
  inputs: SightlineInputs,
  target: Extract<SettledTarget, { body: 'moon' }>,
): TargetModel {
  const { standstill, at, disc } = target
  const event: StandstillEvent = `${standstill.side} ${standstill.size} standstill`
  const semidiameter = () => ({ arcmin: MOON_SEMIDIAMETER_ARCMIN, sdArcmin: 0 })
  const body: DiscBody = {
    semidiameter,
    parallaxArcsec: MOON_PARALLAX_ARCMIN * 60,
    nearnessSd: MOON_NEARNESS_SD,
  }
  const altitude = discAltitude(inputs, disc, body)
  const declination = (year: number): Uncertain => ({
    deg: standstillDeclinationDeg(year, event, inputs.model),
    errors: [
      ...obliquityErrors(year, standstill.side === 'northern' ? 1 : -1),
      { source: MOON_WOBBLE, sdDeg: MOON_WOBBLE_SD_ARCMIN / 60 },
    ],
  })
  const words = `${event} ${at === 'rising' ? 'moonrise' : 'moonset'}`
  return {
    event: words,
    description: `${words}, ${discWords(disc)}`,
    branches: [discBranch(inputs, { at, disc, body, declination })],
    declinationDeg: (year) => declination(year).deg,
    altitudeDeg: (year) => {
      const { deg, errors } = altitude(year)
      return { deg, sdDeg: Math.hypot(...errors.map(({ sdDeg }) => sdDeg)) }
    },
    onLine: discOnLine(inputs, { at, disc, body }),
    seenAt: null,
    semidiameter,
    models: SUN_MODELS,
    notes: () => [standstill.size === 'major' ? MAJOR_NOTE : MINOR_NOTE],
    warnings: [],
  }
}

const MAJOR_NOTE = `A standstill comes back every ${STANDSTILL_CYCLE_YEARS} years; for a year or so about it the Moon gets as far once in each month, and within that swings by 9′ to either side every 173 days. In most years no moonrise or moonset stands there.`

const MINOR_NOTE = `A standstill comes back every ${STANDSTILL_CYCLE_YEARS} years; for a year or so about it the Moon turns there once in each month, and within that swings by 9′ to either side every 173 days. In all other years it passes there twice a month on its way further, so that a moonrise or moonset there is no sign of a standstill by itself.`
