const SUPERSCRIPTS = '⁰¹²³⁴⁵⁶⁷⁸⁹'

/**
 * Prints a number with so many significant digits, trailing zeros kept: a true minus sign, commas between
 * thousands from five digits on, powers of ten beyond a thousand million and below a millionth. Zero is `0`.
 * Throws a RangeError where the value is not finite: such a value has no place in print.
 */
export function formatNumber(value: number, significant: number): string {
  if (!Number.isFinite(value)) throw new RangeError(`cannot print ${value} as a number`)
  if (value === 0) return '0'
  const [mantissa, exponent] = Math.abs(value)
    .toExponential(significant - 1)
    .split('e') as [string, string]
  const power = Number(exponent)
  const sign = value < 0 ? '−' : ''
  if (power >= 9 || power < -6) return `${sign}${mantissa} × 10${superscript(power)}`
  return sign + groupThousands(plainDigits(mantissa, power, significant))
}

/** Like `formatNumber`, with a plus sign before what is positive. */
export function formatSigned(value: number, significant: number): string {
  return (value > 0 ? '+' : '') + formatNumber(value, significant)
}

/** Like `formatNumber`, without zeros at the end of the fraction: `2` for 2.0. */
export function trimZeros(value: number, significant: number): string {
  return formatNumber(value, significant)
    .replace(/(\.\d*?)0+(?=$| )/, '$1')
    .replace(/\.(?=$| )/, '')
}

/** Puts commas between thousands where the whole part has five digits or more: `9601`, `11,881`. */
export function groupThousands(digits: string): string {
  const [whole = '', fraction] = digits.split('.')
  const grouped = whole.length < 5 ? whole : whole.replace(/\B(?=(\d{3})+$)/g, ',')
  return fraction === undefined ? grouped : `${grouped}.${fraction}`
}

function plainDigits(mantissa: string, power: number, significant: number): string {
  const digits = mantissa.replace('.', '')
  if (power < 0) return `0.${'0'.repeat(-power - 1)}${digits}`
  if (power >= significant - 1) return digits + '0'.repeat(power - significant + 1)
  return `${digits.slice(0, power + 1)}.${digits.slice(power + 1)}`
}

function superscript(power: number): string {
  const digits = [...String(Math.abs(power))].map((digit) => SUPERSCRIPTS[Number(digit)])
  return (power < 0 ? '⁻' : '') + digits.join('')
}
