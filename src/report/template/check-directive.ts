import { nearMiss } from '../../quantity/near-miss.ts'
import type { Problem } from '../../quantity/problem.ts'
import { checkAttributes } from './check-attributes.ts'
import { type Directive, isPlainText } from './directive-node.ts'
import { DIRECTIVES, type DirectiveRule } from './directives.ts'
import { firstLine, placeOf } from './place-of.ts'
import { problemAt } from './problem-at.ts'

const COLONS = { text: ':', leaf: '::', container: ':::' } as const

/** Everything wrong with one directive by itself: its name, its form, its attributes. */
export function checkDirective(node: Directive, text: string): Problem[] {
  if (isPlainText(node)) return []
  const rule = Object.hasOwn(DIRECTIVES, node.name) ? DIRECTIVES[node.name] : undefined
  if (!rule) return [unknownDirective(node, text)]
  const line = firstLine(node, text)
  const written = { name: node.name, attributes: node.attributes ?? {}, line, offset: placeOf(node).offset }
  return [...checkForm(node, rule, line), ...checkAttributes(written, rule)]
}

function unknownDirective(node: Directive, text: string): Problem {
  const known = Object.keys(DIRECTIVES)
  const near = nearMiss(node.name, known)
  const colons = firstLine(node, text).match(/^:+/)![0]
  const place = { offset: placeOf(node).offset, length: colons.length + node.name.length }
  return problemAt(place, 'unknown-directive', `there is no directive \`${colons}${node.name}\``, {
    expected: `one of: ${known.map((name) => COLONS[DIRECTIVES[name]!.form] + name).join(', ')}`,
    suggestion: near && COLONS[DIRECTIVES[near]!.form] + near,
  })
}

function checkForm(node: Directive, rule: DirectiveRule, line: string): Problem[] {
  const place = { offset: placeOf(node).offset, length: line.length }
  const hasForm = node.type === `${rule.form}Directive`
  if (!hasForm) {
    const where = rule.form === 'text' ? 'inside a paragraph' : 'on a line of its own'
    const message = `\`${node.name}\` is written \`${COLONS[rule.form]}${node.name}\`, ${where}`
    const expected = `that form, or \`\\:${node.name}\` where a colon before a word is meant`
    return [
      problemAt(place, 'directive-form', message, { expected, suggestion: COLONS[rule.form] + node.name }),
    ]
  }
  if (rule.mayHaveLabel || !hasLabel(node)) return []
  return [problemAt(place, 'directive-label', `\`${node.name}\` takes no text in square brackets`)]
}

function hasLabel(node: Directive): boolean {
  if (node.type !== 'containerDirective') return node.children.length > 0
  const first = node.children[0]
  return first?.type === 'paragraph' && first.data?.directiveLabel === true
}
