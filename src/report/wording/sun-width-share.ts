import { sunWidths } from './sun-widths.ts'

/** A shift along the horizon held against the Sun, for a sentence: `0.14 of the Sun’s width`, `17 times the Sun’s width`. */
export function sunWidthShare(count: number): string {
  return `${sunWidths(count)} ${Math.abs(count) < 0.995 ? 'of' : 'times'} the Sun’s width`
}
