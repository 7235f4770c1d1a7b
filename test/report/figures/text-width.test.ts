import { createRequire } from 'node:module'
import PDFDocument from 'pdfkit'
import { describe, expect, it } from 'vitest'
import { fitText, isWidthKnown, textWidth } from '../../../src/report/figures/text-width.ts'

const require = createRequire(import.meta.url)
const FACES = '@expo-google-fonts/source-sans-3'
const document = new PDFDocument()
document.registerFont('regular', require.resolve(`${FACES}/400Regular/SourceSans3_400Regular.ttf`))
document.registerFont('semibold', require.resolve(`${FACES}/600SemiBold/SourceSans3_600SemiBold.ttf`))

const LINES = [
  '3 to 1 over radiocarbon up to 23′',
  'line tells under ½ bit from 26′',
  'plausible: 10′ to 1°30′ (default)',
  'window from 20,001 BCE',
  'The quick brown fox jumps over the lazy dog; 0123456789',
  'WILLIAM MILLFIELD, (EARL) & Sons: “£”',
  '57°54′28″ ± 1.2′',
  'Ávila, Öland, Çatal, Łódź, Île, Ñandú',
]

// The fonts' own advance widths, read from the font files: Source Sans 3 and the standard Helvetica (Adobe's AFM).
function widthIn(font: string, content: string, size: number): number {
  return document.font(font).fontSize(size).widthOfString(content)
}

describe('textWidth', () => {
  it.each(LINES)('is at least the width in Source Sans 3: %s', (content) => {
    const regular = widthIn('regular', content, 7.5)
    expect(textWidth(content, 7.5)).toBeGreaterThanOrEqual(regular)
    expect(textWidth(content, 7.5)).toBeLessThan(1.3 * regular)
    expect(textWidth(content, 7.5, 600)).toBeGreaterThanOrEqual(widthIn('semibold', content, 7.5))
  })

  it.each(LINES.filter((content) => !/[′″“£]/.test(content)))(
    'is at least the width in Helvetica: %s',
    (content) => {
      expect(textWidth(content, 7.5)).toBeGreaterThanOrEqual(widthIn('Helvetica', content, 7.5))
      expect(textWidth(content, 7.5, 600)).toBeGreaterThanOrEqual(
        0.99 * widthIn('Helvetica-Bold', content, 7.5),
      )
    },
  )
})

describe('isWidthKnown', () => {
  it('holds for Latin letters with their accents, and not for scripts without a table', () => {
    expect(isWidthKnown('Öland: 57°54′ ± 1.2′')).toBe(true)
    expect(isWidthKnown('𓉔')).toBe(false)
    expect(isWidthKnown('Ωρίων')).toBe(false)
    expect(isWidthKnown('')).toBe(false)
  })
})

describe('fitText', () => {
  it('leaves alone what fits', () => {
    expect(fitText('radiocarbon', 60, 7.5)).toBe('radiocarbon')
  })

  it('cuts what does not, between characters, and never to nothing', () => {
    const cut = fitText('coin hoard beneath the threshold', 60, 7.5)
    expect(cut).toMatch(/^coin hoard.*…$/)
    expect(textWidth(cut, 7.5)).toBeLessThanOrEqual(60)
    expect(fitText('𓉔𓉔𓉔𓉔', 9, 7.5)).toBe('𓉔…')
  })
})
