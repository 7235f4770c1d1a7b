import type { Nodes } from 'mdast'

/** A comment says something to who edits the template; it is not rendered. */
export function isComment(node: Nodes): boolean {
  return node.type === 'html' && /^<!--(?:(?!-->)[\s\S])*-->$/.test(node.value.trim())
}
