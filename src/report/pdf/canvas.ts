import type { FontFiles } from '../fonts/font-files.ts'
import { PAGE } from './style.ts'
import { replaceXmp } from './xmp.ts'

/** The part of a pdfkit document used here. Its published types lack tagging and the outline's options. */
export interface Canvas extends AsyncIterable<Uint8Array> {
  readonly info: DocumentInfo
  readonly outline: OutlineEntry
  /** The current font of pdfkit, for `hasGlyphForCodePoint`: pdfkit has no public way to ask. */
  readonly _font: { readonly font: { hasGlyphForCodePoint(codePoint: number): boolean } }
  _addInfo(): void
  appendXML(xml: string): void
  addPage(): this
  end(): void

  registerFont(name: string, path: string): this
  font(name: string, size: number): this
  widthOfString(text: string): number
  text(text: string, x: number, y: number, options: { lineBreak: false; baseline: 'alphabetic' }): this

  save(): this
  restore(): this
  translate(x: number, y: number): this
  scale(factor: number): this
  rotate(angleDeg: number, options: { origin: [number, number] }): this
  rect(x: number, y: number, width: number, height: number): this
  circle(x: number, y: number, radius: number): this
  moveTo(x: number, y: number): this
  lineTo(x: number, y: number): this
  path(d: string): this
  lineWidth(width: number): this
  dash(lengths: number[]): this
  fillColor(colour: string): this
  strokeColor(colour: string): this
  fillOpacity(opacity: number): this
  fill(): this
  stroke(): this
  fillAndStroke(): this

  link(
    x: number,
    y: number,
    width: number,
    height: number,
    url: string,
    options: { structParent: StructureElement; Contents: unknown },
  ): this
  struct(role: string, options: StructureOptions): StructureElement
  addStructure(element: StructureElement): this
  markStructureContent(role: string): StructureContent
  markContent(role: 'Artifact', options: { type: 'Pagination' | 'Layout' }): this
  endMarkedContent(): this
}

export interface DocumentInfo {
  Title: string
  Subject?: string
  Creator: string
  Producer: string
  CreationDate: Date
  ModDate: Date
}

export interface OutlineEntry {
  addItem(
    title: string,
    options: { fit: false; left: number; top: number; zoom: number; expanded: boolean },
  ): OutlineEntry
}

export interface StructureOptions {
  alt?: string
  scope?: 'Column'
  bbox?: [number, number, number, number]
  placement?: 'Block'
}

export interface StructureElement {
  readonly dictionary: { readonly data: Record<string, unknown> }
  add(child: StructureElement | StructureContent): this
  end(): void
}

export interface StructureContent {
  readonly refs: unknown
}

export interface CanvasOptions {
  readonly title: string
  readonly subject: string | undefined
  readonly language: string
  readonly createdOn: Date
  readonly fonts: FontFiles
}

/** An empty tagged document with the fonts at hand. pdfkit is loaded here, not before. */
export async function openCanvas(options: CanvasOptions): Promise<Canvas> {
  const { default: PDFDocument } = await import('pdfkit')
  const TaggedDocument = PDFDocument as unknown as new (options: object) => Canvas
  const canvas = new TaggedDocument({
    size: [PAGE.width, PAGE.height],
    margin: 0,
    autoFirstPage: false,
    // Undefined would load Helvetica, and a font named here would be set again at each page.
    font: null,
    pdfVersion: '1.7',
    tagged: true,
    lang: options.language,
    displayTitle: true,
    info: documentInfo(options),
  })
  replaceXmp(canvas, options.language)
  for (const [face, path] of Object.entries(options.fonts)) canvas.registerFont(face, path)
  return canvas
}

function documentInfo({ title, subject, createdOn }: CanvasOptions): Partial<DocumentInfo> {
  const dates = { CreationDate: createdOn, ModDate: createdOn }
  return { Title: title, ...(subject ? { Subject: subject } : {}), Creator: 'datestone', ...dates }
}
