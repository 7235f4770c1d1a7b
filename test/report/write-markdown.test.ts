import type { Root, Table } from 'mdast'
import remarkGfm from 'remark-gfm'
import remarkParse from 'remark-parse'
import { unified } from 'unified'
import { visit } from 'unist-util-visit'
import { describe, expect, it } from 'vitest'
import type { DocumentTree } from '../../src/report/document.ts'
import { emphasis, paragraph, phrasing, table, text } from '../../src/report/nodes.ts'
import { plainText } from '../../src/report/plain-text.ts'
import { writeMarkdown } from '../../src/report/write-markdown.ts'
import { NASTY_STRINGS } from './nasty-strings.ts'

const figurePath = (name: string) => `audit-${name}.svg`

function write(...children: Root['children']): string {
  return writeMarkdown({ type: 'root', children }, { figurePath })
}

/** As a reader of CommonMark with GFM sees it. */
function read(markdown: string): Root {
  return unified().use(remarkParse).use(remarkGfm).parse(markdown)
}

/**
 * Every kind of node in a tree: what a text turned into where it was read as more than text. A bare address that
 * a GFM reader links of its own accord, words and address alike, is left out: nothing in Markdown keeps it from it.
 */
function kinds(tree: Root): string[] {
  const found = new Set<string>()
  visit(tree, (node) => {
    const isBareAddress =
      node.type === 'link' &&
      [`http://${plainText(node)}`, `mailto:${plainText(node)}`, plainText(node)].includes(node.url)
    if (!isBareAddress) found.add(node.type)
  })
  return [...found].sort()
}

describe('text of a user, written and read again', () => {
  it.each(NASTY_STRINGS)('in a paragraph: %s', (nasty) => {
    const tree = read(write(paragraph('Before: ', nasty, ' :after'), paragraph(nasty)))
    expect(tree.children).toHaveLength(2)
    expect(kinds(tree)).toEqual(['paragraph', 'root', 'text'])
    expect(plainText(tree.children[0]!)).toBe(`Before: ${nasty} :after`)
    expect(plainText(tree.children[1]!)).toBe(nasty)
  })

  it.each(NASTY_STRINGS)('in a heading: %s', (nasty) => {
    const tree = read(write({ type: 'heading', depth: 2, children: [text(nasty)] }))
    expect(tree.children).toHaveLength(1)
    expect(kinds(tree)).toEqual(['heading', 'root', 'text'])
    expect(plainText(tree.children[0]!)).toBe(nasty)
  })

  it.each(NASTY_STRINGS)('in a cell and a caption of a table: %s', (nasty) => {
    const plain = table([nasty], [{ head: nasty, cell: (row: string) => row }], [nasty, 'last'])
    const tree = read(write({ ...plain, data: { ...plain.data, number: 3 } }))
    expect(tree.children.map((node) => node.type)).toEqual(['paragraph', 'table'])
    expect(kinds(tree)).toEqual(['paragraph', 'root', 'strong', 'table', 'tableCell', 'tableRow', 'text'])
    expect(plainText(tree.children[0]!)).toBe(`Table 3. ${nasty}`)
    const rows = (tree.children[1] as Table).children
    expect(rows.map(plainText)).toEqual([nasty, nasty, 'last'])
  })

  it.each(NASTY_STRINGS)('in a figure’s caption, alternative text and a panel: %s', (nasty) => {
    const tree = read(
      write(
        {
          type: 'figure',
          name: 'premise',
          number: 1,
          alt: nasty,
          drawing: { type: 'element', tagName: 'svg', properties: {}, children: [] },
          children: phrasing([nasty, emphasis(nasty)]),
        },
        { type: 'panel', kind: 'claim', children: [paragraph(nasty)] },
      ),
    )
    expect(tree.children.map((node) => node.type)).toEqual(['paragraph', 'paragraph', 'blockquote'])
    expect(kinds(tree)).toEqual(['blockquote', 'emphasis', 'image', 'paragraph', 'root', 'strong', 'text'])
    const [image] = (tree.children[0] as { children: unknown[] }).children
    expect(image).toMatchObject({ type: 'image', url: 'audit-premise.svg', alt: nasty })
    expect(plainText(tree.children[1]!)).toBe(`Figure 1. ${nasty}${nasty}`)
    expect(plainText(tree.children[2]!)).toBe(`The claim. ${nasty}`)
  })
})

describe('blocks that Markdown does not have', () => {
  it('drops page breaks, also inside lists and quotations', () => {
    const item = { type: 'listItem' as const, children: [paragraph('item'), { type: 'pageBreak' as const }] }
    const markdown = write(
      paragraph('one'),
      { type: 'pageBreak' },
      { type: 'list', children: [item] },
      { type: 'blockquote', children: [{ type: 'pageBreak' }, paragraph('quoted')] },
    )
    expect(markdown).toBe('one\n\n- item\n\n> quoted\n')
  })

  it('leads a panel without a paragraph with a line of its own', () => {
    const rows: DocumentTree['children'] = [
      { type: 'panel', kind: 'caution', children: [{ type: 'blockquote', children: [paragraph('inner')] }] },
    ]
    expect(write(...rows)).toBe('> **Caution.**\n>\n> > inner\n')
  })

  it('pads the columns of a table, marks that take no column aside', () => {
    const markdown = write(
      table(
        ['Dates'],
        [{ head: 'a', cell: (row: string) => row, align: 'right' }],
        ['e\u0301\u200f', '1234'],
      ),
    )
    expect(markdown.split('\n').slice(2, 6)).toEqual([
      '|    a |',
      '| ---: |',
      '|    e\u0301\u200f |',
      '| 1234 |',
    ])
  })

  it('prints the caption of a table without a number as it is', () => {
    expect(write(table(['Dates'], [{ head: 'a', cell: () => 'b' }], [0]))).toContain('Dates\n\n| a |')
  })
})
