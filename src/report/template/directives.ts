import { CONDITIONS } from './conditions.ts'
import { FIGURES } from './figures.ts'
import { PARTS } from './parts.ts'
import { TABLES } from './tables.ts'
import { VALUES } from './values.ts'

/**
 * What a template may hold besides plain Markdown:
 *
 * | Written | Gives | Names stand in |
 * |---|---|---|
 * | `::part{of="finding"}` | paragraphs and lists about one matter | parts.ts |
 * | `::table{of="premise"}` | a numbered table with its caption; nothing where it would have no rows | tables.ts |
 * | `::figure{of="premise"}` | a numbered figure with its caption, or one for each sightline | figures.ts |
 * | `::figure[A caption of one's own.]{of="premise"}` | the same under that caption; tables likewise | |
 * | `:value{of="structure.name"}` | a word or number inside a sentence, a heading, a cell | values.ts |
 * | `::page` | a new page, where the output has pages | |
 * | `:::panel{kind="claim"}` … `:::` | a set-off block: `claim`, `finding` or `caution` | |
 * | `:::when{has="warnings"}` … `:::` | its content, where all its conditions hold | conditions.ts |
 *
 * Conditions of `when`: `has` and `lacks` name one thing or several, parted by spaces, that must all be there,
 * or all be missing; `outcome` names the outcomes for which it holds. What stands in a `when` or a `panel` may
 * hold further ones: the outer fence then needs more colons than the inner. Lists that only a `when` parts become
 * one list.
 */
export const DIRECTIVES: Readonly<Record<string, DirectiveRule>> = {
  part: { form: 'leaf', mayHaveLabel: false, attributes: { of: oneOf(PARTS) } },
  table: { form: 'leaf', mayHaveLabel: true, attributes: { of: oneOf(TABLES) } },
  figure: { form: 'leaf', mayHaveLabel: true, attributes: { of: oneOf(FIGURES) } },
  value: { form: 'text', mayHaveLabel: false, attributes: { of: oneOf(VALUES) } },
  page: { form: 'leaf', mayHaveLabel: false, attributes: {} },
  panel: {
    form: 'container',
    mayHaveLabel: false,
    attributes: { kind: { values: ['claim', 'finding', 'caution'], isRequired: true, isList: false } },
  },
  when: {
    form: 'container',
    mayHaveLabel: false,
    attributes: {
      outcome: { values: ['premise', 'carried', 'missed', 'none', 'open'], isRequired: false, isList: true },
      has: { values: Object.keys(CONDITIONS), isRequired: false, isList: true },
      lacks: { values: Object.keys(CONDITIONS), isRequired: false, isList: true },
    },
  },
}

export interface DirectiveRule {
  form: 'text' | 'leaf' | 'container'
  mayHaveLabel: boolean
  attributes: Readonly<Record<string, AttributeRule>>
}

export interface AttributeRule {
  values: readonly string[]
  isRequired: boolean
  /** Several values may stand in it, parted by spaces. */
  isList: boolean
}

function oneOf(registry: Readonly<Record<string, unknown>>): AttributeRule {
  return { values: Object.keys(registry), isRequired: true, isList: false }
}
