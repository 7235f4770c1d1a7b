import type { Nodes } from 'mdast'
import { describe, expect, it } from 'vitest'
import type { Audit } from '../../../src/audit/audit.ts'
import type { DocumentTree } from '../../../src/report/document.ts'
import { figuresOf } from '../../../src/report/figures-of.ts'
import { emphasis, paragraph, text } from '../../../src/report/nodes.ts'
import { plainText } from '../../../src/report/plain-text.ts'
import { FIGURES } from '../../../src/report/template/figures.ts'
import { PARTS } from '../../../src/report/template/parts.ts'
import { renderTemplate } from '../../../src/report/template/render-template.ts'
import { TABLES } from '../../../src/report/template/tables.ts'
import { VALUES } from '../../../src/report/template/values.ts'
import { writeMarkdown } from '../../../src/report/write-markdown.ts'
import { completeAudit, severalLinesAudit } from '../complete-audit.ts'
import { NASTY_STRINGS } from '../nasty-strings.ts'

function render(template: string, audit: Audit = completeAudit()): DocumentTree {
  const { tree, problems } = renderTemplate(template, audit)
  expect(problems).toEqual([])
  return tree!
}

/** The document's blocks without what numbers and describes them. */
function blocks(template: string, audit?: Audit): Nodes[] {
  return render(template, audit).children
}

describe('text', () => {
  it('puts values into sentences, headings, cells and links', () => {
    const named = 'of :value{of="structure.name"}'
    const tree = render(
      `# Report ${named}\n\nText ${named}.\n\n| ${named} |\n|---|\n\n[${named}](https://a.org)`,
    )
    expect(tree.children.map(plainText)).toEqual([
      'Report of Thornmere court',
      'Text of Thornmere court.',
      'of Thornmere court',
      'of Thornmere court',
    ])
  })

  it('joins a value with the text around it, so that both are written as one text', () => {
    expect(blocks('a :value{of="datestone"}b')).toEqual([paragraph('a 0.1.0b')])
  })

  it('puts back what only looks like a directive, as it was written', () => {
    expect(blocks('At 12:30, 1:3, foo:bar[*baz*] and \\:page.')).toEqual([
      paragraph('At 12:30, 1:3, foo:bar[', emphasis('baz'), '] and :page.'),
    ])
  })

  it('leaves comments out', () => {
    expect(blocks('<!-- one -->\n\ntext<!-- two -->')).toEqual([paragraph('text')])
  })

  it('keeps lists, quotations and code, without their places in the template', () => {
    const [list, quote, code] = blocks('- a\n- b\n\n> c\n\n    d')
    expect(list).toMatchObject({ type: 'list', children: [{ children: [paragraph('a')] }, {}] })
    expect(quote).toEqual({ type: 'blockquote', children: [paragraph('c')] })
    expect(code).toEqual({ type: 'code', lang: null, meta: null, value: 'd' })
  })
})

describe('page, panel, when', () => {
  it('starts a page', () => {
    expect(blocks('a\n\n::page\n\nb')).toEqual([paragraph('a'), { type: 'pageBreak' }, paragraph('b')])
  })

  it('sets off a panel, and leaves out an empty one', () => {
    const finding = ':::panel{kind="finding"}\n::part{of="finding"}\n:::'
    expect(blocks(finding, completeAudit('open', { summary: ['a', 'b'] }))).toEqual([
      { type: 'panel', kind: 'finding', children: [paragraph('a'), paragraph('b')] },
    ])
    expect(blocks(finding, completeAudit('open', { summary: [] }))).toEqual([])
  })

  it.each([
    ['outcome="premise"', true],
    ['outcome="none carried"', false],
    ['outcome="none premise"', true],
    ['has="other_dates"', true],
    ['has="other_dates notes"', true],
    ['has="other_dates several_sightlines"', false],
    ['lacks="several_sightlines"', true],
    ['lacks="several_sightlines notes"', false],
    ['has="notes" lacks="source"', false],
    ['has="notes" outcome="premise"', true],
  ])('when{%s} is %s for a premise audit of one line', (condition, shown) => {
    expect(blocks(`:::when{${condition}}\ntext\n:::`)).toEqual(shown ? [paragraph('text')] : [])
  })

  it('joins lists that only a `when` parts, whether it holds or not', () => {
    const template = '- a\n\n:::when{has="sun"}\n- b\n:::\n\n:::when{has="moon"}\n- c\n:::\n\n- d'
    expect(blocks(template).map((list) => ('children' in list ? list.children.map(plainText) : []))).toEqual([
      ['a', 'b', 'd'],
    ])
    expect(blocks('- a\n\n1. b').length).toBe(2)
    expect(blocks('- a\n\n:::when{has="sun"}\n1. b\n:::').length).toBe(2)
    expect(blocks('- a\n\n:::when{has="sun"}\ntext\n:::\n\n- d').length).toBe(3)
    expect(blocks('- a\n\n<!-- two lists -->\n\n* b').length).toBe(2)
  })

  it('reports what is wrong inside a `when` that this audit leaves out', () => {
    const { tree, problems } = renderTemplate(':::when{outcome="none"}\n::part{of="x"}\n:::', completeAudit())
    expect(tree).toBeNull()
    expect(problems.map(({ code }) => code)).toEqual(['unknown-value'])
  })
})

