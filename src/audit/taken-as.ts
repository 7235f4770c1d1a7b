import type { Sightline } from '../claim/claim.ts'
import { bestFit, isFit } from '../inference/fit.ts'
import { isUnstated } from '../quantity/unstated.ts'
import { choicesOf } from './choices-of.ts'
import { readingsOf } from './readings-of.ts'
import { sightOf } from './sight-of.ts'
import type { SightlineInputs } from './sightline-inputs.ts'
import type { TakenAs } from './summary/summary-facts.ts'
import { usesHorizon } from './uses-horizon.ts'

/** What the claim leaves open of a line's target and horizon, and with which readings the line fits a date. */
export function takenAs(
  stated: Sightline,
  line: SightlineInputs,
  asserted: { from: number; to: number },
): TakenAs[] {
  const ofTarget = choicesOf(stated, line).flatMap(({ choice, said }) => {
    if (!isUnstated(said)) return []
    const readings = readingsOf(line).filter((reading) => reading.choice === choice)
    const own = readings.find(({ isOwn }) => isOwn)
    const fitting = readings.filter(
      (reading) => !reading.isOwn && isFit(bestFit([sightOf(reading.line)], asserted), 1),
    )
    return own === undefined
      ? []
      : [
          {
            what: /^wh/.test(choice) ? choice : `the ${choice}`,
            used: own.value,
            fitsWith: fitting.map(({ value }) => value),
          },
        ]
  })
  const { direction, horizon } = stated
  const horizons = direction.by === 'span' ? Object.values(direction.horizons) : [horizon]
  const isLevel = usesHorizon(line) && horizons.some(isUnstated)
  return isLevel ? [...ofTarget, { what: 'the horizon', used: 'level', fitsWith: [] }] : ofTarget
}
