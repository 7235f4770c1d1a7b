/** Prints a number with so many decimals and a true minus sign. Throws a RangeError where it is not finite. */
export function fixed(value: number, decimals: number): string {
  if (!Number.isFinite(value)) throw new RangeError(`cannot print ${value} as a number`)
  const digits = Math.abs(value).toFixed(decimals)
  return value < 0 && Number(digits) !== 0 ? `−${digits}` : digits
}
