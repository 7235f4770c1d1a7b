import { readFileSync } from 'node:fs'
import type { Nodes, RootContent } from 'mdast'
import { visit } from 'unist-util-visit'
import { describe, expect, it } from 'vitest'
import type { Audit, Outcome } from '../../src/audit/audit.ts'
import { builtInTemplateNames } from '../../src/report/built-in-templates.ts'
import type { DocumentTree } from '../../src/report/document.ts'
import { figuresOf } from '../../src/report/figures-of.ts'
import { plainText } from '../../src/report/plain-text.ts'
import { renderTemplate } from '../../src/report/template/render-template.ts'
import { writeMarkdown } from '../../src/report/write-markdown.ts'
import { auditOfKind, completeAudit, KINDS, OUTCOMES, severalLinesAudit } from './complete-audit.ts'

const TEMPLATE = readFileSync(new URL('../../templates/audit.md', import.meta.url), 'utf8')

const rendered = new Map<Audit, DocumentTree>()

function render(audit: Audit): DocumentTree {
  const known = rendered.get(audit)
  if (known) return known
  const { tree, problems } = renderTemplate(TEMPLATE, audit)
  expect(problems).toEqual([])
  rendered.set(audit, tree!)
  return tree!
}

function markdownOf(audit: Audit): string {
  return writeMarkdown(render(audit), { figurePath: (name) => `thornmere-${name}.svg` })
}

function headings(audit: Audit): string[] {
  return render(audit)
    .children.filter((node) => node.type === 'heading')
    .map(plainText)
}

function pageOne(audit: Audit): RootContent[] {
  const { children } = render(audit)
  return children.slice(
    0,
    children.findIndex((node) => node.type === 'pageBreak'),
  )
}

function words(node: Nodes): number {
  const inner = 'children' in node ? node.children : []
  return inner.length > 0 && node.type !== 'paragraph'
    ? inner.reduce((sum, child) => sum + words(child), 0)
    : plainText(node).split(/\s+/).filter(Boolean).length
}

const AUDITS: readonly (readonly [name: string, audit: Audit])[] = [
  ...OUTCOMES.flatMap((outcome) => [
    [`${outcome}, one line`, completeAudit(outcome)] as const,
    [`${outcome}, two lines`, severalLinesAudit(outcome)] as const,
    [`${outcome}, nothing but the figures`, bareAudit(outcome)] as const,
  ]),
  ...KINDS.map((kind) => [kind, auditOfKind(kind)] as const),
]

/** As little as an audit can hold. */
function bareAudit(outcome: Outcome): Audit {
  const { sightlines } = completeAudit(outcome)
  const unsurveyed = { survey: [], skyline: null, refraction_check: null }
  return completeAudit(outcome, {
    ...{ plan: { north: null, points: [], lines: [] }, placements: [], attachments: [] },
    sightlines: sightlines.map((line) => ({ ...line, ...unsurveyed })),
    ...{ source: null, claim: {}, findings: [], assumptions: [], checks: [], reproduction: [], budget: [] },
    ...{ alternatives: [], warnings: [], references: [], assumed_precision_arcmin: null, today: [] },
  })
}

