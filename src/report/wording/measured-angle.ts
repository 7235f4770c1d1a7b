import { formatArcmin, formatDegrees } from '../../quantity/format-angle.ts'
import { fixed } from './fixed.ts'

/** Prints a direction or altitude with its standard deviation, to seconds where that is finer than 1′. */
export function measuredDegrees(measured: { value: number; sd: number }): string {
  const sdArcmin = measured.sd * 60
  const value = formatDegrees(measured.value, sdArcmin < 1 ? 'second' : 'minute')
  return `${value} ± ${formatArcmin(sdArcmin)}`
}

/** Prints a small angle in minutes with its standard deviation, where that shows: `20.3′ ± 2.0′`, `16.31′`. */
export function measuredArcmin({ value, sd }: { value: number; sd: number }): string {
  return sd < 0.05 ? `${fixed(value, 2)}′` : `${fixed(value, 1)}′ ± ${fixed(sd, 1)}′`
}
