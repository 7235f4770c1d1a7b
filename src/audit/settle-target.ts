import type { SunEvent, Target } from '../claim/claim.ts'
import { isUnstated } from '../quantity/unstated.ts'
import { STARS, type Star } from '../sky/star-catalogue.ts'
import { DEFAULTS } from './defaults.ts'
import type { SettledSunEvent, SettledTarget } from './sightline-inputs.ts'
import { statedOr } from './stated-or.ts'

/** A target with every gap filled with its default. */
export function settleTarget(target: Target): SettledTarget {
  switch (target.body) {
    case 'sun': {
      const part = target.at === 'noon' ? DEFAULTS.discAtNoon : DEFAULTS.disc
      return {
        body: 'sun',
        event: settleEvent(target.event),
        at: target.at,
        disc: statedOr(target.disc, { part }),
      }
    }
    case 'sun at both solstices':
    case 'moon':
      return { ...target, disc: statedOr(target.disc, { part: DEFAULTS.disc }) }
    case 'star': {
      const { altitudeDeg } = target
      return {
        body: 'star',
        star: starOf(target.star.hr),
        at: target.at,
        sighted: isUnstated(altitudeDeg)
          ? { by: 'rule', rule: DEFAULTS.visibilityRule }
          : {
              by: 'altitude',
              deg: altitudeDeg.value,
              sdDeg: statedOr(altitudeDeg.sd, DEFAULTS.sightedAltitudeSdDeg),
            },
      }
    }
    case 'two stars':
      return {
        body: 'two stars',
        stars: [starOf(target.stars[0].hr), starOf(target.stars[1].hr)],
        above: isUnstated(target.above) ? null : target.above,
      }
  }
}

function settleEvent(event: SunEvent): SettledSunEvent {
  return event.name === 'equinox'
    ? { name: 'equinox', sense: statedOr(event.sense, DEFAULTS.equinoxSense) }
    : event
}

/** The reader of the claim file has made sure that the star is in the catalogue. */
function starOf(hr: number): Star {
  const star = STARS.find((held) => held.hr === hr)
  if (star === undefined) throw new Error(`a claim without errors names no missing star: HR ${hr}`)
  return star
}
