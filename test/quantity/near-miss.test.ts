import { expect, test } from 'vitest'
import { foldWord, nearMiss } from '../../src/quantity/near-miss.ts'

const KEYS = ['structure', 'sightlines', 'source', 'target']

test.each([
  ['sorce', 'source'], // one letter left out
  ['sourcee', 'source'], // one too many
  ['soucre', 'source'], // neighbours swapped
  ['sight-lines', 'sightlines'],
  ['Target', 'target'],
  ['strukture', 'structure'],
  ['colour', null],
  ['', null],
])('%s is taken for %s', (typed, meant) => {
  expect(nearMiss(typed, KEYS)).toBe(meant)
})

test('two letters changed for each other are one slip', () => {
  expect(nearMiss('form', ['from', 'to'])).toBe('from')
})

test('as many slips as allowed and no more', () => {
  expect(nearMiss('hearthstone', ['hearthstXYZe'])).toBe('hearthstXYZe')
  expect(nearMiss('hearthstone', ['hearthstXYZe'], 2)).toBeNull()
})

test('takes the nearest of several', () => {
  expect(nearMiss('stone-b2', ['stone-b', 'stone-b22', 'stone-b3', 'stoneb2'])).toBe('stoneb2')
})

test('a word is compared without case, spaces, hyphens and underscores', () => {
  expect(foldWord('June_Sol-stice ')).toBe('junesolstice')
})
