import type { Heading } from 'mdast'
import type { Shaper } from './shaper.ts'
import type { Tag } from './tagging.ts'

/** Where blocks are set: from `left`, running text no wider than `measure`, the rest no wider than `width`. */
export interface Column {
  readonly left: number
  readonly width: number
  readonly measure: number
  /** What the blocks belong to. */
  readonly tag: Tag
}

/** What all blocks of a document share. */
export interface Setting {
  readonly shape: Shaper
  /** The number to print before a heading, or an empty string. */
  readonly numberOf: (heading: Heading) => string
  /** The heading that is the title of the document. */
  readonly title: Heading | undefined
}

/** The column inset from the left and the right. */
export function indented(column: Column, left: number, right: number): Column {
  const width = column.width - left - right
  return {
    ...column,
    left: column.left + left,
    width,
    measure: Math.min(column.measure - left - right, width),
  }
}

/** Between paragraphs, and around lists. */
export const PARAGRAPH_GAP = 7
