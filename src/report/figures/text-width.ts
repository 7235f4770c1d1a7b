/** Widths in thousandths of the type size: the larger of Source Sans 3 Regular's and Helvetica's (its AFM). */
const WIDTHS: readonly (readonly [number, string])[] = [
  [260, "'‘’ijl|′"],
  [280, ' ,.:;I·'],
  [300, '!f'],
  [320, '[]'],
  [340, '()-t{}'],
  [360, '/\\r'],
  [420, '*°'],
  [440, '"“”″'],
  [500, 'J^cksvxyz'],
  [560, '#$£0123456789?L_`abdeghnopqu–'],
  [600, '+<=>~−±≤≥×≈'],
  [620, 'FTZ→↑↓'],
  [680, '&ABEKPSVXY'],
  [740, 'CDHNRUw'],
  [780, 'GOQ'],
  [840, 'Mm½¼'],
  [900, '%'],
  [960, 'W'],
  [1020, '@—…'],
]

const WIDTH_OF = new Map(WIDTHS.flatMap(([width, characters]) => [...characters].map((c) => [c, width])))

/** Other letters with an alphabet, and everything from the Hangul and Chinese blocks on. */
const OTHER = 780
const SQUARE = 1020
const SEMIBOLD = 1.1

/**
 * An estimate, on the safe side, of how wide a text prints, in the unit of `size`. It holds for the figures' own
 * face and for the Helvetica or Arial that stands in for it where the face is not installed.
 */
export function textWidth(content: string, size: number, weight: 400 | 600 = 400): number {
  const thousandths = [...content].reduce((sum, character) => sum + characterWidth(character), 0)
  return (thousandths / 1000) * size * (weight === 600 ? SEMIBOLD : 1)
}

/** Whether the estimate rests on each character's own width, and not on a guess at a script it does not know. */
export function isWidthKnown(content: string): boolean {
  const characters = [...content]
  return characters.length > 0 && characters.every((character) => WIDTH_OF.has(baseOf(character)))
}

/** The text, or as much of its beginning as fits into `width`, with an ellipsis. */
export function fitText(content: string, width: number, size: number, weight: 400 | 600 = 400): string {
  if (textWidth(content, size, weight) <= width) return content
  const characters = [...content]
  while (characters.length > 1 && textWidth(`${characters.join('')}…`, size, weight) > width) characters.pop()
  return `${characters.join('').trimEnd()}…`
}

function characterWidth(character: string): number {
  const known = WIDTH_OF.get(character) ?? WIDTH_OF.get(baseOf(character))
  if (known !== undefined) return known
  return (character.codePointAt(0) ?? 0) >= 0x1100 ? SQUARE : OTHER
}

/** A letter without its accents, which add nothing to its width. */
function baseOf(character: string): string {
  return character.normalize('NFD').slice(0, 1)
}
