import type { Heading } from 'mdast'
import type { DocumentTree } from '../document.ts'
import { type FontFiles, fontFiles } from '../fonts/font-files.ts'
import { type Canvas, openCanvas } from './canvas.ts'
import { setBlocks } from './flow.ts'
import { headingNumbers } from './heading-numbers.ts'
import { plainText } from './inline-runs.ts'
import { createOutline } from './outline.ts'
import { paintPageFrame } from './page-frame.ts'
import { type Placed, paginate } from './paginate.ts'
import { paintPanels } from './panel-box.ts'
import { createShaper, type Shaper } from './shaper.ts'
import type { Painter } from './strip.ts'
import { FRAME } from './style.ts'
import { createTagger, type Tag } from './tagging.ts'

export interface PdfOptions {
  /** Stands in the file; the same tree and date give the same bytes. */
  readonly createdOn: Date
  /** Told of each character that no font has. */
  readonly warn: (message: string) => void
  /** Where the fonts are, if not in their usual place. */
  readonly fonts?: FontFiles
}

/**
 * Sets the document as a tagged A4 PDF with embedded fonts, bookmarks and running heads.
 * Throws on a node or a shape that it cannot print: the tree is made by this program, so that is a fault in it.
 */
export async function writePdf(tree: DocumentTree, options: PdfOptions): Promise<Uint8Array> {
  const heading = tree.children.find((node): node is Heading => node.type === 'heading' && node.depth === 1)
  const title = tree.data?.title ?? (heading ? plainText(heading) : 'Report')
  const canvas = await openCanvas({
    title,
    subject: tree.data?.subject,
    language: tree.data?.language ?? 'en',
    createdOn: options.createdOn,
    fonts: options.fonts ?? fontFiles(),
  })
  const shape = createShaper(canvas, options.warn)
  const root: Tag = { role: 'Document', parent: null }
  const column = { left: FRAME.left, width: FRAME.width, measure: FRAME.measure, tag: root }
  const setting = { shape, numberOf: headingNumbers(tree), title: heading }
  const pages = paginate(setBlocks(tree.children, column, setting), FRAME.height)
  paintPages(canvas, shape, pages, tree.data?.shortTitle ?? title)
  return bytesOf(canvas)
}

function paintPages(canvas: Canvas, shape: Shaper, pages: readonly Placed[][], shortTitle: string): void {
  const painter: Painter = { canvas, tagger: createTagger(canvas), outline: createOutline(canvas) }
  const filled = pages.length > 0 ? pages : [[]]
  for (const [index, placed] of filled.entries()) {
    canvas.addPage()
    paintPageFrame(painter, shape, shortTitle, { page: index + 1, pages: filled.length })
    paintPanels(painter, placed, FRAME.top)
    for (const { strip, top } of placed) strip.paint(painter, FRAME.top + top)
    painter.tagger.endPage()
  }
}

async function bytesOf(canvas: Canvas): Promise<Uint8Array> {
  canvas.end()
  const chunks: Uint8Array[] = []
  for await (const chunk of canvas) chunks.push(chunk)
  return new Uint8Array(Buffer.concat(chunks))
}
