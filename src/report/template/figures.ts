import type { Element } from 'hast'
import type { PhrasingContent } from 'mdast'
import type { Audit } from '../../audit/audit.ts'
import { horizonCaption } from '../captions/horizon.ts'
import { planCaption } from '../captions/plan.ts'
import { premiseCaption } from '../captions/premise.ts'
import { trackCaption } from '../captions/track.ts'
import { horizonFigure } from '../figures/horizon-figure.ts'
import { hasHorizon } from '../figures/horizon-source.ts'
import { planFigure } from '../figures/plan-figure.ts'
import { planParts } from '../figures/plan-parts.ts'
import { premiseFigure } from '../figures/premise-figure.ts'
import { trackFigure } from '../figures/track-figure.ts'
import { fileNames } from './file-names.ts'

/** A figure before it has its number. */
export interface CaptionedDrawing {
  /** Names its file; letters a to z, digits, hyphens. */
  name: string
  drawing: Element
  alt: string
  caption: PhrasingContent[]
}

/** What `::figure{of="…"}` may name; some give one figure for each sightline. To add one, as with parts.ts. */
export const FIGURES: Readonly<Record<string, (audit: Audit) => CaptionedDrawing[]>> = {
  premise: (audit) => [{ name: 'premise', ...premiseFigure(audit), caption: premiseCaption(audit) }],
  plan: (audit) =>
    planParts(audit).flatMap((part, index, parts) => {
      const figure = planFigure(part)
      const name = index === 0 ? 'plan' : `plan-${index + 1}`
      return figure === null ? [] : [{ name, ...figure, caption: planCaption(part, parts.length > 1) }]
    }),
  horizon: (audit) => {
    const lines = audit.sightlines.filter(hasHorizon)
    const names = fileNames(
      'horizon',
      lines.map((line) => line.name),
    )
    return lines.map((line, index) => ({
      name: names[index]!,
      ...horizonFigure(audit, line.name),
      caption: horizonCaption(audit, line),
    }))
  },
  track: (audit) => {
    const names = fileNames(
      'track',
      audit.sightlines.map((line) => line.name),
    )
    return audit.sightlines.map((line, index) => ({
      name: names[index]!,
      ...trackFigure(audit, line.name),
      caption: trackCaption(audit, line),
    }))
  },
}
