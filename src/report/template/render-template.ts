import type { Heading, Root } from 'mdast'
import { visit } from 'unist-util-visit'
import type { Audit } from '../../audit/audit.ts'
import type { Problem } from '../../quantity/problem.ts'
import type { DocumentTree } from '../document.ts'
import { plainText } from '../plain-text.ts'
import { checkTemplate } from './check-template.ts'
import { cleanStrings } from './clean-strings.ts'
import { numberBlocks } from './number-blocks.ts'
import { parseTemplate } from './parse-template.ts'
import { renderBlocks } from './render-blocks.ts'

/**
 * Fills a template with an audit. Every problem of the template is reported, at its offset in the template's
 * text, also inside a `when` that this audit leaves out; the tree is null where there is one.
 */
export function renderTemplate(
  templateText: string,
  audit: Audit,
): { tree: DocumentTree | null; problems: Problem[] } {
  const template = parseTemplate(templateText)
  const problems = checkTemplate(template, templateText)
  if (problems.length > 0) return { tree: null, problems }
  const cleaned: Audit = { ...cleanStrings(audit), claim: audit.claim }
  const children = renderBlocks(template.children, { audit: cleaned, text: templateText }) as Root['children']
  const tree: DocumentTree = { type: 'root', children, data: describe(children, cleaned) }
  return { tree: numberBlocks(tree), problems }
}

function describe(children: Root['children'], audit: Audit): NonNullable<DocumentTree['data']> {
  let title: Heading | undefined
  visit({ type: 'root', children } satisfies Root, 'heading', (heading) => {
    if (heading.depth === 1) title ??= heading
  })
  return {
    title: title ? plainText(title) : audit.structure.name,
    shortTitle: audit.structure.name,
    language: 'en-GB',
    subject: audit.statement,
  }
}
