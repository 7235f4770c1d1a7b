import type { SightlineAudit } from '../../audit/audit.ts'

/** That a target is not to be seen, after `there is` or `there was`: `no rising of Sirius at that altitude`. */
export function noEvent({
  body,
  measures,
  event,
}: Pick<SightlineAudit, 'body' | 'measures' | 'event'>): string {
  if (body === 'two stars' || measures === 'angle') return `no ${event}`
  return `no ${event} ${measures === 'altitude' ? 'above the horizon' : 'at that altitude'}`
}
