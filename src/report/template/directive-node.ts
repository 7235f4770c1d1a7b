import type { Nodes } from 'mdast'
import type {} from 'remark-directive'
import { DIRECTIVES } from './directives.ts'

/** A directive as the parser gives it, known or not. */
export type Directive = Extract<Nodes, { type: 'textDirective' | 'leafDirective' | 'containerDirective' }>

export function isDirective(node: Nodes): node is Directive {
  return node.type === 'textDirective' || node.type === 'leafDirective' || node.type === 'containerDirective'
}

/** `12:30` and `foo:bar` look like directives to the parser but are text; one with attributes is meant. */
export function isPlainText(node: Directive): boolean {
  const hasAttributes = Object.keys(node.attributes ?? {}).length > 0
  return node.type === 'textDirective' && !Object.hasOwn(DIRECTIVES, node.name) && !hasAttributes
}
