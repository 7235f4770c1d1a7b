import type { Element } from 'hast'
import { s } from 'hastscript'
import type { BlockContent, PhrasingContent, RootContent, Table } from 'mdast'
import type { DocumentTree, Figure, Panel } from '../../../src/report/document.ts'

/** A document that has everything the PDF can print. Places, people and findings in it are invented. */
export function sampleTree(): DocumentTree {
  return {
    type: 'root',
    data: {
      title: 'Audit of a dating claim: Thornmere & the “east pillar” <draft>',
      shortTitle: 'Thornmere court: audit of a dating claim',
      language: 'en-GB',
      subject: 'What the sightline of the Thornmere court can say & what it cannot',
    },
    children: [...pageOne(), ...sections()],
  }
}

export const text = (value: string): PhrasingContent => ({ type: 'text', value })
export const paragraph = (...children: (string | PhrasingContent)[]): BlockContent => ({
  type: 'paragraph',
  children: children.map((child) => (typeof child === 'string' ? text(child) : child)),
})
export const heading = (depth: 1 | 2 | 3 | 4, value: string): BlockContent => ({
  type: 'heading',
  depth,
  children: [text(value)],
})
const strong = (value: string): PhrasingContent => ({ type: 'strong', children: [text(value)] })
const emphasis = (value: string): PhrasingContent => ({ type: 'emphasis', children: [text(value)] })
const code = (value: string): PhrasingContent => ({ type: 'inlineCode', value })
export const link = (url: string, value: string): PhrasingContent => ({
  type: 'link',
  url,
  children: [text(value)],
})
export const panel = (kind: Panel['kind'], ...children: BlockContent[]): Panel => ({
  type: 'panel',
  kind,
  children,
})

export function table(
  number: number,
  caption: string,
  rows: readonly (readonly string[])[],
  extra: Partial<Table> & { widths?: number[] } = {},
): Table {
  const { widths, ...rest } = extra
  return {
    type: 'table',
    children: rows.map((row) => ({
      type: 'tableRow',
      children: row.map((cell) => ({ type: 'tableCell', children: [text(cell)] })),
    })),
    data: { number, caption: [text(caption)], ...(widths ? { widths } : {}) },
    ...rest,
  }
}

export function figure(number: number, name: string, drawing: Element, caption: string): Figure {
  return {
    type: 'figure',
    name,
    number,
    alt: `Drawing ${number} of the sample: ${caption}`,
    drawing,
    children: [text(caption)],
  }
}

const LONG_PARAGRAPH =
  'The line from the hearthstone to the east pillar was surveyed twice, eleven years apart, by two parties who did not know of one another’s work; their directions differ by 1.4′, which is within what either of them states. A builder who laid out this line to within 10′ would have had to sight along cords of thirty metres and more, and to do so on one of the few mornings on which the Sun stands within a minute of its extreme.'

function pageOne(): RootContent[] {
  return [
    heading(1, 'What the east pillar of the Thornmere court can say about its date'),
    panel(
      'claim',
      paragraph(
        strong('The claim. '),
        '“The east pillar of the Thornmere court marked midsummer sunrise exactly, so the court was built in 9600 BCE.”',
      ),
      paragraph(emphasis('Thornmere visitor leaflet'), ', third printing, page 4.'),
    ),
    panel(
      'finding',
      paragraph(
        strong('The finding. '),
        'The stones alone do not give this date. If the builders worked to within 10′, the line would favour 9600 BCE over the excavators’ 800 to 500 BCE by 290 to 1; at 20′ by 4 to 1; at 30′ the line no longer tells the two apart. The claim therefore rests on a premise about the builders’ skill, not on the measurement.',
      ),
    ),
    figure(
      1,
      'premise',
      sweepDrawing(),
      'Dates that fit the line, against the tolerance to which the court is taken to have been built. Dark: 68 %; light: 95 %. The dashed line is the tolerance above which the claim’s date no longer beats the excavators’ by 3 to 1.',
    ),
    { type: 'pageBreak' },
  ]
}

