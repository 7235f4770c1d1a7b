import type { BlockContent, List, ListItem, Nodes, PhrasingContent, RootContent } from 'mdast'
import remarkParse from 'remark-parse'
import { unified } from 'unified'
import { paragraph, phrasing, strong, text } from './nodes.ts'

/**
 * Markdown from a claim file's notes, as far as it is harmless: paragraphs, emphasis, strong, lists, quotations,
 * inline code, line breaks, links to http and https. A heading becomes a bold line, so that it does not enter
 * the report's outline. Everything else (HTML, images, code blocks, other links) is kept as the characters that
 * were typed.
 */
export function safeMarkdown(source: string): BlockContent[] {
  const readable = source.replace(/[^\P{Cc}\t\r\n]|\p{Surrogate}/gu, '')
  const tree = unified().use(remarkParse).parse(readable)
  return tree.children.flatMap((node) => block(node, readable))
}

function block(node: RootContent, source: string): BlockContent[] {
  switch (node.type) {
    case 'paragraph':
      return [paragraph(...inline(node.children, source))]
    case 'heading':
      return [paragraph(strong(...inline(node.children, source)))]
    case 'blockquote':
      return [{ type: 'blockquote', children: node.children.flatMap((child) => block(child, source)) }]
    case 'list':
      return [list(node, source)]
    default:
      return [paragraph(...lines(asTyped(node, source)))]
  }
}

function list(node: List, source: string): List {
  const children = node.children.map(
    (item): ListItem => ({
      type: 'listItem',
      spread: item.spread ?? false,
      children: item.children.flatMap((child) => block(child, source)),
    }),
  )
  const start = node.ordered ? { start: node.start ?? 1 } : {}
  return { type: 'list', ordered: node.ordered ?? false, ...start, spread: node.spread ?? false, children }
}

function inline(nodes: readonly PhrasingContent[], source: string): PhrasingContent[] {
  return phrasing(nodes.map((node) => phrase(node, source)))
}

function phrase(node: PhrasingContent, source: string): PhrasingContent {
  switch (node.type) {
    case 'text':
    case 'inlineCode':
      return { type: node.type, value: node.value }
    case 'break':
      return { type: 'break' }
    case 'emphasis':
    case 'strong':
      return { type: node.type, children: inline(node.children, source) }
    case 'link':
      if (!/^https?:\/\//i.test(node.url)) return text(asTyped(node, source))
      return { type: 'link', url: node.url, children: inline(node.children, source) }
    default:
      return text(asTyped(node, source))
  }
}

function asTyped(node: Nodes, source: string): string {
  return source.slice(node.position?.start.offset, node.position?.end.offset)
}

function lines(typed: string): PhrasingContent[] {
  const [first = '', ...rest] = typed.split(/\r\n|\r|\n/)
  return [text(first), ...rest.flatMap((line): PhrasingContent[] => [{ type: 'break' }, text(line)])]
}
