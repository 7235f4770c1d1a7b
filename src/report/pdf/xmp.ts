import type { Canvas, DocumentInfo } from './canvas.ts'

/**
 * Has the document write our XMP metadata in place of pdfkit's, which does not escape what it puts into XML
 * and so breaks on a title such as `A & B`.
 */
export function replaceXmp(canvas: Canvas, language: string): void {
  canvas._addInfo = () => canvas.appendXML(xmpProperties(canvas.info, language))
}

/** The properties of XMP (ISO 16684-1) that mirror the information dictionary. */
export function xmpProperties(info: DocumentInfo, language: string): string {
  const about = 'rdf:Description rdf:about=""'
  const alternatives = (text: string) =>
    `<rdf:Alt><rdf:li xml:lang="x-default">${escapeXml(text)}</rdf:li></rdf:Alt>`
  const subject = info.Subject ? `<dc:description>${alternatives(info.Subject)}</dc:description>` : ''
  return `
<${about} xmlns:dc="http://purl.org/dc/elements/1.1/">
  <dc:title>${alternatives(info.Title)}</dc:title>
  ${subject}
  <dc:language><rdf:Bag><rdf:li>${escapeXml(language)}</rdf:li></rdf:Bag></dc:language>
</rdf:Description>
<${about} xmlns:xmp="http://ns.adobe.com/xap/1.0/">
  <xmp:CreateDate>${xmpDate(info.CreationDate)}</xmp:CreateDate>
  <xmp:ModifyDate>${xmpDate(info.ModDate)}</xmp:ModifyDate>
  <xmp:CreatorTool>${escapeXml(info.Creator)}</xmp:CreatorTool>
</rdf:Description>
<${about} xmlns:pdf="http://ns.adobe.com/pdf/1.3/">
  <pdf:Producer>${escapeXml(info.Producer)}</pdf:Producer>
</rdf:Description>`
}

/** The information dictionary drops parts of a second, so this does too. */
function xmpDate(date: Date): string {
  return `${date.toISOString().slice(0, 19)}Z`
}

function escapeXml(text: string): string {
  const wellFormed = text.replace(/[^\t\n\r\u0020-\ud7ff\ue000-\ufffd\u{10000}-\u{10ffff}]/gu, '\ufffd')
  return wellFormed.replace(/&/g, '&amp;').replace(/</g, '&lt;').replace(/>/g, '&gt;')
}
