import { describe, expect, it } from 'vitest'
import { checkTemplate } from '../../../src/report/template/check-template.ts'
import { parseTemplate } from '../../../src/report/template/parse-template.ts'

function check(text: string) {
  return checkTemplate(parseTemplate(text), text)
}

/** Each problem as its code, the stretch of text it marks, and what it suggests. */
function found(text: string) {
  return check(text).map(({ code, offset, length, suggestion }) => [
    code,
    text.slice(offset, offset + length),
    suggestion,
  ])
}

describe('what is right', () => {
  it.each([
    '# Title with :value{of="structure.name"} in it',
    '::part{of="finding"}',
    "::table{of='premise'}",
    '::figure[A caption *of one’s own*]{of=premise}',
    'text\n::page\ntext',
    ':::panel{kind="caution"}\ntext\n:::',
    ':::panel{kind="caution"}\r\ntext\r\n:::\r\n\r\nmore',
    '::::when{outcome="premise carried" lacks="warnings notes"}\n:::panel{kind="claim"}\ntext\n:::\n::::',
    '- item\n\n  :::when{has="notes"}\n  ::part{of="notes"}\n  :::\n\n- item',
    '> :::when{has="notes"}\n> text\n> :::',
    ':::when{has="notes"}\n:::',
    'At 12:30, 1:3, foo:bar[*baz*] and \\:page; a ratio a : b; a::b.',
    '<!-- a comment -->\n\ntext <!-- another --> text',
    '| a | b |\n|---|---|\n| :value{of="window"} | `code` |',
    '[link](https://example.org), **strong**, ~not struck~\n\n---\n\n> quoted\n\n    ::part{of="code"}',
  ])('%j', (text) => {
    expect(check(text)).toEqual([])
  })
})

describe('what is wrong, at its place, with what to write instead', () => {
  it.each([
    ['# T\n\n::prat{of="finding"}', 'unknown-directive', '::prat', '::part'],
    ['::Part{of="finding"}', 'unknown-directive', '::Part', '::part'],
    ['text :valeu{of="window"}', 'unknown-directive', ':valeu', ':value'],
    ['::constructor{of="window"}', 'unknown-directive', '::constructor', null],
    [':::whe{has="notes"}\ntext\n:::', 'unknown-directive', ':::whe', ':::when'],
    ['::part{of="findng"}', 'unknown-value', 'findng', 'finding'],
    ['::part{of="toString"}', 'unknown-value', 'toString', null],
    ['::part{of=""}', 'unknown-value', '"', null],
    ['::table{of=premis}', 'unknown-value', 'premis', 'premise'],
    ['::figure[of="premise"]{of="trak"}', 'unknown-value', 'trak', 'track'],
    ['In :value{of="structure name"} text', 'unknown-value', 'structure name', 'structure.name'],
    [':::panel{kind="warning"}\ntext\n:::', 'unknown-value', 'warning', null],
    [':::when{outcome="premise caried"}\ntext\n:::', 'unknown-value', 'caried', 'carried'],
    [':::when{has="other-dates"}\ntext\n:::', 'unknown-value', 'other-dates', 'other_dates'],
    [':::when{has=" "}\ntext\n:::', 'unknown-value', ' ', null],
    ['::part{off="finding" of="finding"}', 'unknown-attribute', 'off', 'of'],
    ['::page{constructor="finding"}', 'unknown-attribute', 'constructor', null],
    ['::page{after="finding"}', 'unknown-attribute', 'after', null],
    ['::part{of="finding" of="claim"}', 'repeated-attribute', 'of', null],
    ['::part', 'missing-attribute', '::part', null],
    [':::when\ntext\n:::', 'missing-attribute', ':::when', null],
    ['text :page text', 'directive-form', ':page', '::page'],
    ['::value{of="window"}', 'directive-form', '::value{of="window"}', ':value'],
    ['::part[label]{of="finding"}', 'directive-label', '::part[label]{of="finding"}', null],
    [':::panel[label]{kind="claim"}\ntext\n:::', 'directive-label', ':::panel[label]{kind="claim"}', null],
    ['text ::part{of="finding"} text', 'stray-directive', '::part{', null],
    ['::part {of="finding"}', 'stray-directive', '::part {', null],
    ['text\n\n:::\n\ntext', 'stray-directive', ':::', null],
    ['<div>text</div>', 'unsupported-markdown', '<div>text</div>', null],
    ['text ![alt](x.png) text', 'unsupported-markdown', '![alt](x.png)', null],
    ['~~struck~~', 'unsupported-markdown', '~~struck~~', null],
    ['[link](javascript:alert)', 'unsafe-link', '[link](javascript:alert)', null],
    ['', 'empty-template', '', null],
  ])('%j', (text, code, marked, suggestion) => {
    expect(found(text)).toEqual([[code, marked, suggestion]])
  })

  it('a container that is never closed', () => {
    expect(found(':::panel{kind="claim"}\n::part{of="claim"}\n\nlater')).toEqual([
      ['unclosed-container', ':::panel{kind="claim"}', null],
    ])
  })

  it('a container that holds another with as many colons, which ends it too early', () => {
    const nested = ':::when{has="notes"}\n:::panel{kind="claim"}\ntext\n:::\n:::\n\nlater'
    expect(found(nested)).toEqual([
      ['crowded-container', ':::when{has="notes"}', null],
      ['stray-directive', ':::', null],
    ])
  })

  it('a container that is still open where the next one begins', () => {
    const nested = ':::panel{kind="claim"}\ntext\n\n:::when{has="notes"}\ntext\n:::\n\nlater'
    expect(found(nested)).toEqual([['crowded-container', ':::panel{kind="claim"}', null]])
  })

  it('an outer fence that is never closed around an inner one that is', () => {
    const nested = '::::when{has="notes"}\n:::panel{kind="claim"}\ntext\n:::\n\nlater'
    expect(found(nested)).toEqual([['unclosed-container', '::::when{has="notes"}', null]])
  })

  it('all problems of a template at once, in the order of the text', () => {
    const text =
      '::part{of="findng"}\n\n:::when{has="nots"}\n::tabel{of="premise"}\n:::\n\n# :value{off="window"}'
    expect(found(text)).toEqual([
      ['unknown-value', 'findng', 'finding'],
      ['unknown-value', 'nots', 'notes'],
      ['unknown-directive', '::tabel', '::table'],
      ['missing-attribute', ':value{off="window"}', null],
      ['unknown-attribute', 'off', 'of'],
    ])
  })

  it('says what was expected', () => {
    const [problem] = check('::figure{of="nothing"}')
    expect(problem).toMatchObject({
      severity: 'error',
      message: '`nothing` is not a name that `of` of `figure` knows',
      expected: 'one of: premise, plan, horizon, track',
    })
  })
})
