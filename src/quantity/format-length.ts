import { trimZeros } from './format-number.ts'

/**
 * Prints a length given in centimetres in the unit that suits its size, to two digits (more from 100 m and
 * 100 km on): `4 mm`, `67 cm`, `1.2 m`, `3.4 km`; zero is `0 cm`. Throws a RangeError where it is not finite.
 */
export function formatCm(cm: number): string {
  const sign = cm < 0 ? '−' : ''
  const size = Math.abs(cm)
  if (size === 0) return '0 cm'
  if (size < 0.995) return `${sign}${shortNumber(size * 10)} mm`
  if (size < 99.5) return `${sign}${shortNumber(size)} cm`
  if (size < 99_950) return `${sign}${shortNumber(size / 100)} m`
  return `${sign}${shortNumber(size / 100_000)} km`
}

function shortNumber(value: number): string {
  return trimZeros(value, value < 99.5 ? 2 : Math.floor(Math.log10(value) + 1e-9) + 1)
}
