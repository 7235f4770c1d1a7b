import type { Nodes } from 'mdast'
import { beforeAll, describe, expect, test } from 'vitest'
import { FRAME } from '../../../src/report/pdf/style.ts'
import { writePdf } from '../../../src/report/pdf/write-pdf.ts'
import {
  describeWith,
  fileOf,
  objectsOf,
  type PdfObject,
  pageTexts,
  run,
  structureText,
} from './pdf-tools.ts'
import { heading, paragraph, sampleTree, text } from './sample-tree.ts'

const createdOn = new Date('2026-06-21T12:00:00Z')
const warnings: string[] = []
let bytes: Uint8Array
let path: string

beforeAll(async () => {
  bytes = await writePdf(sampleTree(), { createdOn, warn: (message) => warnings.push(message) })
  path = fileOf(bytes)
})

describe('the file', () => {
  test('is the same for the same tree and date', async () => {
    const again = await writePdf(sampleTree(), { createdOn, warn: () => {} })
    expect(Buffer.compare(again, bytes)).toBe(0)
  })

  test('is another one for another date', async () => {
    const later = await writePdf(sampleTree(), {
      createdOn: new Date('2026-06-22T12:00:00Z'),
      warn: () => {},
    })
    expect(Buffer.compare(later, bytes)).not.toBe(0)
  })

  test('needs no warning for Latin, Greek, Cyrillic, Hebrew, Arabic and signs of the sky', () => {
    expect(warnings).toEqual([])
  })

  test('of an empty document has one page', async () => {
    const empty = await writePdf({ type: 'root', children: [] }, { createdOn, warn: () => {} })
    expect(
      Buffer.from(empty)
        .toString('latin1')
        .match(/\/Type \/Page$/gm),
    ).toHaveLength(1)
  })
})

describe('a character that no font has', () => {
  test('is reported once, with its code and its word', async () => {
    const messages: string[] = []
    const tree = { type: 'root' as const, children: [paragraph('The 山門 of 山 and 👩‍🌾.')] }
    await writePdf(tree as never, { createdOn, warn: (message) => messages.push(message) })
    expect(messages.map((message) => message.match(/U\+[^)]*/)?.[0])).toEqual([
      'U+5C71',
      'U+9580',
      'U+1F469 U+200D U+1F33E',
    ])
    expect(messages[0]).toContain('in `山門`')
  })
})

test('a node that cannot be printed is an error, not a gap', async () => {
  const image = { type: 'paragraph', children: [{ type: 'image', url: 'x.png' }] }
  const tree = { type: 'root', children: [image] }
  await expect(writePdf(tree as never, { createdOn, warn: () => {} })).rejects.toThrow('type `image`')
  const html = { type: 'root', children: [{ type: 'html', value: '<b>' }] }
  await expect(writePdf(html as never, { createdOn, warn: () => {} })).rejects.toThrow('type `html`')
})

describeWith(['qpdf', 'pdffonts', 'pdfinfo'], 'to a stranger', () => {
  test('the file has nothing wrong', () => {
    expect(run('qpdf', '--check', path)).toContain('No syntax or stream encoding errors found')
  })

  test('all fonts are embedded subsets with their Unicode', () => {
    const rows = run('pdffonts', path).trim().split('\n').slice(2)
    expect(rows.length).toBeGreaterThanOrEqual(7)
    for (const row of rows) expect(row).toMatch(/^[A-Z]{6}\+\S+ .* yes yes yes +\d+ +0$/)
  })

  test('the properties are those of the document', () => {
    const properties = run('pdfinfo', path)
    expect(properties).toMatch(/^Title: +Audit of a dating claim: Thornmere & the “east pillar” <draft>$/m)
    expect(properties).toMatch(/^Creator: +datestone$/m)
    expect(properties).toMatch(/^Tagged: +yes$/m)
    expect(properties).toMatch(/^CreationDate: +Sun Jun 21 12:00:00 2026/m)
    expect(properties).toMatch(/^Page size: .*A4/m)
  })
})

/** Without white space, so that line ends do not matter. */
const squeezed = (words: string) => words.normalize('NFC').replace(/[\s\u00a0\u202f]+/g, '')

function textsIn(node: Nodes): string[] {
  if (node.type === 'text' || node.type === 'inlineCode') return [node.value]
  const captions = node.type === 'table' ? (node.data?.caption ?? []).flatMap(textsIn) : []
  return 'children' in node ? [...captions, ...node.children.flatMap((child) => textsIn(child))] : captions
}

