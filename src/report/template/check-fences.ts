import type { Root } from 'mdast'
import { visit } from 'unist-util-visit'
import type { Problem } from '../../quantity/problem.ts'
import type { Directive } from './directive-node.ts'
import { firstLine, placeOf } from './place-of.ts'
import { problemAt } from './problem-at.ts'

/**
 * Containers that are not closed as they should be. The parser accepts them silently: one that is never closed
 * swallows the rest of the template, and one that holds another with as many colons is closed by the fence that
 * was meant for the inner one.
 */
export function checkFences(tree: Root, text: string): Problem[] {
  const problems: Problem[] = []
  const explained = new Set<Directive>()
  visit(tree, 'containerDirective', (node) => {
    const inner = containersIn(node).filter((each) => colonsOf(each, text) >= colonsOf(node, text))
    for (const each of inner) explained.add(each)
    if (inner.length > 0) problems.push(crowded(node, inner[0]!, text))
    else if (!explained.has(node) && !isClosed(node, text)) problems.push(unclosed(node, text))
  })
  return problems
}

function containersIn(outer: Directive): Directive[] {
  const found: Directive[] = []
  visit(outer, 'containerDirective', (node) => {
    if (node !== outer) found.push(node)
  })
  return found
}

function isClosed(node: Directive, text: string): boolean {
  const { offset, length } = placeOf(node)
  const end = offset + length
  const lines = text.slice(offset, end).split(/\r\n|\r|\n/)
  const fence = lines.length > 1 ? lines.at(-1)!.match(/^[ \t>]*(:{3,})[ \t]*$/) : null
  const contentEnd = node.children.at(-1)?.position?.end.offset ?? offset
  return fence !== null && fence[1]!.length >= colonsOf(node, text) && contentEnd <= end - fence[0].length
}

function unclosed(node: Directive, text: string): Problem {
  const fence = ':'.repeat(colonsOf(node, text))
  const place = { offset: placeOf(node).offset, length: firstLine(node, text).length }
  const expected = `a line of \`${fence}\` after its content`
  return problemAt(place, 'unclosed-container', `\`${fence}${node.name}\` is never closed`, { expected })
}

function crowded(node: Directive, inner: Directive, text: string): Problem {
  const fence = ':'.repeat(colonsOf(node, text))
  const place = { offset: placeOf(node).offset, length: firstLine(node, text).length }
  const message = `\`${fence}${node.name}\` is still open where \`${inner.name}\` begins with as many colons`
  const expected = `a line of \`${fence}\` before that; or, where the one is meant to hold the other, more colons outside`
  return problemAt(place, 'crowded-container', message, { expected })
}

function colonsOf(node: Directive, text: string): number {
  return firstLine(node, text).match(/^:+/)![0].length
}
