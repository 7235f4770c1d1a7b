import type { Nodes } from 'mdast'

/** The words of a node without their marks, as one line. */
export function plainText(node: Nodes): string {
  if (node.type === 'break') return ' '
  if ('value' in node) return node.value
  if ('children' in node) return node.children.map(plainText).join('')
  return ''
}
