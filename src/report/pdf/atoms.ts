import type { Face } from '../fonts/font-faces.ts'
import type { Look, Run } from './inline-runs.ts'
import type { Shaper } from './shaper.ts'

/** Text of one look in one face. */
export interface Part {
  readonly text: string
  readonly face: Face
  readonly look: Look
  readonly width: number
}

/** What stays on one line, and the space that follows it where the line goes on. */
export interface Atom {
  readonly parts: readonly Part[]
  readonly width: number
  readonly space: Part | null
}

/**
 * Spaces; after a hyphen or dash inside a word; after a slash between letters. Not between digits: a year
 * range or a date keeps together.
 */
const OPPORTUNITY =
  /[ \u2000-\u2006\u2008-\u200a]+|\u200b|(?<=\p{L}[-\u2010\u2013\u2014])(?=[\p{L}\p{N}])|(?<=\p{N}[-\u2010\u2013\u2014])(?=\p{L})|(?<=\p{L}\/)(?=\p{L})/gu
const graphemes = new Intl.Segmenter('en', { granularity: 'grapheme' })

/** Cuts runs at every place where a line may end. */
export function atomsOf(runs: readonly Run[], shape: Shaper): Atom[] {
  const text = runs.map((run) => run.text).join('')
  const atoms: Atom[] = []
  let start = 0
  for (const gap of [...text.matchAll(OPPORTUNITY), null]) {
    const end = gap?.index ?? text.length
    const parts = partsBetween(runs, start, end, shape)
    const space = gap && /\s/.test(gap[0]) ? spaceAt(runs, end, gap[0], shape) : null
    const width = parts.reduce((sum, part) => sum + part.width, 0)
    if (parts.length > 0) atoms.push({ parts, width, space })
    start = end + (gap?.[0].length ?? 0)
  }
  return atoms
}

function partsBetween(runs: readonly Run[], start: number, end: number, shape: Shaper): Part[] {
  const parts: Part[] = []
  let offset = 0
  for (const run of runs) {
    const text = run.text.slice(Math.max(0, start - offset), Math.max(0, end - offset))
    if (text !== '') parts.push(...partsOf(text, run.look, shape))
    offset += run.text.length
  }
  return parts
}

function partsOf(text: string, look: Look, shape: Shaper): Part[] {
  return shape(text, look.face).map((segment) => ({ ...segment, look, width: segment.width * look.size }))
}

function spaceAt(runs: readonly Run[], index: number, gap: string, shape: Shaper): Part {
  let offset = 0
  const run = runs.find((candidate) => {
    offset += candidate.text.length
    return offset > index
  })
  return partsOf(gap.replace(/ +/, ' '), run!.look, shape)[0]!
}

/** An atom wider than the line as several; better after punctuation, as in addresses. */
export function cutToWidth(atom: Atom, width: number, shape: Shaper): Atom[] {
  if (atom.width <= width) return [atom]
  const letters = atom.parts.flatMap((part) =>
    [...graphemes.segment(part.text)].flatMap(({ segment }) => partsOf(segment, part.look, shape)),
  )
  const atoms: Atom[] = []
  for (let rest = letters; rest.length > 0; ) {
    const count = lettersThatFit(rest, width)
    const parts = joinParts(rest.slice(0, count), shape)
    rest = rest.slice(count)
    const partWidth = parts.reduce((sum, part) => sum + part.width, 0)
    atoms.push({ parts, width: partWidth, space: rest.length > 0 ? null : atom.space })
  }
  return atoms
}

function lettersThatFit(letters: readonly Part[], width: number): number {
  let sum = 0
  let count = 0
  while (count < letters.length && sum + letters[count]!.width <= width) sum += letters[count++]!.width
  if (count === letters.length) return count
  const good = letters.slice(0, count).findLastIndex((letter) => /[/?&=.,;:_-]/.test(letter.text)) + 1
  return good > count * 0.7 ? good : Math.max(1, count)
}

function joinParts(letters: readonly Part[], shape: Shaper): Part[] {
  const runs: { text: string; look: Look }[] = []
  for (const { text, look } of letters) {
    const last = runs.at(-1)
    if (last?.look === look) last.text += text
    else runs.push({ text, look })
  }
  return runs.flatMap(({ text, look }) => partsOf(text, look, shape))
}