describe('figures and tables', () => {
  it('numbers each kind in the order of the document, also inside panels', () => {
    const tree = render(
      '::table{of="limits"}\n\n::figure{of="track"}\n\n:::panel{kind="claim"}\n::table{of="premise"}\n:::\n\n| a |\n|---|\n\n::figure{of="premise"}',
      severalLinesAudit(),
    )
    const numbers = tree.children.map((node) => {
      const inner = node.type === 'panel' ? node.children[0]! : node
      return inner.type === 'figure'
        ? `${inner.name} ${inner.number}`
        : `${inner.type} ${Number(inner.type === 'table' && inner.data?.number)}`
    })
    expect(numbers).toEqual([
      'table 1',
      'track-midsummer 1',
      'track-midwinter 2',
      'table 2',
      'table NaN',
      'premise 3',
    ])
  })

  it('writes a figure that stands twice to one file', () => {
    const files = figuresOf(render('::figure{of="premise"}\n\n::figure[again]{of="premise"}'))
    expect(files.map(({ name }) => name)).toEqual(['premise'])
  })

  it('takes a caption of the template’s own', () => {
    const [figure, table] = blocks(
      '::figure[Own *caption*]{of="premise"}\n\n::table[Of :value{of="file"}]{of="limits"}',
    )
    expect(figure).toMatchObject({ children: [text('Own '), emphasis('caption')] })
    expect(table).toMatchObject({ data: { caption: [text('Of thornmere.yaml')], widths: expect.any(Array) } })
  })

  it.each(Object.keys(TABLES))(
    'table %s has rows as wide as its head, and none where there is nothing',
    (name) => {
      const [table] = TABLES[name]!(severalLinesAudit())
      const widths = table!.children.map((row) => row.children.length)
      expect(new Set(widths)).toEqual(new Set([table!.data!.widths!.length]))
      expect(widths.length).toBeGreaterThan(1)
      const nothing = completeAudit('open', {
        ...{ other_dates: [], limits: [], alternatives: [], assumptions: [], budget: [], checks: [] },
        ...{ reproduction: [], implied: [], sightlines: [] },
        sweep: { ...completeAudit().sweep, steps: [] },
      })
      expect(TABLES[name]!(nothing)).toEqual([])
    },
  )
})

describe('the document as a whole', () => {
  it('is described by its first heading and the audit', () => {
    const { data } = render(':::panel{kind="claim"}\n# Audit *of* :value{of="file"}\n:::\n\n# Other')
    expect(data).toEqual({
      title: 'Audit of thornmere.yaml',
      shortTitle: 'Thornmere court',
      language: 'en-GB',
      subject: expect.stringMatching(/^The east pillar/),
    })
    expect(render('text').data?.title).toBe('Thornmere court')
  })

  it('does not change the audit', () => {
    const audit = completeAudit('premise', { statement: 'a\nb' })
    const before = structuredClone(audit)
    render('::part{of="claim"}\n\n::figure{of="premise"}', audit)
    expect(audit).toEqual(before)
  })
})

describe('text of a user', () => {
  const everything = [
    ...Object.keys(PARTS).map((name) => `::part{of="${name}"}`),
    ...Object.keys(TABLES).map((name) => `::table{of="${name}"}`),
    ...Object.keys(FIGURES).map((name) => `::figure{of="${name}"}`),
    ...Object.keys(VALUES).map((name) => `:value{of="${name}"}`),
  ].join('\n\n')

  /** An audit in which everything that a claim file words is the same nasty text. */
  function filledWith(nasty: string): Audit {
    const audit = completeAudit()
    const dated = { label: nasty, text: nasty, printed: nasty, from: -800, to: -500 }
    const line = { ...audit.sightlines[0]!, name: nasty }
    return {
      ...audit,
      statement: nasty,
      source: nasty,
      structure: { ...audit.structure, name: nasty },
      asserted: { ...dated, from: -9700, to: -9500 },
      other_dates: [dated],
      sweep: {
        ...audit.sweep,
        steps: audit.sweep.steps.map((step) => ({
          ...step,
          ratios: step.ratios.map((ratio) => ({ ...ratio, against: nasty })),
        })),
      },
      limits: audit.limits.map((limit) => ({ ...limit, against: nasty })),
      sightlines: [line],
      tracks: audit.tracks.map((track) => ({ ...track, sightline: nasty })),
      implied: audit.implied.map((implied) => ({ ...implied, sightline: nasty })),
      warnings: [nasty],
      summary: [nasty],
    }
  }

  it.each(NASTY_STRINGS)('stays text: %s', (nasty) => {
    const tree = render(everything, filledWith(nasty))
    const kinds = new Set<string>()
    const texts: string[] = []
    const walk = (node: Nodes): void => {
      kinds.add(node.type)
      if (node.type === 'text') texts.push(node.value)
      if ('children' in node) for (const child of node.children) walk(child)
      if (node.type === 'table') for (const child of node.data?.caption ?? []) walk(child)
    }
    walk(tree)
    expect([...kinds].sort()).toEqual(
      ...[
        [
          'root',
          'paragraph',
          'text',
          'strong',
          'emphasis',
          'inlineCode',
          'list',
          'listItem',
          'table',
          'tableRow',
          'tableCell',
          'figure',
        ].sort(),
      ],
    )
    expect(texts).toContain(nasty)
    expect(texts.filter((value) => value.includes(nasty)).length).toBeGreaterThan(10)
    expect(writeMarkdown(tree, { figurePath: (name) => `${name}.svg` })).not.toMatch(/(?<!\\)<(script|img)/)
  })

  it('becomes one line without control characters', () => {
    const [claim] = blocks(
      '::part{of="claim"}',
      completeAudit('premise', { statement: ' a\r\n\tb\u0000c\u2028d\ud800 ' }),
    )
    expect(plainText(claim!)).toBe('“a bc d”')
  })
})
