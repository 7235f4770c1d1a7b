import { sunWidths } from './sun-widths.ts'

/** A shift along the horizon for a label: `0.14 Sun’s widths`, `1 Sun’s width`. */
export function sunWidthCount(count: number): string {
  const printed = sunWidths(count)
  return `${printed} Sun’s ${printed === '1' ? 'width' : 'widths'}`
}