describe.each(AUDITS)('the report of an audit: %s', (_, audit) => {
  it('prints no value that is missing', () => {
    expect(markdownOf(audit)).not.toMatch(/NaN|Infinity|undefined|\bnull\b|\[object|\bfalse\b|\btrue,/)
  })

  it('leaves no gap in a sentence where a value is missing', () => {
    visit(render(audit), 'paragraph', (node) => {
      expect(plainText(node)).not.toMatch(/ {2}|^ | $| [,.;:]|(?<![A-Z])[,.;:]{2}|\( *\)|“”/)
      expect(plainText(node)).toMatch(/[.!?:”’)]$|^The (claim as stated|finding)$/)
    })
  })

  it('stands alone on page one: title, claim as stated, finding, main figure', () => {
    const [title, claim, finding, figure, ...rest] = pageOne(audit)
    expect(rest).toEqual([])
    expect(plainText(title!)).toBe('Audit of a dating claim: Thornmere court')
    expect(claim).toMatchObject({ type: 'panel', kind: 'claim' })
    expect(plainText(claim!)).toContain(`“${audit.statement}”`)
    expect(plainText(claim!)).toContain(audit.source ?? 'The claim names no source.')
    expect(plainText(claim!)).toContain(audit.asserted.printed)
    for (const date of audit.other_dates)
      expect(plainText(claim!)).toContain(`${date.label} (${date.printed})`)
    expect(finding).toMatchObject({ type: 'panel', kind: 'finding' })
    expect(figure).toMatchObject({ type: 'figure', name: 'premise', number: 1 })
  })

  it('adds no words to the finding but its lead', () => {
    const [, , finding] = pageOne(audit)
    const stated = audit.summary.join(' ').split(' ').length
    expect(words(finding!) - stated).toBeLessThanOrEqual(2)
  })

  it('keeps the caption of the main figure short enough for page one', () => {
    const figure = pageOne(audit).at(-1)!
    expect(plainText(figure).split(' ').length).toBeLessThanOrEqual(100)
  })

  it('uses no words of verdict', () => {
    expect(markdownOf(audit)).not.toMatch(
      /pseudo|fraud|crank|hoax|debunk|nonsens|absurd|ridicul|fringe|amateur|naive|bogus|mistaken|liar|expert/i,
    )
  })

  it('has a file for each figure, under the name the Markdown shows', () => {
    const tree = render(audit)
    const files = figuresOf(tree)
    const names = files.map(({ name }) => name)
    expect(names[0]).toBe('premise')
    const lines = audit.sightlines
    const horizons = lines.filter(({ skyline }) => skyline !== null)
    const plans = audit.plan.lines.length > 0 ? 1 : 0
    expect(names).toHaveLength(1 + plans + horizons.length + lines.length)
    expect(new Set(names).size).toBe(names.length)
    for (const { name, svg } of files) {
      expect(svg).toContain('<svg')
      expect(markdownOf(audit)).toContain(`(thornmere-${name}.svg)`)
    }
  })
})

describe('the order of the sections', () => {
  const FIXED_START = ['Audit of a dating claim: Thornmere court', 'How the date depends on the premise']
  const FIXED_MIDDLE = ['The target’s track and the dates that fit']
  const FIXED_END = ['What this audit does not say', 'Cautions', 'Methods', 'References', 'Provenance']

  it.each(OUTCOMES)('all of them: %s', (outcome) => {
    expect(headings(completeAudit(outcome))).toEqual([
      ...FIXED_START,
      'The survey, the horizon and the place of the target',
      ...FIXED_MIDDLE,
      'Does it work today?',
      'Does the arithmetic reproduce?',
      'Other readings of the same stones',
      'Uncertainty budget',
      'What the claim leaves open',
      'Warnings',
      'Notes in the claim file',
      ...FIXED_END,
    ])
  })

  it.each(OUTCOMES)('without the sections that have nothing to say: %s', (outcome) => {
    expect(headings(bareAudit(outcome))).toEqual([
      ...FIXED_START,
      ...FIXED_MIDDLE,
      'Does the arithmetic reproduce?',
      ...FIXED_END,
    ])
  })
})

describe('what must not be missing from any report', () => {
  it.each(OUTCOMES)('%s', (outcome) => {
    const markdown = markdownOf(completeAudit(outcome)).replace(/\s+/g, ' ')
    for (const sentence of [
      'It does not decide which tolerance the builders had.',
      'it refutes no date of it',
      'It does not say what the builders meant.',
      'not about the person who made it',
      'A build tolerance is not a measurement error',
      'Never look at the Sun',
      'The place from which it stands over the foresight is 1.9 m ± 30 cm to the left of the backsight',
      'beside it `skyline.csv`, SHA-256 `1111111111111111111111111111111111111111111111111111111111111111`',
      'Ask for permission before entering a site.',
      'for licensed people',
      'Astronomy & Astrophysics 534, A22; corrigendum 2012, 541, C1.',
      'SHA-256 `0000000000000000000000000000000000000000000000000000000000000000`',
    ]) {
      expect(markdown).toContain(sentence)
    }
  })

  it('names both windows', () => {
    const markdown = markdownOf(completeAudit('carried'))
    expect(markdown).toContain('within the window 3001 BCE to 2026 CE')
    expect(markdown).toContain('The same in a second window, 12,001 BCE to 2026 CE.')
  })
})

