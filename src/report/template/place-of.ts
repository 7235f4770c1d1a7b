import type { Nodes } from 'mdast'

/** Where a node that was read from a text stands in it. */
export function placeOf(node: Nodes): { offset: number; length: number } {
  const offset = node.position?.start.offset ?? 0
  return { offset, length: (node.position?.end.offset ?? offset + 1) - offset }
}

/** The first line of a node as it stands in the text. */
export function firstLine(node: Nodes, text: string): string {
  const { offset, length } = placeOf(node)
  return text.slice(offset, offset + length).split(/\r\n|\r|\n/, 1)[0]!
}
