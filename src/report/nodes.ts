import type {
  AlignType,
  Emphasis,
  Link,
  List,
  Paragraph,
  PhrasingContent,
  Strong,
  Table,
  TableCell,
  Text,
} from 'mdast'

/** A string stands for a text node with exactly these characters; it is never read as Markdown. */
export type Phrase = string | PhrasingContent

export function phrasing(phrases: readonly Phrase[]): PhrasingContent[] {
  return phrases
    .filter((phrase) => phrase !== '')
    .map((phrase) => (typeof phrase === 'string' ? text(phrase) : phrase))
}

export function text(value: string): Text {
  return { type: 'text', value }
}

export function strong(...phrases: readonly Phrase[]): Strong {
  return { type: 'strong', children: phrasing(phrases) }
}

export function emphasis(...phrases: readonly Phrase[]): Emphasis {
  return { type: 'emphasis', children: phrasing(phrases) }
}

export function link(url: string, ...phrases: readonly Phrase[]): Link {
  return { type: 'link', url, children: phrasing(phrases) }
}

export function paragraph(...phrases: readonly Phrase[]): Paragraph {
  return { type: 'paragraph', children: phrasing(phrases) }
}

/** A list of bullets, one paragraph an item. */
export function bullets(items: readonly (Phrase | readonly Phrase[])[]): List {
  return {
    type: 'list',
    ordered: false,
    spread: false,
    children: items.map((item) => ({
      type: 'listItem',
      spread: false,
      children: [paragraph(...asList(item))],
    })),
  }
}

/** One column of a table: its head, how a row fills it, and its width relative to the others. */
export interface Column<Row> {
  head: string
  cell: (row: Row) => Phrase | readonly Phrase[]
  align?: AlignType
  width?: number
}

/** A table with its caption; it gets its number when the document is complete. */
export function table<Row>(
  caption: readonly Phrase[],
  columns: readonly Column<Row>[],
  rows: readonly Row[],
): Table {
  const head = columns.map((column) => tableCell(column.head))
  const body = rows.map((row) => columns.map((column) => tableCell(column.cell(row))))
  return {
    type: 'table',
    align: columns.map((column) => column.align ?? null),
    children: [head, ...body].map((children) => ({ type: 'tableRow', children })),
    data: { caption: phrasing(caption), widths: columns.map((column) => column.width ?? 1) },
  }
}

function tableCell(content: Phrase | readonly Phrase[]): TableCell {
  return { type: 'tableCell', children: phrasing(asList(content)) }
}

function asList(content: Phrase | readonly Phrase[]): readonly Phrase[] {
  return Array.isArray(content) ? content : [content as Phrase]
}
