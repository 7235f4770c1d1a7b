import type { Target } from './claim.ts'

/** Whether a target is met on the meridian, so that its sightline is an altitude and not a direction. */
export function isOnMeridian(target: Target): boolean {
  if (target.body === 'sun') return target.at === 'noon'
  return target.body === 'star' && (target.at === 'upper culmination' || target.at === 'lower culmination')
}
