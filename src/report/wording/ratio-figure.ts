import { formatNumber } from '../../quantity/format-number.ts'

/**
 * Prints a ratio of weights: `293`, `4.4`, `0.35`. One that overflows is given by its logarithm, as a power
 * of ten; null where no weight is left to compare.
 */
export function ratioFigure(ratio: { value: number | null; ln: number | null }): string | null {
  if (ratio.value !== null && ratio.value < 1e6 && ratio.value > 1e-3) {
    return formatNumber(ratio.value, ratio.value >= 100 ? 3 : 2)
  }
  if (ratio.ln === null || !Number.isFinite(ratio.ln)) return null
  const power = Math.round(ratio.ln / Math.LN10)
  return `about 10${superscript(power)}`
}

function superscript(power: number): string {
  const digits = [...String(Math.abs(power))].map((digit) => '⁰¹²³⁴⁵⁶⁷⁸⁹'[Number(digit)])
  return (power < 0 ? '⁻' : '') + digits.join('')
}
