/** Freezes a plain value and all that it holds, and returns it. */
export function deepFreeze<T>(value: T): T {
  if (typeof value === 'object' && value !== null && !Object.isFrozen(value)) {
    Object.freeze(value)
    for (const held of Object.values(value)) deepFreeze(held)
  }
  return value
}
