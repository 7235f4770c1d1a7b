/** Degrees for a message, to four decimals at most: `40.1233°`, `−0.5°`, `118°`. */
export function degreesText(deg: number): string {
  return `${Number(deg.toFixed(4))}°`.replace('-', '−')
}
