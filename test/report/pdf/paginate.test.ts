import { describe, expect, test } from 'vitest'
import { paginate } from '../../../src/report/pdf/paginate.ts'
import { inPanel, panelBox } from '../../../src/report/pdf/panel-box.ts'
import { type Strip, strip } from '../../../src/report/pdf/strip.ts'

const names = new Map<Strip, string>()

function named(name: string, height: number, more: Partial<Strip> = {}): Strip {
  const each = { ...strip(height, () => {}), ...more }
  names.set(each, name)
  return each
}

const dealt = (strips: Strip[], height: number) =>
  paginate(strips, height).map((page) => page.map(({ strip: each }) => names.get(each)).join(' '))

describe('pages', () => {
  test('are filled in order', () => {
    expect(dealt([named('a', 40), named('b', 40), named('c', 40)], 100)).toEqual(['a b', 'c'])
  })

  test('have the greater of two gaps, and none at the top', () => {
    const [page] = paginate(
      [named('a', 10, { gapAbove: 9, gapBelow: 3 }), named('b', 10, { gapAbove: 5 })],
      100,
    )
    expect(page!.map(({ top }) => top)).toEqual([0, 15])
  })

  test('break before a heading, not after it', () => {
    const heading = named('heading', 20, { keepWithNext: true })
    expect(dealt([named('a', 70), heading, named('b', 40)], 100)).toEqual(['a', 'heading b'])
  })

  test('break somewhere even where everything is to be kept together', () => {
    const chain = ['a', 'b', 'c'].map((name) => named(name, 40, { keepWithNext: true }))
    expect(dealt(chain, 100)).toEqual(['a b', 'c'])
  })

  test('take a strip that is taller than they are', () => {
    expect(dealt([named('a', 10), named('tall', 300), named('b', 10)], 100)).toEqual(['a', 'tall', 'b'])
  })

  test('begin where a strip says so', () => {
    expect(dealt([named('a', 10), named('b', 10, { startsPage: true })], 100)).toEqual(['a', 'b'])
    expect(dealt([named('a', 10, { startsPage: true })], 100)).toEqual(['a'])
  })
})

describe('a figure that does not fit', () => {
  const figure = (name: string, height = 60) => named(name, height, { floats: true })

  test('goes to the top of the next page and lets the text go on', () => {
    expect(dealt([named('a', 50), figure('F'), named('b', 40), named('c', 40)], 100)).toEqual(['a b', 'F c'])
  })

  test('stays where it is if it fits', () => {
    expect(dealt([named('a', 30), figure('F'), named('b', 40)], 100)).toEqual(['a F', 'b'])
  })

  test('is not overtaken by the next figure', () => {
    expect(dealt([named('a', 50), figure('F'), figure('G', 20), named('b', 40)], 100)).toEqual(['a b', 'F G'])
  })

  test('stays under its heading', () => {
    const heading = named('heading', 20, { keepWithNext: true })
    expect(dealt([named('a', 50), heading, figure('F'), named('b', 10)], 100)).toEqual(['a', 'heading F b'])
  })

  test('comes before the heading of the next section', () => {
    const heading = named('heading', 20, { keepWithNext: true, beginsSection: true })
    expect(dealt([named('a', 50), figure('F'), heading, named('b', 10)], 100)).toEqual(['a', 'F heading b'])
  })

  test('comes before a forced page break', () => {
    const forced = named('b', 10, { startsPage: true })
    expect(dealt([named('a', 50), figure('F'), forced], 100)).toEqual(['a', 'F', 'b'])
  })
})

describe('a table that is divided', () => {
  test('has its head and its rule again', () => {
    const series = { head: named('head', 20), foot: named('foot', 0) }
    const rows = ['1', '2', '3', '4', '5', '6', '7'].map((name) => named(name, 25, { series }))
    expect(dealt([named('a', 25), ...rows], 100)).toEqual(['a 1 2 3 foot', 'head 4 5 6 foot', 'head 7'])
  })
})

test('a panel has its padding, once around all it holds', () => {
  const box = panelBox('claim', 0, 100)
  const inside = inPanel([named('b', 10), named('c', 10)], box)
  const [page] = paginate([named('a', 10), ...inside, named('d', 10)], 200)
  const pad = box.padding
  expect(page!.map(({ top }) => top)).toEqual([0, 10 + pad, 20 + pad, 30 + 2 * pad])
})
