import { isUnstated } from '../quantity/unstated.ts'

/** A stated value, or the default that stands in for it. */
export function statedOr<T>(value: T | 'omitted' | 'unknown', fallback: T): T {
  return isUnstated(value) ? fallback : (value as T)
}
