/** A source of random numbers that gives the same numbers every time. */
export interface Random {
  /** Uniform from 0 (included) to 1 (left out). */
  uniform: () => number
  /** Normal with mean 0 and standard deviation 1. */
  normal: () => number
}

/** Mulberry32, a 32-bit generator in the public domain, and the Box–Muller transform. */
export function seededRandom(seed: number): Random {
  let state = seed
  const uniform = () => {
    state = (state + 0x6d2b79f5) | 0
    let z = Math.imul(state ^ (state >>> 15), 1 | state)
    z = (z + Math.imul(z ^ (z >>> 7), 61 | z)) ^ z
    return ((z ^ (z >>> 14)) >>> 0) / 2 ** 32
  }
  const normal = () => Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform())
  return { uniform, normal }
}
