import type { Canvas, OutlineEntry } from './canvas.ts'
import { PAGE } from './style.ts'

/** Adds a bookmark to the page that is being drawn; `top` in page coordinates. */
export type Outline = (title: string, depth: number, top: number) => void

/** Bookmarks nested by the depth of their headings. */
export function createOutline(canvas: Canvas): Outline {
  const open: { depth: number; entry: OutlineEntry }[] = []
  return (title, depth, top) => {
    while (open.length > 0 && open.at(-1)!.depth >= depth) open.pop()
    const parent = open.at(-1)?.entry ?? canvas.outline
    // pdfkit measures `left` from the right edge of the page, so this is its left edge.
    const entry = parent.addItem(title, { fit: false, left: PAGE.width, top, zoom: 0, expanded: true })
    open.push({ depth, entry })
  }
}