describe('each kind of target', () => {
  /** The items of the methods by their lead, in order. */
  function methods(audit: Audit): string[] {
    const { children } = render(audit)
    const start = children.findIndex((node) => node.type === 'heading' && plainText(node) === 'Methods')
    const lists = children.slice(start + 1).filter((node) => node.type === 'list')
    return lists[0]!.children.map((item) => plainText(item).split('.')[0]!)
  }

  it.each([
    ['equinox', ['Direction', 'Sun', 'Air']],
    ['noon', ['Meridian', 'Sun', 'Air']],
    ['moon', ['Direction', 'Moon', 'Air']],
    ['star', ['Direction', 'Stars', 'First sight', 'Air']],
    ['pair', ['Stars', 'Two stars']],
  ] as const)('has the methods of %s in one list, and no others', (kind, leads) => {
    expect(methods(auditOfKind(kind))).toEqual([...leads, 'Uncertainty', 'Sweep'])
  })

  it.each(KINDS)(
    'warns of looking at the Sun where it is a target, and always asks for permission: %s',
    (kind) => {
      const markdown = markdownOf(auditOfKind(kind))
      const isSun = ['equinox', 'noon', 'calendar'].includes(kind)
      expect(markdown.includes('Never look at the Sun')).toBe(isSun)
      expect(markdown).toContain('Ask for permission before entering a site.')
    },
  )

  it.each(['star', 'vanishing', 'never', 'pair'] as const)(
    'says nothing of the Earth’s tilt for stars: %s',
    (kind) => {
      expect(markdownOf(auditOfKind(kind, { assumptions: [], budget: [] }))).not.toMatch(
        /Earth’s tilt|[Oo]bliquity|solstice|half the Sun/,
      )
    },
  )

  it.each(['equinox', 'noon', 'moon', 'calendar'] as const)(
    'says nothing of precession for others: %s',
    (kind) => {
      const text = markdownOf(auditOfKind(kind)).replace(/## References[\s\S]*/, '')
      expect(text).not.toMatch(/precession|[Ss]tars/)
    },
  )

  it('cites the catalogue for stars, and the air mass where one rises', () => {
    expect(markdownOf(auditOfKind('pair'))).toMatch(/Hoffleit, D\. & Warren, W\. H\. 1991/)
    expect(markdownOf(auditOfKind('pair'))).not.toContain('Rozenberg')
    expect(markdownOf(auditOfKind('star'))).toMatch(/Rozenberg, G\. V\. 1966/)
    expect(markdownOf(auditOfKind('moon'))).not.toMatch(/Hoffleit|Rozenberg/)
  })

  it('has a table of the lines of a calendar, each by itself and all together', () => {
    const markdown = markdownOf(auditOfKind('calendar'))
    expect(markdown).toContain('Each line by itself, and all together')
    expect(markdownOf(auditOfKind('noon'))).not.toContain('Each line by itself')
  })
})

describe('a copy of the template that a user has changed', () => {
  it('says where an unknown part stands, and which was meant', () => {
    const changed = TEMPLATE.replace('::part{of="arithmetic"}', '::part{of="arithmetics"}')
    const { tree, problems } = renderTemplate(changed, completeAudit())
    expect(tree).toBeNull()
    expect(problems).toHaveLength(1)
    expect(problems[0]).toMatchObject({
      severity: 'error',
      code: 'unknown-value',
      offset: changed.indexOf('arithmetics'),
      length: 'arithmetics'.length,
      suggestion: 'arithmetic',
    })
  })

  it('says which container lost its end', () => {
    const changed = TEMPLATE.replace('::part{of="finding"}\n:::', '::part{of="finding"}')
    const { problems } = renderTemplate(changed, completeAudit())
    expect(problems.map(({ code, offset }) => [code, changed.slice(offset, offset + 24)])).toEqual([
      ['crowded-container', ':::panel{kind="finding"}'],
    ])
  })
})

describe('the templates of the package', () => {
  it.each(builtInTemplateNames)('%s has no problems', (name) => {
    const text = readFileSync(new URL(`../../templates/${name}.md`, import.meta.url), 'utf8')
    expect(renderTemplate(text, completeAudit()).problems).toEqual([])
  })
})
