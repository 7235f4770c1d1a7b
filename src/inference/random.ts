/**
 * A repeatable source of standard normal numbers: Marsaglia's polar method (1964) over a 32-bit generator with a
 * golden-ratio step and a finalising mix (as in splitmix, Steele, Lea & Flood 2014).
 */
export function normalSource(seed: number): () => number {
  let state = seed >>> 0
  let spare: number | null = null
  const uniform = () => {
    state = (state + 0x9e3779b9) >>> 0
    let mixed = Math.imul(state ^ (state >>> 16), 0x21f0aaad)
    mixed = Math.imul(mixed ^ (mixed >>> 15), 0x735a2d97)
    return ((mixed ^ (mixed >>> 15)) >>> 0) / 2 ** 32
  }
  return () => {
    if (spare !== null) {
      const held = spare
      spare = null
      return held
    }
    for (;;) {
      const x = 2 * uniform() - 1
      const y = 2 * uniform() - 1
      const square = x * x + y * y
      if (square >= 1 || square === 0) continue
      const scale = Math.sqrt((-2 * Math.log(square)) / square)
      spare = y * scale
      return x * scale
    }
  }
}
