import { nearMiss } from '../../quantity/near-miss.ts'
import type { Problem } from '../../quantity/problem.ts'
import { type AttributeSpan, attributeSpans } from './attribute-spans.ts'
import type { AttributeRule, DirectiveRule } from './directives.ts'
import { problemAt } from './problem-at.ts'

/** What was written of one directive, as far as its attributes go. */
export interface WrittenAttributes {
  name: string
  attributes: Readonly<Record<string, string | null | undefined>>
  /** Its first line, and where that starts in the template. */
  line: string
  offset: number
}

/** Every attribute of a directive that is unknown, given twice, missing, or holds an unknown name. */
export function checkAttributes(written: WrittenAttributes, rule: DirectiveRule): Problem[] {
  const spans = attributeSpans(written.line)
  return [
    ...Object.entries(written.attributes).flatMap(([name, value]) => {
      const attribute = Object.hasOwn(rule.attributes, name) ? rule.attributes[name] : undefined
      const span = spans.find((one) => one.name === name)
      return attribute
        ? checkValue(written, { name, value: value ?? '' }, attribute, span)
        : [unknownAttribute(written, name, rule, span)]
    }),
    ...repeated(written, spans),
    ...missing(written, rule),
  ]
}

function checkValue(
  written: WrittenAttributes,
  given: { name: string; value: string },
  rule: AttributeRule,
  span: AttributeSpan | undefined,
): Problem[] {
  const words = rule.isList ? given.value.split(/\s+/).filter((word) => word !== '') : [given.value]
  const place = span
    ? { offset: written.offset + span.valueOffset, length: span.valueLength }
    : whole(written)
  const expected = `one of: ${rule.values.join(', ')}`
  if (words.length === 0) {
    const message = `\`${given.name}\` of \`${written.name}\` is empty`
    return [problemAt(place, 'unknown-value', message, { expected })]
  }
  return words
    .filter((word) => !rule.values.includes(word))
    .map((word) => {
      const within = span ? written.line.indexOf(word, span.valueOffset) : -1
      const at = within >= 0 && word !== '' ? { offset: written.offset + within, length: word.length } : place
      const message = `\`${word}\` is not a name that \`${given.name}\` of \`${written.name}\` knows`
      return problemAt(at, 'unknown-value', message, { expected, suggestion: nearMiss(word, rule.values) })
    })
}

function unknownAttribute(
  written: WrittenAttributes,
  name: string,
  rule: DirectiveRule,
  span: AttributeSpan | undefined,
): Problem {
  const known = Object.keys(rule.attributes)
  const place = span ? { offset: written.offset + span.nameOffset, length: name.length } : whole(written)
  return problemAt(place, 'unknown-attribute', `\`${written.name}\` has no attribute \`${name}\``, {
    expected: known.length > 0 ? `one of: ${known.join(', ')}` : 'no attributes',
    suggestion: nearMiss(name, known),
  })
}

function repeated(written: WrittenAttributes, spans: readonly AttributeSpan[]): Problem[] {
  return spans
    .filter((span, index) => spans.findIndex((other) => other.name === span.name) < index)
    .map((span) => {
      const place = { offset: written.offset + span.nameOffset, length: span.name.length }
      return problemAt(
        place,
        'repeated-attribute',
        `\`${span.name}\` stands twice in one \`${written.name}\``,
      )
    })
}

function missing(written: WrittenAttributes, rule: DirectiveRule): Problem[] {
  const known = Object.entries(rule.attributes)
  const lacking = known.filter(
    ([name, { isRequired }]) => isRequired && !Object.hasOwn(written.attributes, name),
  )
  const problems = lacking.map(([name, { values }]) =>
    problemAt(whole(written), 'missing-attribute', `\`${written.name}\` lacks its attribute \`${name}\``, {
      expected: `${name}="…" with one of: ${values.join(', ')}`,
    }),
  )
  const hasNone = known.length > 0 && Object.keys(written.attributes).length === 0
  if (problems.length > 0 || !hasNone) return problems
  const message = `\`${written.name}\` states no condition`
  const expected = `one or more of: ${known.map(([name]) => name).join(', ')}`
  return [problemAt(whole(written), 'missing-attribute', message, { expected })]
}

function whole(written: WrittenAttributes): { offset: number; length: number } {
  return { offset: written.offset, length: written.line.length }
}
