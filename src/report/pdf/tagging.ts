import type { Canvas, StructureElement, StructureOptions } from './canvas.ts'

/**
 * An element of the document's structure, which tells a screen reader what is a heading, a table cell, a
 * figure. Roles are the standard structure types of ISO 32000-1, 14.8.4.
 */
export interface Tag {
  readonly role: string
  readonly parent: Tag | null
  readonly alt?: string
  readonly scope?: 'Column'
  /** Of a list. */
  readonly numbering?: 'Decimal' | 'Disc'
}

export type Box = readonly [left: number, top: number, right: number, bottom: number]

/** Where the target of a link leads, and the words for it. */
export interface LinkTarget {
  readonly url: string
  readonly contents: string
}

export interface Tagger {
  /** Puts the tag next in the structure, if it is not there yet. */
  open(tag: Tag): void
  /** Draws what belongs to the tag; the box is wanted for figures. */
  content(tag: Tag, draw: () => void, box?: Box): void
  /** Draws what is no part of the text: rules, tints, running heads. One within another is one. */
  artifact(type: 'Pagination' | 'Layout', draw: () => void): void
  /** The tag for a link's words on this page. */
  linkTag(target: LinkTarget, parent: Tag): Tag
  /** Lays the link over its words. */
  link(tag: Tag, target: LinkTarget, box: Box): void
  endPage(): void
}

/** Elements come into being when their first content is drawn, so the structure is in reading order. */
export function createTagger(canvas: Canvas): Tagger {
  const elements = new Map<Tag, StructureElement>()
  const linksOfPage = new Map<LinkTarget, Tag>()
  let inArtifact = false

  function element(tag: Tag, box?: Box): StructureElement {
    const known = elements.get(tag)
    if (known) return known
    const created = createElement(canvas, tag, box)
    elements.set(tag, created)
    if (tag.parent) element(tag.parent).add(created)
    else canvas.addStructure(created)
    return created
  }

  return {
    open(tag) {
      element(tag)
    },
    content(tag, draw, box) {
      const parent = element(tag, box)
      parent.add(canvas.markStructureContent(tag.role))
      draw()
      canvas.endMarkedContent()
    },
    artifact(type, draw) {
      if (inArtifact) return draw()
      inArtifact = true
      canvas.markContent('Artifact', { type })
      draw()
      canvas.endMarkedContent()
      inArtifact = false
    },
    linkTag(target, parent) {
      const tag = linksOfPage.get(target) ?? { role: 'Link', parent }
      linksOfPage.set(target, tag)
      return tag
    },
    link(tag, target, [left, top, right, bottom]) {
      // A String object becomes a PDF string; pdfkit makes a PDF name of a plain one.
      const options = { structParent: element(tag), Contents: Object(target.contents) }
      canvas.link(left, top, right - left, bottom - top, target.url, options)
    },
    endPage() {
      // pdfkit notes the page of a link at the moment its element ends, so it must end on that page.
      for (const tag of linksOfPage.values()) element(tag).end()
      linksOfPage.clear()
    },
  }
}

function createElement(canvas: Canvas, tag: Tag, box?: Box): StructureElement {
  const options: StructureOptions = {}
  if (tag.alt) options.alt = tag.alt
  if (tag.scope) options.scope = tag.scope
  if (box) Object.assign(options, { bbox: box, placement: 'Block' })
  const created = canvas.struct(tag.role, options)
  if (tag.numbering) created.dictionary.data.A = { O: 'List', ListNumbering: tag.numbering }
  return created
}
