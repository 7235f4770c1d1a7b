import { rememberLast } from '../../inference/remember-last.ts'
import type { Branch, Prediction, PredictionError } from '../../inference/sight.ts'
import { wrap180 } from '../../quantity/degrees.ts'
import { sunSemidiameterAt } from '../../sky/sun.ts'
import type { SettledTarget, SightlineInputs } from '../sightline-inputs.ts'
import { discWords } from '../words.ts'
import { SUN_MODELS, sunTarget } from './sun.ts'
import type { TargetModel } from './target-model.ts'

type SettledSpan = Extract<SettledTarget, { body: 'sun at both solstices' }>

/** The angle along the horizon between the Sun's two solstice directions, which needs no north. */
export function solsticeSpanTarget(inputs: SightlineInputs, { at, disc }: SettledSpan): TargetModel {
  const { pair } = inputs
  if (pair === null) throw new Error('the angle between the solstices has two lines')
  const [june, december] = [pair.june, pair.december].map((line) => {
    const { target } = line
    if (target.body !== 'sun') throw new Error('both lines of the angle are of the Sun')
    return sunTarget({ ...line, model: inputs.model }, target).branches[0]!
  })
  const moment = at === 'rising' ? 'sunrise' : 'sunset'
  const event = `span from June to December solstice ${moment}`
  return {
    event,
    description: `${event}, ${discWords(disc)}`,
    branches: [spanOf(june!, december!)],
    declinationDeg: () => null,
    altitudeDeg: () => null,
    onLine: null,
    seenAt: null,
    // The mean over both solstices, between which the Sun is larger or smaller by a sixtieth.
    semidiameter: (year) => {
      const [summer, winter] = [sunSemidiameterAt(year, 90), sunSemidiameterAt(year, 270)]
      return { arcmin: (summer.arcmin + winter.arcmin) / 2, sdArcmin: summer.sdArcmin }
    },
    models: SUN_MODELS,
    notes: () => [
      'The angle needs no north: an error of north turns both of its lines alike. What it tells rests on two horizons and two built lines, so a build tolerance counts √2 times.',
    ],
    warnings: [],
  }
}

function spanOf(june: Branch, december: Branch): Branch {
  return {
    predict: rememberLast((year) => {
      const [first, second] = [june.predict(year), december.predict(year)]
      return first === null || second === null ? null : between(first, second)
    }),
    shortfallDeg: (year) => {
      const shortfalls = [june, december].map((branch) => branch.shortfallDeg?.(year) ?? null)
      return shortfalls.some((shortfall) => shortfall === null)
        ? null
        : Math.max(...shortfalls.map((shortfall) => shortfall!))
    },
  }
}

/** The angle, and the errors of both directions; what they share is taken together, with its sign. */
function between(june: Prediction, december: Prediction): Prediction {
  const turn = wrap180(december.directionDeg - june.directionDeg)
  const sign = Math.sign(turn) || 1
  const shared = new Map<string, number>()
  const own: PredictionError[] = []
  for (const [prediction, side, name] of [
    [june, -sign, 'June'],
    [december, sign, 'December'],
  ] as const) {
    for (const { source, effectDeg, shared: isShared } of prediction.errors) {
      if (isShared) shared.set(source, (shared.get(source) ?? 0) + side * effectDeg)
      else own.push({ source: `${source} (${name})`, effectDeg: side * effectDeg, shared: false })
    }
  }
  const errors = [...shared].map(([source, effectDeg]) => ({ source, effectDeg, shared: true }))
  return { directionDeg: Math.abs(turn), errors: [...own, ...errors] }
}