function sections(): RootContent[] {
  return [
    heading(2, 'How the date depends on the premise'),
    paragraph(LONG_PARAGRAPH),
    paragraph(
      'Plain, ',
      emphasis('emphasised'),
      ', ',
      strong('strong'),
      ', ',
      { type: 'strong', children: [text('strong with '), emphasis('emphasis')] },
      ', ',
      { type: 'delete', children: [text('struck out')] },
      ', ',
      code('input_sha256'),
      ', a ',
      link(
        'https://example.org/thornmere?x=1&y=ä',
        'link to the excavation report that is long enough to run on to the next line of text',
      ),
      ', mail to ',
      link('mailto:office@example.org', 'the office'),
      ', and ',
      link('javascript:alert(1)', 'a link of a kind that is not followed'),
      '. Signs: 41°16′12″ N, −11 880 ± 40, ≤ ≥ ≈ × ½ → σ τ δ ε φ Δ, ☉ ♈ ✓, “quotes”, Ångström, Łódź, Αθήνα, Москва. A forced break:',
      { type: 'break' },
      'the next line. Combining: e\u0301, a\u030a; fi fl ffi ligatures: office, flint.',
    ),
    table(
      1,
      'Dates that fit at some tolerances',
      [
        ['Tolerance', 'At the marker, cm', '95 % set', 'Bits', 'For 9600 BCE, against 800 to 500 BCE'],
        ['0′', '0', '10 461 to 7836 BCE, 7056 to 4346 BCE', '2.31', 'over 10⁶'],
        ['10′', '29', '11 881 to 2801 BCE', '1.12', '293'],
        ['15′', '44', '12 860 to 1710 BCE', '0.86', '13.5'],
        ['20′', '58', '13 540 to 700 BCE', '0.67', '4.4'],
        ['30′', '87', '14 666 BCE to 420 CE', '0.41', '1.9'],
      ],
      { align: ['right', 'right', null, 'right', 'right'], widths: [1, 1.2, 3, 0.8, 2] },
    ),
    heading(3, 'Signs in a drawing'),
    paragraph(LONG_PARAGRAPH),
    figure(2, 'shapes', shapesDrawing(), 'All shapes: rectangle, line, circle, path, text, turned text.'),
    paragraph(LONG_PARAGRAPH),
    heading(2, 'Lists, quotations and code'),
    list(false, [
      [paragraph('A bullet with a short text.')],
      [
        paragraph(LONG_PARAGRAPH),
        list(true, [
          [paragraph('First of a nested list.')],
          [
            paragraph('Second, with a list in it:'),
            list(false, [[paragraph('third level;')], [paragraph('third level again.')]]),
          ],
        ]),
      ],
      [paragraph('The last bullet.')],
    ]),
    list(
      true,
      Array.from({ length: 11 }, (_, index) => [paragraph(`Step ${index + 1} of the survey.`)]),
    ),
    { type: 'blockquote', children: [paragraph(LONG_PARAGRAPH)] },
    {
      type: 'code',
      value:
        'claim: The east pillar marked midsummer sunrise exactly.\nsightlines:\n  midsummer: {from: hearthstone, to: east-pillar, horizon: 1°30′ ± 2′}\n' +
        `input_sha256: ${'0123456789abcdef'.repeat(8)}`,
    },
    { type: 'thematicBreak' },
    paragraph(
      'A word that is too long: ',
      `${'Thornmere'.repeat(14)}.`,
      ' And an address: ',
      link(
        `https://example.org/${'a-long-path/'.repeat(12)}`,
        `https://example.org/${'a-long-path/'.repeat(12)}`,
      ),
      '.',
    ),
    panel(
      'caution',
      paragraph(strong('Caution. '), 'A line that fits a date does not show that anybody meant it.'),
      list(false, [
        [paragraph('It refutes neither the age of the place')],
        [paragraph('nor its builders’ intent.')],
      ]),
    ),
    heading(2, 'A long table'),
    paragraph('The table runs over three pages.'),
    longTable(),
    heading(2, 'A table with a row that is taller than a page'),
    table(
      3,
      'A tall row',
      [
        ['Step', 'Words'],
        ['1', `${LONG_PARAGRAPH} `.repeat(24)],
        ['2', 'short'],
        ['3', ''],
      ],
      { widths: [1, 5] },
    ),
    heading(2, 'A drawing wider than the column'),
    figure(3, 'wide', wideDrawing(), 'Scaled down to the width of the column.'),
    heading(4, 'A minor heading'),
    paragraph('The end. Hebrew and Arabic must not stop the work: שלום, سلام.'),
  ]
}

function list(ordered: boolean, items: readonly BlockContent[][]): BlockContent {
  return {
    type: 'list',
    ordered,
    spread: false,
    children: items.map((children) => ({ type: 'listItem', spread: false, children })),
  }
}

