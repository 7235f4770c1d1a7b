import type { Element } from 'hast'
import { PALETTE } from './palette.ts'

export type Attributes = Readonly<Record<string, string | number>>

/**
 * One element of a drawing; numbers are rounded to two decimals. Throws a RangeError on a number that is not
 * finite, for it would draw nothing and say nothing.
 */
export function shape(tagName: string, attributes: Attributes, children: Element[] = []): Element {
  const properties = Object.entries(attributes).map(([name, value]) => [name, attributeValue(name, value)])
  return { type: 'element', tagName, properties: Object.fromEntries(properties), children }
}

export interface TextStyle {
  size?: number
  anchor?: 'start' | 'middle' | 'end'
  weight?: 400 | 600
  italic?: boolean
  fill?: string
}

export const TEXT_SIZE = 7.5

/** A line of text; `y` is its baseline. */
export function text(x: number, y: number, content: string, style: TextStyle = {}): Element {
  const attributes = {
    x,
    y,
    textAnchor: style.anchor ?? 'start',
    fontSize: style.size ?? TEXT_SIZE,
    fontWeight: style.weight ?? 400,
    ...(style.italic ? { fontStyle: 'italic' } : {}),
    fill: style.fill ?? PALETTE.ink,
  }
  return { ...shape('text', attributes), children: [{ type: 'text', value: content }] }
}

export function line(
  from: readonly [number, number],
  to: readonly [number, number],
  stroke: Attributes,
): Element {
  return shape('line', { x1: from[0], y1: from[1], x2: to[0], y2: to[1], ...stroke })
}

/** Two decimals, and never a negative zero. */
export function round2(value: number): number {
  if (!Number.isFinite(value)) throw new RangeError(`cannot draw at ${value}`)
  return Math.round(value * 100) / 100 + 0
}

function attributeValue(name: string, value: string | number): string | number {
  if (typeof value === 'string') return value
  if (!Number.isFinite(value)) throw new RangeError(`the drawing attribute \`${name}\` is ${value}`)
  return round2(value)
}
