import type { Nodes, PhrasingContent } from 'mdast'
import type { Face } from '../fonts/font-faces.ts'
import { LINK_INK, type TextStyle } from './style.ts'
import type { LinkTarget } from './tagging.ts'

/** How a run of text looks and where it leads. Runs of one look share one object. */
export interface Look {
  readonly face: Face
  readonly size: number
  readonly colour: string
  readonly link: LinkTarget | null
  readonly struck: boolean
}

/** Text of one look. A line feed is a forced line break; every other white space is a single space. */
export interface Run {
  readonly text: string
  readonly look: Look
}

interface Context {
  readonly style: TextStyle
  readonly face: Face
  readonly link: LinkTarget | null
  readonly struck: boolean
}

/** Phrasing content of the document tree as runs of text. Throws on a node that has no place in print. */
export function inlineRuns(nodes: readonly PhrasingContent[], style: TextStyle): Run[] {
  return runsIn(nodes, { style, face: style.regular, link: null, struck: false })
}

/** Plain text in one style. */
export function plainRun(text: string, style: TextStyle, face: Face = style.regular): Run {
  return { text, look: lookOf({ style, face, link: null, struck: false }) }
}

/** The words of a node without their looks. */
export function plainText(node: Nodes): string {
  if ('children' in node) return node.children.map((child) => plainText(child)).join('')
  if (node.type === 'break') return ' '
  return 'value' in node ? node.value.replace(/\s+/g, ' ') : ''
}

function runsIn(nodes: readonly PhrasingContent[], context: Context): Run[] {
  const look = lookOf(context)
  return nodes.flatMap((node) => runsOf(node, context, look))
}

function runsOf(node: PhrasingContent, context: Context, look: Look): Run[] {
  const { style } = context
  switch (node.type) {
    case 'text':
      return [{ text: node.value.replace(/[ \t\r\n]+/g, ' '), look }]
    case 'break':
      return [{ text: '\n', look }]
    case 'inlineCode': {
      const code = lookOf({ ...context, face: 'code' })
      return [{ text: node.value.replace(/[\t\r\n]/g, ' '), look: code }]
    }
    case 'emphasis': {
      const inStrong = context.face === style.strong
      return runsIn(node.children, { ...context, face: inStrong ? style.strong : style.emphasis })
    }
    case 'strong':
      return runsIn(node.children, { ...context, face: style.strong })
    case 'delete':
      return runsIn(node.children, { ...context, struck: true })
    case 'link':
      return runsIn(node.children, { ...context, link: linkTarget(node.url, plainText(node)) })
    default:
      throw new Error(`The PDF cannot print a node of the type \`${node.type}\` within text.`)
  }
}

function lookOf({ style, face, link, struck }: Context): Look {
  // Source Code Pro looks a size larger than the two others.
  const size = face === 'code' && style.regular !== 'code' ? style.size * 0.92 : style.size
  return { face, size, colour: link ? LINK_INK : style.colour, link, struck }
}

/** Null for an address that is malformed or of a scheme other than these: its words are printed, unlinked. */
export function linkTarget(address: string, words: string): LinkTarget | null {
  const url = URL.canParse(address) ? new URL(address) : null
  if (!url || !['http:', 'https:', 'mailto:'].includes(url.protocol)) return null
  return { url: url.href, contents: words === address ? address : `${words} (${url.href})` }
}
