import type { SightlineInputs } from './sightline-inputs.ts'

/** Whether a horizon matters to a line: not on the meridian, nor for a star at a stated altitude, nor for two stars. */
export function usesHorizon({ measures, target }: SightlineInputs): boolean {
  if (measures === 'altitude' || target.body === 'two stars') return false
  return !(target.body === 'star' && target.sighted.by === 'altitude')
}
