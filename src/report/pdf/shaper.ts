import type { Face } from '../fonts/font-faces.ts'
import type { Canvas } from './canvas.ts'

/** A stretch of text that one face has every character of; `width` is for a size of one point. */
export interface Segment {
  readonly text: string
  readonly face: Face
  readonly width: number
}

/** Cuts text into stretches that can be drawn, and measures them. */
export type Shaper = (text: string, face: Face) => readonly Segment[]

const graphemes = new Intl.Segmenter('en', { granularity: 'grapheme' })
const ONLY_PLAIN_LETTERS = /^[ -~]*$/
/** Directions, joiners and variation selectors print nothing. */
const INVISIBLE = /\p{Default_Ignorable_Code_Point}/gu
const isInvisible = (character: string) => /\p{Default_Ignorable_Code_Point}/u.test(character)

/**
 * pdfkit draws an empty box for a character its font lacks. So each character goes to the first face that has
 * it: the wished one, then the fallback; one that no face has is printed as � and reported once, with the
 * word it stands in.
 */
export function createShaper(canvas: Canvas, warn: (message: string) => void): Shaper {
  const known = new Map<string, readonly Segment[]>()
  const reported = new Set<string>()
  const covers = createCoverage(canvas)

  function drawable(grapheme: string, face: Face, word: string): FacedText {
    const visible = grapheme.replace(INVISIBLE, '')
    if (covers(face, visible)) return { text: visible, face }
    if (covers('fallback', visible)) return { text: visible, face: 'fallback' }
    if (!reported.has(grapheme)) warn(missingCharacter(grapheme, word))
    reported.add(grapheme)
    return { text: '\ufffd', face: 'fallback' }
  }

  function facedTexts(text: string, face: Face): FacedText[] {
    if (covers(face, text)) return [{ text, face }]
    const parts = [...graphemes.segment(text)]
    return joinFaces(parts.map((part) => drawable(part.segment, face, text.trim())))
  }

  return (text, face) => {
    const key = `${face} ${text}`
    const result =
      known.get(key) ??
      facedTexts(printableForm(text), face).map((part) => {
        return { ...part, width: measure(canvas, part.text, part.face) }
      })
    known.set(key, result)
    return result
  }
}

interface FacedText {
  readonly text: string
  readonly face: Face
}

/** Spaces and hyphens at which no line may break look like the ordinary ones, which every face has. */
function printableForm(text: string): string {
  if (ONLY_PLAIN_LETTERS.test(text)) return text
  return text
    .normalize('NFC')
    .replace(/\u00a0/g, ' ')
    .replace(/\u202f/g, '\u2009')
    .replace(/\u2011/g, '-')
}

/** Whether a face has all characters of a text; those that print nothing count as missing. */
function createCoverage(canvas: Canvas): (face: Face, text: string) => boolean {
  const known = new Map<string, boolean>()
  const ask = (face: Face, character: string) => {
    const { font } = canvas.font(face, 1)._font
    return !isInvisible(character) && font.hasGlyphForCodePoint(character.codePointAt(0)!)
  }
  return (face, text) => {
    for (const character of text) {
      const key = `${face} ${character}`
      const covered = known.get(key) ?? ask(face, character)
      known.set(key, covered)
      if (!covered) return false
    }
    return true
  }
}

function joinFaces(parts: readonly FacedText[]): FacedText[] {
  const joined: FacedText[] = []
  for (const { text, face } of parts) {
    const last = joined.at(-1)
    if (last?.face === face) joined[joined.length - 1] = { text: last.text + text, face }
    else joined.push({ text, face })
  }
  return joined
}

function measure(canvas: Canvas, text: string, face: Face): number {
  canvas.font(face, 1)
  // pdfkit shapes a line word by word, each with the space after it, and keeps what it has shaped: measured
  // in the same pieces, no word is shaped twice.
  return canvas.widthOfString(`${text} `) - canvas.widthOfString(' ')
}

function missingCharacter(grapheme: string, word: string): string {
  const codes = [...grapheme].map((character) => character.codePointAt(0)!.toString(16).toUpperCase())
  const names = codes.map((code) => `U+${code.padStart(4, '0')}`).join(' ')
  return `no font has the character \`${grapheme}\` (${names}) in \`${word}\`; the PDF prints \ufffd in its place`
}
