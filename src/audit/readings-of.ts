import type { Disc } from '../claim/claim.ts'
import { labelOfStar } from '../sky/star-catalogue.ts'
import type { SettledTarget, SightlineInputs } from './sightline-inputs.ts'
import { type End, partWords } from './survey/ends.ts'
import { withPart } from './with-part.ts'
import { withTarget } from './with-target.ts'
import { discWords } from './words.ts'

/** A line and its target read in one way. */
export interface Reading {
  choice: string
  value: string
  /** Whether it is the line as it was settled. */
  isOwn: boolean
  line: SightlineInputs
}

const PARTS: readonly Disc[] = [{ part: 'upper limb' }, { part: 'centre' }, { part: 'lower limb' }]

/** Every reading of a line and its target that differs from it in one choice, and itself first in each choice. */
export function readingsOf(line: SightlineInputs): Reading[] {
  return [...readingsOfTarget(line), ...readingsOfEnds(line)]
}

function readingsOfTarget(line: SightlineInputs): Reading[] {
  return readTarget(line.target).map(({ choice, value, target }) => {
    const isOwn = target === line.target
    return { choice, value, isOwn, line: isOwn ? line : withTarget(line, target) }
  })
}

/** What may have been sighted of things that have a width. */
function readingsOfEnds(line: SightlineInputs): Reading[] {
  const { ends } = line
  if (ends === null) return []
  return (['from', 'to'] as const).flatMap((side) => {
    const end = ends[side]
    if (end.form === null) return []
    const others = (['left', 'middle', 'right'] as const).filter((part) => part !== end.part)
    return [end.part, ...others].map((part, i) => ({
      choice: sightedChoice(end),
      value: partWords({ ...end, part }),
      isOwn: i === 0,
      line: i === 0 ? line : withPart(line, side, part),
    }))
  })
}

/** The choice of what is sighted of one end. */
export function sightedChoice({ name }: Pick<End, 'name'>): string {
  return `part of ${name} that is sighted`
}

/** A target read in one way. */
interface TargetReading {
  choice: string
  value: string
  target: SettledTarget
}

function readTarget(target: SettledTarget): TargetReading[] {
  switch (target.body) {
    case 'sun':
      return [...senseReadings(target), ...discReadings(target, target.at === 'noon')]
    case 'sun at both solstices':
    case 'moon':
      return discReadings(target, false)
    case 'star':
      return ruleReadings(target)
    case 'two stars':
      return upperReadings(target)
  }
}

function discReadings(target: Extract<SettledTarget, { disc: Disc }>, onMeridian: boolean): TargetReading[] {
  const others = PARTS.filter((disc) => discWords(disc) !== discWords(target.disc))
  return [target.disc, ...others].map((disc, i) => ({
    choice: 'part of the disc',
    value: onMeridian ? disc.part : discWords(disc),
    target: i === 0 ? target : { ...target, disc },
  }))
}

const SENSES = ['declination zero', 'midway in days', 'midway in direction'] as const

function senseReadings(target: Extract<SettledTarget, { body: 'sun' }>): TargetReading[] {
  const { event } = target
  if (event.name !== 'equinox') return []
  return [event.sense, ...SENSES.filter((sense) => sense !== event.sense)].map((sense, i) => ({
    choice: 'sense of equinox',
    value: sense,
    target: i === 0 ? target : { ...target, event: { name: 'equinox', sense } },
  }))
}

function ruleReadings(target: Extract<SettledTarget, { body: 'star' }>): TargetReading[] {
  if (target.at === 'upper culmination' || target.at === 'lower culmination') return []
  const choice = 'where the star is seen'
  const rules = (['extinction', 'magnitude in degrees'] as const).map((rule): TargetReading => {
    const isOwn = target.sighted.by === 'rule' && target.sighted.rule === rule
    const value =
      rule === 'extinction'
        ? 'first visible by extinction'
        : 'as many degrees up as it has magnitudes, at least 1°'
    return { choice, value, target: isOwn ? target : { ...target, sighted: { by: 'rule', rule } } }
  })
  if (target.sighted.by === 'rule')
    return rules.sort((a, b) => Number(b.target === target) - Number(a.target === target))
  return [{ choice, value: 'at the altitude stated', target }, ...rules]
}

function upperReadings(target: Extract<SettledTarget, { body: 'two stars' }>): TargetReading[] {
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
