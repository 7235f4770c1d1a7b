import type { Audit } from '../../audit/audit.ts'

/** Whether the place of some target rests on the Earth's tilt, and whether that of some rests on precession. */
export function bodiesOf({ sightlines }: Pick<Audit, 'sightlines'>): { tilt: boolean; stars: boolean } {
  return {
    tilt: sightlines.some(({ body }) => body === 'sun' || body === 'moon'),
    stars: sightlines.some(({ body }) => body === 'star' || body === 'two stars'),
  }
}

/** Whether a star is to be seen rising or setting, for which it matters how high it must stand to be seen. */
export function hasRisingStar({ sightlines }: Pick<Audit, 'sightlines'>): boolean {
  return sightlines.some(({ body, measures }) => body === 'star' && measures === 'azimuth')
}
