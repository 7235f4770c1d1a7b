import type { PhrasingContent } from 'mdast'
import type { Canvas } from './canvas.ts'
import { inlineRuns, type Run } from './inline-runs.ts'
import { breakLines, type Line, type Piece } from './line-breaking.ts'
import type { Shaper } from './shaper.ts'
import { type Painter, type Strip, strip } from './strip.ts'
import { baselineOf, type TextStyle } from './style.ts'
import type { Tag } from './tagging.ts'

/** The lines of phrasing content in a column of this width. */
export function linesOf(
  children: readonly PhrasingContent[],
  style: TextStyle,
  width: number,
  shape: Shaper,
): Line[] {
  return linesOfRuns(inlineRuns(children, style), style, width, shape)
}

export function linesOfRuns(runs: readonly Run[], style: TextStyle, width: number, shape: Shaper): Line[] {
  return breakLines(runs, { width, balanced: style.balanced }, shape)
}

/** One strip a line; a page break leaves two lines at least on either side. */
export function lineStrips(lines: readonly Line[], style: TextStyle, left: number, tag: Tag): Strip[] {
  return lines.map((line, index) => {
    const paint = (painter: Painter, top: number) =>
      paintLine(painter, line, left, top + baselineOf(style), tag)
    const isSecondLast = index === lines.length - 2
    const keepWithNext = lines.length > 1 && (index === 0 || isSecondLast)
    return { ...strip(style.leading, paint), keepWithNext }
  })
}

/** Draws a line with its links and tags; a null tag draws what belongs to an artifact. */
export function paintLine(
  painter: Painter,
  line: Line,
  left: number,
  baseline: number,
  tag: Tag | null,
): void {
  if (!tag) {
    paintPieces(painter, line.pieces, left, baseline)
    return
  }
  for (const pieces of groupedByLink(line.pieces)) {
    const { link } = pieces[0]!.look
    const own = link ? painter.tagger.linkTag(link, tag) : tag
    painter.tagger.content(own, () => paintPieces(painter, pieces, left, baseline))
    if (!link) continue
    const [first, last] = [pieces[0]!, pieces.at(-1)!]
    const { size } = first.look
    const right = left + last.left + last.width
    painter.tagger.link(own, link, [left + first.left, baseline - 0.85 * size, right, baseline + 0.3 * size])
  }
}

function groupedByLink(pieces: readonly Piece[]): Piece[][] {
  const groups: Piece[][] = []
  for (const piece of pieces) {
    const last = groups.at(-1)
    if (last && last[0]!.look.link === piece.look.link) last.push(piece)
    else groups.push([piece])
  }
  return groups
}

function paintPieces({ canvas }: Painter, pieces: readonly Piece[], left: number, baseline: number): void {
  for (const { text, face, look, left: offset, width } of pieces) {
    const x = left + offset
    canvas.font(face, look.size).fillColor(look.colour)
    canvas.text(text, x, baseline, { lineBreak: false, baseline: 'alphabetic' })
    // A link's colour alone is lost in grey print.
    if (look.link) paintStroke(canvas, look.colour, 0.35, x, baseline + 0.17 * look.size, width)
    if (look.struck) paintStroke(canvas, look.colour, 0.6, x, baseline - 0.27 * look.size, width)
  }
}

function paintStroke(
  canvas: Canvas,
  colour: string,
  weight: number,
  x: number,
  y: number,
  width: number,
): void {
  canvas.lineWidth(weight).strokeColor(colour).moveTo(x, y)
  canvas.lineTo(x + width, y).stroke()
}
