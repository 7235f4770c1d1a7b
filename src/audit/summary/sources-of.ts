import type { SightlineAudit } from '../audit.ts'

/** What leaves the place of a line's target uncertain, in the words of the finding. */
export function sourcesOf({ body, measures }: SightlineAudit): string {
  if (body === 'two stars') return 'survey and star catalogue'
  if (measures === 'angle') return 'survey, two horizons and air'
  return measures === 'altitude' ? 'survey and air' : 'survey, horizon and air'
}
