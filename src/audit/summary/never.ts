import type { SightlineAudit } from '../audit.ts'

const ABOVE_OR_BELOW = {
  sun: 'there the Sun stays above that altitude all day, or below it',
  'sun at both solstices': 'at one of the solstices the Sun stays above that altitude all day, or below it',
  moon: 'there the Moon stays above that altitude all day, or below it',
  star: 'the star always stays above that altitude there, or below it',
  'two stars': 'the two never stand so there',
} as const

/** Why a target is never to be had: `the Sun does not reach the zenith there`. */
export function whyNever({ body, event, measures }: SightlineAudit): string {
  if (measures === 'altitude') return 'it stays below the horizon there'
  return event.startsWith('zenith passage') ? 'the Sun does not reach the zenith there' : ABOVE_OR_BELOW[body]
}
