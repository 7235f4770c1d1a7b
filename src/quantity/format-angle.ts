import { trimZeros } from './format-number.ts'

/**
 * Prints degrees as `57°54′28″` (`second`), `57°54′` (`minute`) or `57.9077°` (`decimal`), rounded to the last
 * unit shown; what rounds to zero has no sign. Throws a RangeError where the angle is not finite.
 */
export function formatDegrees(deg: number, unit: 'second' | 'minute' | 'decimal' = 'second'): string {
  requireFinite(deg)
  const unitsPerDegree = { second: 3600, minute: 60, decimal: 10_000 }[unit]
  const units = Math.round(Math.abs(deg) * unitsPerDegree)
  const sign = deg < 0 && units > 0 ? '−' : ''
  if (unit === 'decimal') return `${sign}${(units / unitsPerDegree).toFixed(4)}°`
  if (unit === 'minute') return `${sign}${Math.floor(units / 60)}°${pad(units % 60)}′`
  return `${sign}${Math.floor(units / 3600)}°${pad(Math.floor(units / 60) % 60)}′${pad(units % 60)}″`
}

/**
 * Prints a small angle in the unit that suits its size, to two or three digits: `20″`, `2.3′`, `23′`, `1°30′`;
 * zero is `0′`. Throws a RangeError where the angle is not finite.
 */
export function formatArcmin(arcmin: number): string {
  requireFinite(arcmin)
  return (arcmin < 0 ? '−' : '') + unsignedArcmin(Math.abs(arcmin))
}

function unsignedArcmin(arcmin: number): string {
  if (arcmin === 0) return '0′'
  const seconds = arcmin * 60
  if (seconds < 59.5) return `${trimZeros(seconds, 2)}″`
  const minutes = Math.round(arcmin)
  if (minutes < 60) return `${trimZeros(arcmin, 2)}′`
  return minutes % 60 === 0 ? `${minutes / 60}°` : `${Math.floor(minutes / 60)}°${pad(minutes % 60)}′`
}

function pad(count: number): string {
  return String(count).padStart(2, '0')
}

function requireFinite(angle: number): void {
  if (!Number.isFinite(angle)) throw new RangeError(`cannot print ${angle} as an angle`)
}
