import { visit } from 'unist-util-visit'
import type { DocumentTree } from './document.ts'
import { writeSvg } from './write-svg.ts'

/** Every figure of a document as an SVG file's content, in their order; one that stands twice is one file. */
export function figuresOf(tree: DocumentTree): { name: string; svg: string }[] {
  const files = new Map<string, string>()
  visit(tree, 'figure', ({ name, drawing }) => {
    if (!files.has(name)) files.set(name, writeSvg(drawing))
  })
  return [...files].map(([name, svg]) => ({ name, svg }))
}
