import type { Element } from 'hast'

const PAINT = ['fill', 'fillOpacity', 'stroke', 'strokeWidth', 'strokeDasharray']
const LETTERING = ['textAnchor', 'fontSize', 'fontWeight', 'fontStyle', 'fontFamily', 'fill', 'transform']

/** The elements of drawing.ts with what they may carry; anything else is refused, not left out in silence. */
const KNOWN: Readonly<Record<string, readonly string[]>> = {
  svg: ['viewBox', 'width', 'height', 'role', 'xmlns', 'fontFamily', 'ariaLabel', 'ariaLabelledBy'],
  title: ['id'],
  desc: ['id'],
  g: ['transform'],
  rect: ['x', 'y', 'width', 'height', ...PAINT],
  line: ['x1', 'y1', 'x2', 'y2', ...PAINT],
  circle: ['cx', 'cy', 'r', ...PAINT],
  path: ['d', ...PAINT],
  text: ['x', 'y', ...LETTERING],
}

/** The numbers of the one kind of transform that is drawn on this element; null where it has none. */
export function transformOf(element: Element, kind: string): number[] | null {
  const value = property(element, 'transform')
  if (value === undefined) return null
  const match = new RegExp(`^${kind}\\(([^()]+)\\)$`).exec(String(value).trim())
  if (!match) refuse(element, `has the transform \`${value}\`; only \`${kind}(…)\` is drawn there`)
  return parseNumbers(element, 'transform', match![1]!)
}

/** A colour, null for `none`, or what stands in for an absent one. */
export function colourOf(element: Element, name: string, absent: string | null): string | null {
  const value = property(element, name)
  if (value === undefined) return absent
  if (value === 'none') return null
  if (typeof value === 'string' && /^#([\da-f]{3}|[\da-f]{6})$/i.test(value)) return value
  return refuse(element, `has the ${name} \`${value}\`; a colour is \`none\` or \`#rrggbb\``)
}

/** The one number of an attribute; without `absent` there must be one. */
export function numberOf(element: Element, name: string, absent?: number): number {
  const [value = absent, ...others] = numbersOf(element, name)
  if (value === undefined || others.length > 0) return refuse(element, `wants one number as \`${name}\``)
  return value
}

/** The numbers of an attribute; none where it is absent or `none`. */
export function numbersOf(element: Element, name: string): number[] {
  const value = property(element, name)
  if (value === undefined || value === 'none') return []
  return parseNumbers(element, name, Array.isArray(value) ? value.join(' ') : String(value))
}

function parseNumbers(element: Element, name: string, text: string): number[] {
  return text
    .trim()
    .split(/[\s,]+/)
    .map((word) => {
      const value = Number(word)
      if (word === '' || !Number.isFinite(value)) refuse(element, `has \`${text}\` as \`${name}\``)
      return value
    })
}

/** Hast spells some attributes in two ways, such as strokeDasharray and strokeDashArray. */
export function property(element: Element, name: string): Element['properties'][string] {
  const key = Object.keys(element.properties).find((each) => each.toLowerCase() === name.toLowerCase())
  return key === undefined ? undefined : (element.properties[key] ?? undefined)
}

/** Throws where the element or one of its attributes is not in the list above. */
export function checkAttributes(element: Element): void {
  const known = KNOWN[element.tagName]
  if (!known) refuse(element, 'is not one of the shapes that can be drawn')
  const names = known!.map((name) => name.toLowerCase())
  const unknown = Object.keys(element.properties).find((name) => !names.includes(name.toLowerCase()))
  if (unknown) refuse(element, `has the attribute \`${unknown}\`, which is not drawn`)
}

/** The tree is drawn by this program, so what it cannot print is a fault in it. */
export function refuse(element: Element, what: string): never {
  throw new Error(`The PDF cannot draw a figure: <${element.tagName}> ${what}.`)
}
