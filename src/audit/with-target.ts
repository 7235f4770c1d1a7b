import type { SettledTarget, SightlineInputs } from './sightline-inputs.ts'

/** The line with another target of the same kind; of an angle, its two lines too. */
export function withTarget(line: SightlineInputs, target: SettledTarget): SightlineInputs {
  const { pair } = line
  if (pair === null || target.body !== 'sun at both solstices') return { ...line, target }
  const solsticeOf = (own: SightlineInputs): SightlineInputs =>
    own.target.body === 'sun' ? { ...own, target: { ...own.target, disc: target.disc } } : own
  return { ...line, target, pair: { june: solsticeOf(pair.june), december: solsticeOf(pair.december) } }
}
