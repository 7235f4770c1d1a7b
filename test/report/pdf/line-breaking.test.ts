import { describe, expect, test } from 'vitest'
import { plainRun } from '../../../src/report/pdf/inline-runs.ts'
import { breakLines } from '../../../src/report/pdf/line-breaking.ts'
import type { Shaper } from '../../../src/report/pdf/shaper.ts'
import { TEXT } from '../../../src/report/pdf/style.ts'

/** Every character as wide as the size of the type: ten characters to a width of 100. */
const fixedPitch: Shaper = (text, face) => [{ text, face, width: [...text].length }]

function broken(text: string, width: number, balanced = false): string[] {
  const lines = breakLines([plainRun(text, TEXT.body)], { width, balanced }, fixedPitch)
  const texts = lines.map((line) => line.pieces.map((piece) => piece.text).join(''))
  return [...texts.slice(0, -1), texts.at(-1)!.replace(/ $/, '')]
}

describe('lines', () => {
  test('end at spaces, which stay with the line before', () => {
    expect(broken('one two three four', 100)).toEqual(['one two ', 'three four'])
  })

  test('are made alike, not filled one after the other', () => {
    // The usual example (from memory: Wikipedia, “Line wrap and word wrap”): one after the other it would be
    // `aaa bb`, `cc`, `ddddd`, with 0 and 4 left over; squared 16, against 9 + 1.
    expect(broken('aaa bb cc ddddd', 60)).toEqual(['aaa ', 'bb cc ', 'ddddd'])
  })

  test('end after a hyphen or dash in a word, but keep a range of years and a date together', () => {
    expect(broken('upper-limb', 70)).toEqual(['upper-', 'limb'])
    expect(broken('word—word', 60)).toEqual(['word—', 'word'])
    expect(broken('of 9700–9500', 100)).toEqual(['of ', '9700–9500'])
    expect(broken('on 2026-06-21', 100)).toEqual(['on ', '2026-06-21'])
    expect(broken('a -9600', 50)).toEqual(['a ', '-9600'])
  })

  test('do not end at a no-break space', () => {
    expect(broken('in 9600\u00a0BCE', 100)).toEqual(['in ', '9600\u00a0BCE'])
  })

  test('cut a word that is wider than they are, if they can after punctuation', () => {
    expect(broken('0123456789abcdef', 70)).toEqual(['0123456', '789abcd', 'ef'])
    expect(broken('abcdef/ghijk', 80)).toEqual(['abcdef/', 'ghijk'])
  })

  test('cut no character in two', () => {
    expect(broken('e\u0301'.repeat(3), 40)).toEqual(['e\u0301e\u0301', 'e\u0301'])
  })

  test('of no text are one empty line', () => {
    expect(broken('', 100)).toEqual([''])
    expect(broken('  ', 100)).toEqual([''])
  })

  test('of a heading are about equally long', () => {
    expect(broken('aaaa bbbb cccc dddd', 150, false)).toEqual(['aaaa bbbb cccc ', 'dddd'])
    expect(broken('aaaa bbbb cccc dddd', 150, true)).toEqual(['aaaa bbbb ', 'cccc dddd'])
  })
})

test('the last word has a space after it too, which does not count', () => {
  const [line] = breakLines([plainRun('word', TEXT.body)], { width: 100, balanced: false }, fixedPitch)
  expect(line!.pieces[0]!.text).toBe('word ')
  expect(line!.width).toBe(40)
})

test('a line knows its width without the space at its end', () => {
  const [first] = breakLines([plainRun('one two', TEXT.body)], { width: 40, balanced: false }, fixedPitch)
  expect(first!.width).toBe(30)
  expect(first!.pieces.at(-1)!.width).toBe(30)
})
