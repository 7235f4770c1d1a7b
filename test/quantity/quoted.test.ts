import { expect, test } from 'vitest'
import { plainCharacters } from '../../src/quantity/plain-characters.ts'
import { quoted, visibleControls } from '../../src/quantity/quoted.ts'

test('a value is quoted in backticks, its own made harmless', () => {
  expect(quoted('95°')).toBe('`95°`')
  expect(quoted('a`b')).toBe('`a’b`')
})

test('a long value loses its middle, not half a character', () => {
  const long = quoted(`${'a'.repeat(30)}${'🌞'.repeat(30)}${'b'.repeat(30)}`)
  expect([...long]).toHaveLength(62)
  expect(long.startsWith('`aaa')).toBe(true)
  expect(long.endsWith('bbb`')).toBe(true)
  expect(long).toContain('…')
})

test('nothing a terminal would act on is left', () => {
  expect(visibleControls('\u0000\u001b[31m\n\u202e')).toBe('␀␛[31m␊�')
})

test('variants of a character become one, each at its offset', () => {
  const typed = '49º 34’ 18” −5\u00a0m “x” 🌞'
  expect(plainCharacters(typed)).toBe('49° 34′ 18″ -5 m ″x″ 🌞')
  expect(plainCharacters(typed)).toHaveLength(typed.length)
})
