import type { Nodes, Root } from 'mdast'
import { visit } from 'unist-util-visit'
import type { Problem } from '../../quantity/problem.ts'
import { checkDirective } from './check-directive.ts'
import { checkFences } from './check-fences.ts'
import { isDirective } from './directive-node.ts'
import { isComment } from './is-comment.ts'
import { firstLine, placeOf } from './place-of.ts'
import { problemAt } from './problem-at.ts'

/** What a template may use of Markdown, besides directives. */
const MARKDOWN = new Set([
  ...['root', 'paragraph', 'heading', 'list', 'listItem', 'blockquote', 'table', 'tableRow', 'tableCell'],
  ...['thematicBreak', 'code', 'text', 'emphasis', 'strong', 'inlineCode', 'link', 'break'],
])

/** A directive that stands in running text, where it means nothing: `::part{…}` or a fence of colons. */
const STRAY = /:{2,}[A-Za-z][\w-]*[ \t]*[[{]|^:{3,}[\w-]*[ \t]*$/gm

/** Everything in a template that cannot be rendered, whatever the audit; in the order of the text. */
export function checkTemplate(tree: Root, text: string): Problem[] {
  const problems = checkFences(tree, text)
  visit(tree, (node) => {
    problems.push(...checkNode(node, text))
  })
  if (tree.children.length === 0)
    problems.push(problemAt({ offset: 0, length: 1 }, 'empty-template', 'the template is empty'))
  return problems.sort((a, b) => a.offset - b.offset)
}

function checkNode(node: Nodes, text: string): Problem[] {
  if (isDirective(node)) return checkDirective(node, text)
  if (node.type === 'text') return strays(node, text)
  if (node.type === 'link') return checkLink(node.url, placeOf(node))
  if (MARKDOWN.has(node.type) || isComment(node)) return []
  const message = `a template cannot hold \`${firstLine(node, text)}\``
  const expected = 'text, headings, lists, tables, quotations, links in place, comments, directives'
  return [problemAt(placeOf(node), 'unsupported-markdown', message, { expected })]
}

function strays(node: Nodes, text: string): Problem[] {
  const { offset, length } = placeOf(node)
  return [...text.slice(offset, offset + length).matchAll(STRAY)].map((match) => {
    const place = { offset: offset + match.index, length: match[0].length }
    const message = `\`${match[0]}\` is not read as a directive here`
    const expected = 'it alone on its line, its braces directly after its name; every fence with its partner'
    return problemAt(place, 'stray-directive', message, { expected })
  })
}

function checkLink(url: string, place: { offset: number; length: number }): Problem[] {
  if (/^(https?:\/\/|mailto:|#)/i.test(url)) return []
  const message = `\`${url}\` is not an address a report may link to`
  return [
    problemAt(place, 'unsafe-link', message, { expected: 'an address that starts with https:// or http://' }),
  ]
}
