/** The greatest of 1, 2 and 5 times a power of ten that is not above `most`. */
export function roundLength(most: number): number {
  const power = Math.floor(Math.log10(most))
  const steps = [power - 1, power, power + 1].flatMap((each) =>
    [1, 2, 5].map((digit) => Number(`${digit}e${each}`)),
  )
  return Math.max(...steps.filter((step) => step <= most * (1 + 1e-9)))
}

const ARCMINUTES = [
  0.01, 0.02, 0.05, 0.1, 0.2, 0.5, 1, 2, 5, 10, 20, 30, 60, 120, 300, 600, 1200, 2700, 5400, 10_800,
]

/** The greatest angle that is round as people count angles and not above `most`, arcminutes. */
export function roundArcmin(most: number): number {
  return ARCMINUTES.filter((step) => step <= most * (1 + 1e-9)).at(-1) ?? roundLength(most)
}

/** The least round factor that is not below `least`: two digits at most. */
export function roundFactor(least: number): number {
  const power = Math.floor(Math.log10(least))
  const steps = [power, power + 1].flatMap((each) =>
    [1, 1.5, 2, 2.5, 3, 4, 5, 6, 8].map((digit) => Number(`${digit}e${each}`)),
  )
  return Math.min(...steps.filter((step) => step >= least * (1 - 1e-9)))
}
