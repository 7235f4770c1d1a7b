import { describe, expect, it } from 'vitest'
import { cleanStrings } from '../../../src/report/template/clean-strings.ts'
import { fileNames } from '../../../src/report/template/file-names.ts'

describe('names of figure files', () => {
  it('need no label where there is one figure', () => {
    expect(fileNames('track', ['../../etc'])).toEqual(['track'])
  })

  it('hold nothing but a to z, digits and hyphens, and are never alike', () => {
    const labels = [
      'Midsummer, east',
      'midsummer east',
      '../../x',
      'Ålesund',
      'עברית',
      '%00',
      'a'.repeat(99),
      'CON',
    ]
    const names = fileNames('track', labels)
    expect(names.slice(0, 6)).toEqual([
      ...[
        'track-midsummer-east',
        'track-midsummer-east-2',
        'track-x',
        'track-alesund',
        'track-5',
        'track-00',
      ],
    ])
    for (const name of names) expect(name).toMatch(/^track-[a-z0-9-]{1,45}$/)
    expect(new Set(names).size).toBe(labels.length)
  })

  it('stay apart where a label looks like a name already given', () => {
    const names = fileNames('track', ['a', 'b 3', 'b', 'b', 'a', 'b 4'])
    expect(new Set(names).size).toBe(6)
  })
})

describe('cleaning', () => {
  it('reaches every string of a plain value and leaves the rest', () => {
    const value = { a: [' x\ty ', { b: 'c\u0007d', n: 1, z: null, t: true }], e: '' }
    expect(cleanStrings(value)).toEqual({ a: ['x y', { b: 'cd', n: 1, z: null, t: true }], e: '' })
  })

  it('keeps marks of direction, joiners and non-breaking spaces', () => {
    const text = 'a\u00a0b \u200fc\u200f \u2067d\u2069 👩‍🚀 e\u0301'
    expect(cleanStrings(text)).toBe(text)
  })
})
