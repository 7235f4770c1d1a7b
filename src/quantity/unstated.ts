/** Why a value is missing: the file leaves it out, or says `unknown`. */
export type Unstated = 'omitted' | 'unknown'

/** Tells a stated value from a missing one. */
export function isUnstated(value: unknown): value is Unstated {
  return value === 'omitted' || value === 'unknown'
}
