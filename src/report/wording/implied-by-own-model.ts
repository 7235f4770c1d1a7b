import type { Audit, Implied } from '../../audit/audit.ts'

/** The dates by the model that the audit itself works with, one entry for each sightline. */
export function impliedByOwnModel({ implied, tracks }: Audit): Implied[] {
  return implied.filter(({ sightline, model }) => {
    const own = tracks.find((track) => track.sightline === sightline)
    return own === undefined || own.model === model
  })
}
