import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import { pageAfterScripts } from './chromium.ts'

const require = createRequire(import.meta.url)

/** Font files to set the figures in, so that the measures are the same on every machine. */
const FACES = {
  'Source Sans 3': '@expo-google-fonts/source-sans-3/400Regular/SourceSans3_400Regular.ttf',
  'DejaVu Sans': 'dejavu-fonts-ttf/ttf/DejaVuSans.ttf',
} as const
export type Face = keyof typeof FACES

export interface MeasuredText {
  content: string
  left: number
  right: number
  top: number
  bottom: number
}

/** One drawing as the browser laid it out, in the units of its viewBox. */
export interface MeasuredSvg {
  viewBox: [number, number, number, number]
  title: string
  description: string
  texts: MeasuredText[]
}

/** Has Chromium lay out the SVG files, with all their text in one face. */
export async function measureSvgs(svgs: readonly string[], face: Face): Promise<MeasuredSvg[]> {
  const font = readFileSync(require.resolve(FACES[face])).toString('base64')
  const drawings = svgs.map((svg) =>
    svg.replace(/^<\?xml.*\n/, '').replace(/ font-family="[^"]*"/, ' font-family="Test face"'),
  )
  const dom = await pageAfterScripts(`<!doctype html><meta charset="utf-8">
<style>@font-face { font-family: 'Test face'; src: url(data:font/ttf;base64,${font}) }
svg text { text-rendering: geometricPrecision }</style>
${drawings.join('\n')}
<pre id="measured"></pre>
<script>(${measureInPage})()</script>`)
  const [, measured] = /<pre id="measured">([\s\S]*?)<\/pre>/.exec(dom) ?? []
  if (!measured) throw new Error(`Chromium measured nothing:\n${dom.slice(-2000)}`)
  return JSON.parse(decodeURIComponent(measured))
}

/** Runs in the page, as text: percent-encoded JSON needs no unescaping of HTML afterwards. */
const measureInPage = `async () => {
  await document.fonts.load('16px "Test face"')
  await document.fonts.ready
  if (!document.fonts.check('16px "Test face"')) throw new Error('the face did not load')
  const measured = Array.from(document.querySelectorAll('svg'), (svg) => ({
    viewBox: svg.getAttribute('viewBox').split(' ').map(Number),
    title: svg.querySelector(':scope > title')?.textContent ?? '',
    description: svg.querySelector(':scope > desc')?.textContent ?? '',
    texts: Array.from(svg.querySelectorAll('text'), (text) => {
      const { x, y, width, height } = text.getBBox()
      const toDrawing = svg.getScreenCTM().inverse().multiply(text.getScreenCTM())
      const corners = [[x, y], [x + width, y], [x, y + height], [x + width, y + height]]
        .map(([x, y]) => new DOMPoint(x, y).matrixTransform(toDrawing))
      const xs = corners.map(({ x }) => x)
      const ys = corners.map(({ y }) => y)
      return {
        content: text.textContent,
        left: Math.min(...xs), right: Math.max(...xs), top: Math.min(...ys), bottom: Math.max(...ys),
      }
    }),
  }))
  document.getElementById('measured').textContent = encodeURIComponent(JSON.stringify(measured))
}`