function longTable(): Table {
  const rows = Array.from({ length: 90 }, (_, index) => [
    `choice ${index + 1}`,
    index % 7 === 3
      ? 'the upper limb of the Sun stands on the horizon, seen from the hearthstone over the ridge to the east'
      : 'upper limb',
    `${(9600 - 37 * index).toLocaleString('en-GB')} BCE`,
    `${(0.5 + index / 10).toFixed(1)}′`,
  ])
  return table(
    2,
    'Every combination of the choices the claim leaves open, with the date that each of them gives and its distance from the claim’s own',
    [['Choice', 'Part of the disc', 'Date', 'Offset'], ...rows],
    {
      align: [null, null, 'right', 'right'],
      widths: [2, 5, 2, 1],
    },
  )
}

function svg(width: number, height: number, ...children: Element[]): Element {
  return s('svg', { viewBox: `0 0 ${width} ${height}`, width, height, role: 'img' }, [
    s('title', 'A drawing'),
    s('desc', 'Described'),
    ...children,
  ]) as Element
}

const label = { fontSize: 8, fill: '#141414' }

function sweepDrawing(): Element {
  return svg(
    432,
    250,
    s('rect', {
      x: 50,
      y: 10,
      width: 370,
      height: 200,
      fill: 'none',
      stroke: '#888888',
      strokeWidth: 0.5,
    }) as Element,
    s('path', {
      d: 'M50,160 C120,150 200,120 420,40 L420,205 C300,200 150,180 50,172 Z',
      fill: '#1c3f72',
      fillOpacity: 0.25,
    }) as Element,
    s('path', {
      d: 'M50 164 C120 158 200 140 420 80 V180 H300 C200 180 150 175 50 170 Z',
      fill: '#1c3f72',
      fillOpacity: 0.55,
    }) as Element,
    s('line', {
      x1: 220,
      y1: 10,
      x2: 220,
      y2: 210,
      stroke: '#141414',
      strokeWidth: 0.8,
      strokeDasharray: '4 2',
    }) as Element,
    s('text', { x: 224, y: 20, ...label }, '23′: 3 to 1') as Element,
    ...[0, 10, 20, 30, 40, 50].map(
      (tick) =>
        s('text', { x: 50 + tick * 7.4, y: 222, ...label, textAnchor: 'middle' }, `${tick}′`) as Element,
    ),
    ...['12 000 BCE', '8000 BCE', '4000 BCE', '1 CE'].map(
      (name, index) => s('text', { x: 46, y: 30 + index * 55, ...label, textAnchor: 'end' }, name) as Element,
    ),
    s(
      'text',
      { x: 235, y: 242, ...label, fontSize: 9, fontWeight: 600, textAnchor: 'middle' },
      'Build tolerance τ (1 sd)',
    ) as Element,
  )
}

function shapesDrawing(): Element {
  return svg(
    400,
    120,
    s('rect', {
      x: 0.5,
      y: 0.5,
      width: 399,
      height: 119,
      fill: '#fafafa',
      stroke: '#999',
      strokeWidth: 1,
    }) as Element,
    s('g', { transform: 'translate(20 20)' }, [
      s('circle', { cx: 30, cy: 30, r: 20, fill: '#f0b429', stroke: '#000', strokeWidth: 1 }),
      s('g', { transform: 'translate(60 0)' }, [
        s('rect', { x: 0, y: 10, width: 40, height: 40, fill: '#555', fillOpacity: 0.5 }),
        s('path', {
          d: 'M50 50 L70 10 L90 50 Z',
          fill: 'none',
          stroke: '#1c3f72',
          strokeWidth: 2,
          strokeDasharray: '6,2,1,2',
        }),
        s('path', { d: 'M100 50C110 -10 130 80 150 10H170V50', fill: 'none', stroke: '#8a4a00' }),
      ]),
    ]) as Element,
    s('line', { x1: 20, y1: 80, x2: 380, y2: 80, stroke: '#141414', strokeDasharray: '1 2' }) as Element,
    s('text', { x: 260, y: 40, ...label, fontStyle: 'italic' }, 'Italic, ☉ at rising') as Element,
    s('text', { x: 260, y: 55, ...label, fontWeight: 600 }, 'Semibold −0.5° ± 2′') as Element,
    s(
      'text',
      { x: 380, y: 60, ...label, transform: 'rotate(-90 380 60)', textAnchor: 'middle' },
      'turned',
    ) as Element,
  )
}

function wideDrawing(): Element {
  return svg(
    800,
    300,
    s('rect', { x: 1, y: 1, width: 798, height: 298, fill: '#eeeeee', stroke: '#141414' }) as Element,
    s('text', { x: 400, y: 150, fontSize: 30, textAnchor: 'middle' }, '800 points wide') as Element,
  )
}
