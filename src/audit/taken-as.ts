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
  { target: stated, horizonDeg }: Sightline,
  line: SightlineInputs,
  asserted: { from: number; to: number },
): TakenAs[] {
  const ofTarget = choicesOf(stated).flatMap(({ choice, said }) => {
    if (!isUnstated(said)) return []
    const readings = readingsOf(line.target).filter((reading) => reading.choice === choice)
    const own = readings.find(({ target }) => target === line.target)
    const fitting = readings.filter(
      ({ target }) => target !== line.target && isFit(bestFit([sightOf({ ...line, target })], asserted), 1),
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
  const isLevel = usesHorizon(line) && isUnstated(horizonDeg)
  return isLevel ? [...ofTarget, { what: 'the horizon', used: 'level', fitsWith: [] }] : ofTarget
}
