import type { BlockContent, DefinitionContent, List, ListItem, PhrasingContent, Root, Table } from 'mdast'
import type { Audit } from '../../audit/audit.ts'
import type { Figure, Panel } from '../document.ts'
import { conditionsHold } from './conditions.ts'
import type { Directive } from './directive-node.ts'
import { FIGURES } from './figures.ts'
import { isComment } from './is-comment.ts'
import { PARTS } from './parts.ts'
import { renderPhrases } from './render-phrases.ts'
import { TABLES } from './tables.ts'

/** What rendering needs besides the nodes: the audit, and the template's text for what the parser mistook. */
export interface Rendering {
  audit: Audit
  text: string
}

type Block = Root['children'][number]
type Flow = BlockContent | DefinitionContent

/**
 * Renders the blocks of a template that has no problems; a block may give none, one or several. Lists that only the
 * fence of a `when` parts become one list.
 */
export function renderBlocks(blocks: readonly Block[], rendering: Rendering): Flow[] {
  const rendered: Flow[] = []
  let isAfterWhen = false
  for (const block of blocks) {
    const isWhen = block.type === 'containerDirective' && block.name === 'when'
    const [first, ...rest] = renderBlock(block, rendering)
    const last = rendered.at(-1)
    if (first !== undefined) {
      if ((isWhen || isAfterWhen) && last?.type === 'list' && runsOn(last, first)) {
        rendered[rendered.length - 1] = { ...last, children: [...last.children, ...first.children] }
      } else rendered.push(first)
      rendered.push(...rest)
    }
    isAfterWhen = isWhen
  }
  return rendered
}

function runsOn(list: List, next: Flow): next is List {
  return next.type === 'list' && next.ordered === list.ordered
}

function renderBlock(block: Block, rendering: Rendering): Flow[] {
  switch (block.type) {
    case 'leafDirective':
      return renderLeaf(block, rendering)
    case 'containerDirective':
      return renderContainer(block, rendering)
    case 'paragraph':
    case 'heading':
      return [withChildren(block, renderPhrases(block.children, rendering))]
    case 'blockquote':
      return [withChildren(block, renderBlocks(block.children, rendering))]
    case 'list':
      return [
        withChildren(
          block,
          block.children.map((item) => renderItem(item, rendering)),
        ),
      ]
    case 'table':
      return [renderTable(block, rendering)]
    default:
      return isComment(block) ? [] : [bare(block) as Flow]
  }
}

function renderLeaf(node: Directive, rendering: Rendering): Flow[] {
  const { audit } = rendering
  const name = node.attributes?.of ?? ''
  const label = renderPhrases(node.children as PhrasingContent[], rendering)
  if (node.name === 'page') return [{ type: 'pageBreak' }]
  if (node.name === 'table') {
    return TABLES[name]!(audit).map((table) =>
      label.length > 0 ? { ...table, data: { ...table.data, caption: label } } : table,
    )
  }
  if (node.name === 'figure') {
    return FIGURES[name]!(audit).map(
      (figure): Figure => ({
        type: 'figure',
        number: 0,
        name: figure.name,
        alt: figure.alt,
        drawing: figure.drawing,
        children: label.length > 0 ? label : figure.caption,
      }),
    )
  }
  return PARTS[name]!(audit)
}

function renderContainer(node: Directive, rendering: Rendering): Flow[] {
  const attributes = node.attributes ?? {}
  if (node.name === 'when' && !conditionsHold(attributes, rendering.audit)) return []
  const children = renderBlocks(node.children as Block[], rendering)
  if (node.name === 'when' || children.length === 0) return children
  return [{ type: 'panel', kind: attributes.kind as Panel['kind'], children: children as BlockContent[] }]
}

function renderItem(item: ListItem, rendering: Rendering): ListItem {
  return withChildren(item, renderBlocks(item.children, rendering))
}

function renderTable(table: Table, rendering: Rendering): Table {
  const rows = table.children.map((row) => {
    const cells = row.children.map((cell) => withChildren(cell, renderPhrases(cell.children, rendering)))
    return withChildren(row, cells)
  })
  return withChildren(table, rows)
}

function withChildren<T extends { children: unknown[] }>(node: T, children: T['children']): T {
  return { ...bare(node), children }
}

/** Without its place in the template, which means nothing in the document. */
function bare<T extends object>(node: T): T {
  const { position: _, ...rest } = node as T & { position?: unknown }
  return rest as T
}
