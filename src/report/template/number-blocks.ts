import { visit } from 'unist-util-visit'
import type { DocumentTree } from '../document.ts'

/** The same tree with its figures, and its tables that have a caption, numbered from 1 in their order. */
export function numberBlocks(tree: DocumentTree): DocumentTree {
  const numbered = structuredClone(tree)
  let figures = 0
  let tables = 0
  visit(numbered, (node) => {
    if (node.type === 'figure') node.number = ++figures
    if (node.type === 'table' && node.data?.caption) node.data.number = ++tables
  })
  return numbered
}
