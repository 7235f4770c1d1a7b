import type { Element } from 'hast'
import { textWidth } from '../../../src/report/figures/text-width.ts'

/** Reading a drawing back, so that tests look at what is drawn and not at how. */
export interface DrawnText {
  content: string
  x: number
  y: number
  anchor: string
  size: number
  box: { left: number; right: number; top: number; bottom: number }
}

export interface DrawnLine {
  x1: number
  y1: number
  x2: number
  y2: number
  element: Element
}

export function shapesOf(drawing: Element, tagName: string): Element[] {
  const elements = drawing.children.filter((child) => child.type === 'element')
  return elements.flatMap((child) => [
    ...(child.tagName === tagName ? [child] : []),
    ...shapesOf(child, tagName),
  ])
}

export function textsOf(drawing: Element): DrawnText[] {
  return shapesOf(drawing, 'text').map((element) => {
    const { x, y, fontSize, textAnchor, fontWeight } = element.properties
    const content = (element.children[0] as { value: string }).value
    const width = textWidth(content, Number(fontSize), Number(fontWeight) === 600 ? 600 : 400)
    const left = Number(x) - width * { start: 0, middle: 0.5, end: 1 }[String(textAnchor) as 'start']
    // Capitals and digits rise some 0.7 of the size; descenders fall some 0.2.
    const box = {
      left,
      right: left + width,
      top: Number(y) - 0.7 * Number(fontSize),
      bottom: Number(y) + 0.2 * Number(fontSize),
    }
    return { content, x: Number(x), y: Number(y), anchor: String(textAnchor), size: Number(fontSize), box }
  })
}

export function textOf(drawing: Element, content: string): DrawnText {
  const found = textsOf(drawing).find((each) => each.content === content)
  if (found === undefined) throw new Error(`no text \`${content}\` in the drawing`)
  return found
}

export function linesOf(drawing: Element): DrawnLine[] {
  return shapesOf(drawing, 'line').map((element) => {
    const { x1, y1, x2, y2 } = element.properties
    return { x1: Number(x1), y1: Number(y1), x2: Number(x2), y2: Number(y2), element }
  })
}

/** Pairs of texts that print over each other. */
export function overlappingTexts(drawing: Element): string[] {
  const texts = textsOf(drawing)
  return texts.flatMap((a, index) =>
    texts
      .slice(index + 1)
      .filter((b) => overlap(a.box.left, a.box.right, b.box.left, b.box.right) > 0.01)
      .filter((b) => overlap(a.box.top, a.box.bottom, b.box.top, b.box.bottom) > 0.01)
      .map((b) => `${a.content} / ${b.content}`),
  )
}

function overlap(a0: number, a1: number, b0: number, b1: number): number {
  return Math.min(a1, b1) - Math.max(a0, b0)
}

/** Texts that reach beyond the drawing's edges. */
export function textsOutside(drawing: Element): string[] {
  const { width, height } = drawing.properties
  return textsOf(drawing)
    .filter(
      ({ box }) =>
        box.left < -0.01 || box.right > Number(width) + 0.01 || box.top < 0 || box.bottom > Number(height),
    )
    .map(({ content }) => content)
}

/** The polygons of path data made of M, L and Z. */
export function polygonsOf(d: string): [number, number][][] {
  return d
    .split('M')
    .slice(1)
    .map((part) =>
      part
        .replace('Z', '')
        .split('L')
        .map((pair): [number, number] => {
          const [x, y] = pair.split(/[ ,]/).map(Number)
          return [x!, y!]
        }),
    )
}

/** Whether a point lies in some polygon (even-odd within each). */
export function isInside(polygons: readonly [number, number][][], x: number, y: number): boolean {
  return polygons.some((polygon) => {
    let inside = false
    polygon.forEach(([x1, y1], index) => {
      const [x0, y0] = polygon.at(index - 1)!
      if (y1 > y !== y0 > y && x < ((x0 - x1) * (y - y1)) / (y0 - y1) + x1) inside = !inside
    })
    return inside
  })
}

/** What is wrong with the numbers of a drawing: attributes that are not finite, paths that hold NaN. */
export function badNumbers(drawing: Element): string[] {
  return ['rect', 'line', 'circle', 'path', 'text'].flatMap((tagName) =>
    shapesOf(drawing, tagName).flatMap((element) =>
      Object.entries(element.properties)
        .filter(([, value]) =>
          typeof value === 'number'
            ? !Number.isFinite(value)
            : /NaN|Infinity|undefined|null/.test(String(value)),
        )
        .map(([name, value]) => `${tagName} ${name}=${value}`),
    ),
  )
}
