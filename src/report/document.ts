import type { Element } from 'hast'
import type { BlockContent, Parent, PhrasingContent, Root } from 'mdast'
import type { Node } from 'unist'

/**
 * The one document tree every output is made from: mdast, with three kinds of block of its own.
 * Text nodes hold plain text; nothing in the tree is parsed again.
 */
export type DocumentTree = Root

/** A drawing with its caption, numbered in the order of the document. */
export interface Figure extends Parent {
  type: 'figure'
  /** Names the SVG file beside the Markdown, such as `premise`. */
  name: string
  number: number
  /** What the drawing shows, for a reader who cannot see it. */
  alt: string
  /** An `svg` element; see drawing.ts for the shapes it may hold. */
  drawing: Element
  /** The caption. */
  children: PhrasingContent[]
}

/** A set-off block: the claim as stated, the finding, a caution. */
export interface Panel extends Parent {
  type: 'panel'
  kind: 'claim' | 'finding' | 'caution'
  children: BlockContent[]
}

export interface PageBreak extends Node {
  type: 'pageBreak'
}

declare module 'mdast' {
  interface RootContentMap {
    figure: Figure
    panel: Panel
    pageBreak: PageBreak
  }
  interface BlockContentMap {
    figure: Figure
    panel: Panel
    pageBreak: PageBreak
  }
  interface TableData {
    /** Printed above the table, after its number. */
    caption?: PhrasingContent[]
    number?: number
    /** Relative column widths; equal where absent. */
    widths?: number[]
  }
  interface RootData {
    /** Document title, and the short form for the running head. */
    title?: string
    shortTitle?: string
    /** BCP 47. */
    language?: string
    subject?: string
  }
}
