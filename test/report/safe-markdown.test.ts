import { describe, expect, it } from 'vitest'
import { paragraph, strong, text } from '../../src/report/nodes.ts'
import { safeMarkdown } from '../../src/report/safe-markdown.ts'

describe('what notes may use', () => {
  it('emphasis, strong, code, links, line breaks', () => {
    expect(safeMarkdown('*a* **b** `c` [d](https://example.org)\\\ne')).toEqual([
      paragraph(
        { type: 'emphasis', children: [text('a')] },
        ' ',
        { type: 'strong', children: [text('b')] },
        ' ',
        { type: 'inlineCode', value: 'c' },
        ' ',
        { type: 'link', url: 'https://example.org', children: [text('d')] },
        { type: 'break' },
        'e',
      ),
    ])
  })

  it('lists and quotations, one in the other', () => {
    expect(safeMarkdown('> 3. a\n>\n>    b\n')).toEqual([
      {
        type: 'blockquote',
        children: [
          {
            type: 'list',
            ordered: true,
            start: 3,
            spread: false,
            children: [{ type: 'listItem', spread: true, children: [paragraph('a'), paragraph('b')] }],
          },
        ],
      },
    ])
  })

  it('headings, as bold lines', () => {
    expect(safeMarkdown('# Top *x*\n\ntext')).toEqual([
      paragraph(strong('Top ', { type: 'emphasis', children: [text('x')] })),
      paragraph('text'),
    ])
  })
})

describe('what stays as it was typed', () => {
  it.each([
    '<script>alert(1)</script>',
    '<div>\nblock\n</div>',
    '![alt](https://example.org/x.png)',
    '[label](javascript:alert(1))',
    '[label](mailto:a@example.org)',
    '[label](//example.org)',
    '<mailto:a@example.org>',
    '[label][ref]\n\n[ref]: https://example.org',
    '```js\ncode *x*\n```',
    '    indented code',
    '* * *',
    '| a | b |\n|---|---|\n| 1 | 2 |',
    ':value{of="structure.name"}',
    '~~struck~~ [^1]',
  ])('%j', (typed) => {
    const kinds = new Set<string>()
    const words = (node: { type: string; children?: unknown[]; value?: string }): string => {
      kinds.add(node.type)
      if (node.type === 'break') return '\n'
      return node.value ?? (node.children as (typeof node)[]).map(words).join('')
    }
    const kept = safeMarkdown(typed).map(words).join('\n\n')
    expect(kept.trim()).toBe(typed.trim())
    for (const kind of kinds) expect(['paragraph', 'text', 'break']).toContain(kind)
  })

  it('html within a sentence, its neighbours rendered', () => {
    expect(safeMarkdown('a <b>*c*</b> d')).toEqual([
      paragraph('a ', '<b>', { type: 'emphasis', children: [text('c')] }, '</b>', ' d'),
    ])
  })

  it('drops control characters and halves of surrogate pairs', () => {
    expect(safeMarkdown('a\u0000b\u001bc\ud800d')).toEqual([paragraph('abcd')])
  })
})