describeWith(['pdftotext', 'pdfinfo'], 'the text', () => {
  test('has every word of the tree', () => {
    const all = squeezed(structureText(path))
    const rightToLeft = /[\u0590-\u06ff]/
    for (const words of textsIn(sampleTree())) {
      if (!rightToLeft.test(words)) expect(all).toContain(squeezed(words))
    }
    expect(all).toContain(squeezed('input_sha256: 0123456789abcdef'))
  })

  test('has the running head on every page but the first, and the number on each', () => {
    const pages = pageTexts(path)
    for (const [index, page] of pages.entries()) {
      expect(page).toContain(`page ${index + 1} of ${pages.length}`)
      const firstLine = page.trimStart().split('\n')[0]
      expect(firstLine!.startsWith('Thornmere court: audit of a dating claim')).toBe(index > 0)
    }
  })

  test('begins a page where the tree says so', () => {
    const [first, second] = pageTexts(path)
    expect(first).toContain('Figure 1')
    expect(first).not.toContain('How the date depends')
    expect(second).toMatch(/^.*page 2 of \d+\s+1\s+How the date depends on the premise/)
  })

  test('a table over several pages has its head on each of them, and each row once', () => {
    const pages = pageTexts(path).filter((page) => /choice \d+/.test(page))
    expect(pages.length).toBeGreaterThanOrEqual(3)
    for (const [index, page] of pages.entries()) {
      expect(page).toMatch(/Choice +Part of the disc +Date +Offset/)
      expect(page.includes('Table 2, continued')).toBe(index > 0)
      expect(page.match(/choice \d+/g)!.length).toBeGreaterThanOrEqual(2)
    }
    const rows = pages.join('').match(/choice \d+/g)
    expect(rows).toEqual(Array.from({ length: 90 }, (_, index) => `choice ${index + 1}`))
  })

  test('a row taller than a page goes on over the pages and loses no line', () => {
    const all = squeezed(run('pdftotext', '-raw', path, '-'))
    const table = all.slice(all.indexOf('Table3Atallrow'), all.indexOf('5Adrawingwider'))
    expect(table.match(/minuteofitsextreme/g)).toHaveLength(24)
  })

  test('a heading is never the last thing on a page', () => {
    for (const page of pageTexts(path)) {
      const lastLine = page.trimEnd().split('\n').at(-1)!.trim()
      expect(lastLine).not.toMatch(/^\d(\.\d)?\s+[A-Z]|^A minor heading$/)
    }
  })

  test('prints � for a character that no font has', async () => {
    const tree = { type: 'root' as const, children: [heading(1, 'Title'), paragraph('The 山門 gate')] }
    const printed = await writePdf(tree as never, { createdOn, warn: () => {} })
    expect(run('pdftotext', fileOf(printed), '-')).toContain('The �� gate')
  })
})

