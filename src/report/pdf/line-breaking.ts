import { type Atom, atomsOf, cutToWidth, type Part } from './atoms.ts'
import type { Run } from './inline-runs.ts'
import type { Shaper } from './shaper.ts'

/** Text in one face at its place in a line. */
export interface Piece extends Part {
  /** From the left end of the line. */
  readonly left: number
}

export interface Line {
  readonly pieces: readonly Piece[]
  /** Without the space at its end. */
  readonly width: number
}

export interface Measure {
  /** Of the lines. */
  readonly width: number
  /** Whether the last line should be about as long as the others. */
  readonly balanced: boolean
}

/** Breaks runs into lines no wider than asked for; a word wider than a line is cut. Always at least one line. */
export function breakLines(runs: readonly Run[], measure: Measure, shape: Shaper): Line[] {
  const paragraphs = splitAtForcedBreaks(runs)
  return paragraphs.flatMap((paragraph) => {
    const atoms = atomsOf(paragraph, shape).flatMap((atom) => cutToWidth(atom, measure.width, shape))
    return bestBreaks(atoms, measure).map(([from, to]) => lineOf(atoms.slice(from, to), to === atoms.length))
  })
}

function splitAtForcedBreaks(runs: readonly Run[]): Run[][] {
  const paragraphs: Run[][] = [[]]
  for (const run of runs) {
    if (run.text === '\n') paragraphs.push([])
    else paragraphs.at(-1)!.push(run)
  }
  return paragraphs
}

/**
 * The breaks that make the lines most alike: least sum of the squares of the space left over, over all ways to
 * break (after Knuth & Plass 1981, without stretching or hyphens).
 */
function bestBreaks(atoms: readonly Atom[], { width, balanced }: Measure): [number, number][] {
  const best: { cost: number; from: number }[] = [{ cost: 0, from: 0 }]
  for (let to = 1; to <= atoms.length; to++) {
    best[to] = { cost: Number.POSITIVE_INFINITY, from: to - 1 }
    for (let from = to - 1, length = 0; from >= 0; from--) {
      length += atoms[from]!.width + (from < to - 1 ? (atoms[from]!.space?.width ?? 0) : 0)
      if (length > width && from < to - 1) break
      const cost = best[from]!.cost + lineCost(length / width, to === atoms.length, balanced)
      if (cost <= best[to]!.cost) best[to] = { cost, from }
    }
  }
  const breaks: [number, number][] = []
  for (let to = atoms.length; to > 0; to = best[to]!.from) breaks.unshift([best[to]!.from, to])
  return breaks.length > 0 ? breaks : [[0, 0]]
}

function lineCost(filled: number, isLast: boolean, balanced: boolean): number {
  const slack = Math.max(0, 1 - filled)
  if (!isLast || balanced) return slack ** 2
  return filled < 0.15 ? 0.04 : 0
}

function lineOf(atoms: readonly Atom[], isLast: boolean): Line {
  const parts = atoms.flatMap(({ parts, space }) => (space ? [...parts, space] : parts))
  const pieces: Piece[] = []
  let left = 0
  for (const part of parts) {
    const last = pieces.at(-1)
    if (last && last.look === part.look && last.face === part.face) {
      pieces[pieces.length - 1] = { ...last, text: last.text + part.text, width: last.width + part.width }
    } else pieces.push({ ...part, left })
    left += part.width
  }
  const width = left - (atoms.at(-1)?.space?.width ?? 0)
  const last = pieces.pop()
  if (!last) return { pieces, width }
  // The last word of all has a space after it too, so that what reads the file keeps it from the next cell's.
  const text = isLast ? `${last.text.trimEnd()} ` : last.text
  return { pieces: [...pieces, { ...last, text, width: width - last.left }], width }
}
