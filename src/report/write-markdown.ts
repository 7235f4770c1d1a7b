import type {
  BlockContent,
  DefinitionContent,
  Paragraph,
  PhrasingContent,
  Root,
  RootContent,
  Table,
} from 'mdast'
import remarkGfm from 'remark-gfm'
import remarkStringify from 'remark-stringify'
import { unified } from 'unified'
import type { DocumentTree, Figure, Panel } from './document.ts'
import { emphasis, paragraph, strong } from './nodes.ts'

type Flow = BlockContent | DefinitionContent

const PANEL_LEADS = { claim: 'The claim.', finding: 'The finding.', caution: 'Caution.' } as const

/**
 * The document as Markdown (CommonMark with GFM tables). A figure is an image, at the path that `figurePath`
 * gives for its name, over its caption in italics; a panel is a quotation that begins in bold, with a lead of
 * ours where it has none; the caption of a
 * table stands above it; page breaks fall away.
 */
export function writeMarkdown(
  tree: DocumentTree,
  { figurePath }: { figurePath: (name: string) => string },
): string {
  const children = tree.children.flatMap((node) => plainBlock(node, figurePath)) as Root['children']
  const writer = unified()
    .use(remarkGfm, { singleTilde: false, stringLength: columnCount })
    .use(remarkStringify, { bullet: '-', rule: '-', listItemIndent: 'one', resourceLink: true })
  return writer.stringify({ type: 'root', children })
}

function plainBlock(node: RootContent, figurePath: (name: string) => string): Flow[] {
  const inner = (children: readonly RootContent[]) =>
    children.flatMap((child) => plainBlock(child, figurePath))
  switch (node.type) {
    case 'figure':
      return plainFigure(node, figurePath(node.name))
    case 'panel':
      return [{ type: 'blockquote', children: withLead(node, inner(node.children)) }]
    case 'table':
      return plainTable(node)
    case 'pageBreak':
      return []
    case 'blockquote':
      return [{ ...node, children: inner(node.children) }]
    case 'list':
      return [
        { ...node, children: node.children.map((item) => ({ ...item, children: inner(item.children) })) },
      ]
    default:
      return [node as Flow]
  }
}

function plainFigure(figure: Figure, url: string): Paragraph[] {
  return [
    { type: 'paragraph', children: [{ type: 'image', url, alt: figure.alt }] },
    paragraph(emphasis(`Figure ${figure.number}. `, ...figure.children.flatMap(withoutEmphasis))),
  ]
}

/** Emphasis within emphasis would read as its end. */
function withoutEmphasis(node: PhrasingContent): PhrasingContent[] {
  return node.type === 'emphasis' ? node.children.flatMap(withoutEmphasis) : [node]
}

function plainTable({ data, ...table }: Table): Flow[] {
  if (!data?.caption) return [table]
  const lead = data.number === undefined ? [] : [strong(`Table ${data.number}.`), ' ']
  return [paragraph(...lead, ...data.caption), table]
}

function withLead(panel: Panel, blocks: readonly Flow[]): Flow[] {
  const lead = strong(PANEL_LEADS[panel.kind])
  const [first, ...rest] = blocks
  if (first?.type === 'paragraph' && first.children[0]?.type === 'strong') return [...blocks]
  if (first?.type !== 'paragraph') return [paragraph(lead), ...blocks]
  return [paragraph(lead, ' ', ...first.children), ...rest]
}

/** Columns that a text takes in a fixed-width font, as far as its marks go. */
function columnCount(text: string): number {
  return [...text.replace(/[\p{Mn}\p{Me}\p{Cf}]/gu, '')].length
}
