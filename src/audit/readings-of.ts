import type { Disc } from '../claim/claim.ts'
import { labelOfStar } from '../sky/star-catalogue.ts'
import type { SettledTarget } from './sightline-inputs.ts'
import { discWords } from './words.ts'

/** A target read in one way. */
export interface Reading {
  choice: string
  value: string
  target: SettledTarget
}

const PARTS: readonly Disc[] = [{ part: 'upper limb' }, { part: 'centre' }, { part: 'lower limb' }]

/** Every reading of a target that differs from it in one choice, and itself first in each choice. */
export function readingsOf(target: SettledTarget): Reading[] {
  switch (target.body) {
    case 'sun':
      return [...senseReadings(target), ...discReadings(target)]
    case 'moon':
      return discReadings(target)
    case 'star':
      return ruleReadings(target)
    case 'two stars':
      return upperReadings(target)
  }
}

function discReadings(target: Extract<SettledTarget, { body: 'sun' | 'moon' }>): Reading[] {
  const onMeridian = target.at === 'noon'
  const others = PARTS.filter((disc) => discWords(disc) !== discWords(target.disc))
  return [target.disc, ...others].map((disc, i) => ({
    choice: 'part of the disc',
    value: onMeridian ? disc.part : discWords(disc),
    target: i === 0 ? target : { ...target, disc },
  }))
}

const SENSES = ['declination zero', 'midway in days', 'midway in direction'] as const

function senseReadings(target: Extract<SettledTarget, { body: 'sun' }>): Reading[] {
  const { event } = target
  if (event.name !== 'equinox') return []
  return [event.sense, ...SENSES.filter((sense) => sense !== event.sense)].map((sense, i) => ({
    choice: 'sense of equinox',
    value: sense,
    target: i === 0 ? target : { ...target, event: { name: 'equinox', sense } },
  }))
}

function ruleReadings(target: Extract<SettledTarget, { body: 'star' }>): Reading[] {
  if (target.at === 'upper culmination' || target.at === 'lower culmination') return []
  const choice = 'where the star is seen'
  const rules = (['extinction', 'magnitude in degrees'] as const).map((rule): Reading => {
    const isOwn = target.sighted.by === 'rule' && target.sighted.rule === rule
    const value =
      rule === 'extinction' ? 'first visible by extinction' : 'as many degrees up as it has magnitudes'
    return { choice, value, target: isOwn ? target : { ...target, sighted: { by: 'rule', rule } } }
  })
  if (target.sighted.by === 'rule')
    return rules.sort((a, b) => Number(b.target === target) - Number(a.target === target))
  return [{ choice, value: 'at the altitude stated', target }, ...rules]
}

function upperReadings(target: Extract<SettledTarget, { body: 'two stars' }>): Reading[] {
  const [first, second] = target.stars.map(labelOfStar)
  const values = [
    { above: null, value: 'either above' },
    { above: 0 as const, value: `${first} above` },
    { above: 1 as const, value: `${second} above` },
  ]
  const own = values.filter(({ above }) => above === target.above)
  return [...own, ...values.filter(({ above }) => above !== target.above)].map(({ above, value }) => ({
    choice: 'which star is above',
    value,
    target: above === target.above ? target : { ...target, above },
  }))
}
