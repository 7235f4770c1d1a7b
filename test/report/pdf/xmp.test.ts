import { expect, test } from 'vitest'
import { writePdf } from '../../../src/report/pdf/write-pdf.ts'
import { xmpProperties } from '../../../src/report/pdf/xmp.ts'

const date = new Date('2026-06-21T12:00:00.789Z')
const info = { Creator: 'datestone', Producer: 'PDFKit', CreationDate: date, ModDate: date }

/** The tags of XML 1.0 in order; throws on a bare `<` or `&`, or on tags that do not match. */
function checkWellFormed(xml: string): void {
  const open: string[] = []
  const markup = /<(\/?)([\w:]+)((?: [\w:]+="[^"<&]*")*)>|&(?:amp|lt|gt);|[^<&]/g
  expect(xml.replace(markup, '')).toBe('')
  for (const [whole, slash, name] of xml.matchAll(markup)) {
    if (!whole.startsWith('<')) continue
    if (slash) expect(open.pop()).toBe(name)
    else open.push(name!)
  }
  expect(open).toEqual([])
}

test('a title of any characters gives well-formed XML', () => {
  const title = 'A & B <t> ]]> "quoted" \u0000\u000b it’s 𝄞 \ud800'
  const xml = xmpProperties({ ...info, Title: title, Subject: 'x < y & z' }, 'en-GB')
  checkWellFormed(xml)
  expect(xml).toContain('A &amp; B &lt;t&gt; ]]&gt; "quoted" \ufffd\ufffd it’s 𝄞 \ufffd')
  expect(xml).toContain('x &lt; y &amp; z')
})

test('the file has it in place of what pdfkit would write', async () => {
  const tree = { type: 'root' as const, data: { title: 'A & B <t>' }, children: [] }
  const bytes = await writePdf(tree, { createdOn: date, warn: () => {} })
  const packet = /<\?xpacket begin=.*?\?>(.*)<\?xpacket end/s.exec(Buffer.from(bytes).toString('utf8'))![1]!
  checkWellFormed(packet)
  expect(packet).toContain('A &amp; B &lt;t&gt;')
})

test('dates are those of the information dictionary, which has whole seconds', () => {
  const xml = xmpProperties({ ...info, Title: 'T' }, 'en')
  expect(xml).toContain('<xmp:CreateDate>2026-06-21T12:00:00Z</xmp:CreateDate>')
  expect(xml).not.toContain('dc:description')
})