describeWith(['qpdf'], 'the structure', () => {
  let objects: Map<string, PdfObject>
  beforeAll(() => {
    objects = objectsOf(path)
  })
  const elements = (role: string) => [...objects.values()].filter((each) => each['/S'] === `/${role}`)
  const resolve = (reference: unknown) => objects.get(reference as string)!
  const catalogue = () => [...objects.values()].find((each) => each['/Type'] === '/Catalog')!

  test('names the language and shows the title', () => {
    expect(catalogue()['/Lang']).toBe('u:en-GB')
    expect(resolve(catalogue()['/ViewerPreferences'])['/DisplayDocTitle']).toBe(true)
    expect(resolve(catalogue()['/MarkInfo'])['/Marked']).toBe(true)
  })

  test('has one bookmark a section, nested and numbered', () => {
    const titles = (entry: unknown): unknown[] => {
      const item = resolve(entry)
      const below = item['/First'] ? [titles(item['/First'])] : []
      return [String(item['/Title']).slice(2), ...below, ...(item['/Next'] ? titles(item['/Next']) : [])]
    }
    expect(titles(resolve(catalogue()['/Outlines'])['/First'])).toEqual([
      '1 How the date depends on the premise',
      ['1.1 Signs in a drawing'],
      '2 Lists, quotations and code',
      '3 A long table',
      '4 A table with a row that is taller than a page',
      '5 A drawing wider than the column',
      ['A minor heading'],
    ])
  })

  test('leads each bookmark to the left edge of its page, at its heading', () => {
    const items = [...objects.values()].filter((each) => each['/Title'] && each['/Dest'])
    expect(items).toHaveLength(7)
    for (const item of items) {
      const [page, kind, left, top] = item['/Dest'] as [string, string, number, number]
      expect(resolve(page)['/Type']).toBe('/Page')
      expect([kind, left]).toEqual(['/XYZ', 0])
      expect(top).toBeGreaterThan(841.89 - FRAME.top - FRAME.height)
      expect(top).toBeLessThan(841.89 - FRAME.top + 10)
    }
  })

  test('has a text for each figure, and its box in the size of the drawing or of the column', () => {
    const figures = elements('Figure')
    expect(figures.map((figure) => figure['/Alt'])).toEqual(
      sampleTree().children.flatMap((node) => (node.type === 'figure' ? [`u:${node.alt}`] : [])),
    )
    const sizes = figures.map((figure) => {
      const [left, bottom, right, top] = (figure['/A'] as PdfObject)['/BBox'] as number[]
      return [right! - left!, top! - bottom!].map((length) => Math.round(length * 10) / 10)
    })
    // The drawings are 432 × 250, 400 × 120 and 800 × 300 points; the column is 432 wide.
    expect(sizes).toEqual([
      [432, 250],
      [400, 120],
      [432, 162],
    ])
  })

  test('has headings, lists, quotations and as many cells in each row as the table has columns', () => {
    expect(elements('H1')).toHaveLength(1)
    expect(elements('H2')).toHaveLength(5)
    expect(elements('LI')).toHaveLength(elements('Lbl').length)
    expect(elements('LI')).toHaveLength(3 + 2 + 2 + 11 + 2)
    expect(elements('BlockQuote')).toHaveLength(1)
    expect(elements('Caption')).toHaveLength(3 + 3)
    const cells = elements('TR').map((row) => [row['/K']].flat().length)
    expect(cells).toEqual([...Array(6).fill(5), ...Array(91).fill(4), ...Array(4).fill(2)])
    for (const cell of elements('TH')) expect((cell['/A'] as PdfObject)['/Scope']).toBe('/Column')
  })

  test('names where each link leads, on the page it is on, and follows no other kind', () => {
    const annotations = [...objects.entries()].filter(([, each]) => each['/Subtype'] === '/Link')
    const addresses = annotations.map(([, each]) => resolve(each['/A'])['/URI'])
    expect(new Set(addresses)).toEqual(
      new Set([
        'u:https://example.org/thornmere?x=1&y=%C3%A4',
        'u:mailto:office@example.org',
        `u:https://example.org/${'a-long-path/'.repeat(12)}`,
      ]),
    )
    expect(annotations[0]![1]['/Contents']).toBe(
      'u:link to the excavation report that is long enough to run on to the next line of text (https://example.org/thornmere?x=1&y=%C3%A4)',
    )
    const references = elements('Link').flatMap((element) => element['/K'] as PdfObject[])
    for (const [name] of annotations) {
      const page = [...objects.entries()].find(([, each]) => (each['/Annots'] as string[])?.includes(name))!
      const reference = references.find((each) => each['/Obj'] === name)!
      expect(reference['/Pg']).toBe(page[0])
    }
  })

  test('keeps a link on its page where it runs on to the next', async () => {
    const filler = Array.from({ length: 48 }, (_, index) => paragraph(`Line ${index}`))
    const words = 'a link of many words '.repeat(60)
    const link = { type: 'link' as const, url: 'https://example.org/', children: [text(words)] }
    const tree = { type: 'root' as const, children: [...filler, paragraph(link)] }
    for (const count of [28, 29, 30]) {
      const children = tree.children.slice(-count)
      const crossing = objectsOf(
        fileOf(await writePdf({ ...tree, children } as never, { createdOn, warn: () => {} })),
      )
      const pages = [...crossing.entries()].filter(([, each]) => each['/Type'] === '/Page')
      const withLinks = pages.filter(([, each]) => each['/Annots'])
      const links = [...crossing.values()].filter((each) => each['/S'] === '/Link')
      expect(links).toHaveLength(withLinks.length)
      for (const each of links) {
        const { '/Pg': page, '/K': kids } = each as { '/Pg': string; '/K': PdfObject[] }
        const others = kids.filter((kid) => typeof kid === 'object').map((kid) => kid['/Pg'])
        expect(new Set(others)).toEqual(new Set([page]))
      }
      if (count === 30) expect(withLinks).toHaveLength(2)
    }
  })
})
