import { groupThousands } from './format-number.ts'

/**
 * Prints an astronomical year (0 is 1 BCE) as people count: `9601 BCE`, `420 CE`, `11,881 BCE`.
 * It is rounded to a multiple of `step` as counted in its era; what would round to year 0, which no era has,
 * is year 1. Throws a RangeError where the year is not finite.
 */
export function formatYear(year: number, step = 1): string {
  const { count, era } = countInEra(year, step)
  return `${count} ${era}`
}

/** Prints a stretch of astronomical years: `9700 to 9500 BCE`, `2500 BCE to 420 CE`; one year where both print alike. */
export function formatYearRange(from: number, to: number, step = 1): string {
  const start = countInEra(from, step)
  const end = countInEra(to, step)
  if (start.era !== end.era) return `${start.count} ${start.era} to ${end.count} ${end.era}`
  return start.count === end.count ? `${end.count} ${end.era}` : `${start.count} to ${end.count} ${end.era}`
}

function countInEra(year: number, step: number): { count: string; era: 'BCE' | 'CE' } {
  if (!Number.isFinite(year)) throw new RangeError(`cannot print ${year} as a year`)
  const isCommonEra = year >= 0.5
  const inEra = isCommonEra ? year : 1 - year
  const rounded = Math.max(1, Math.round(inEra / step) * step)
  return { count: groupThousands(String(rounded)), era: isCommonEra ? 'CE' : 'BCE' }
}
