import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { CITATIONS } from '../../src/report/citations.ts'
import { OBLIQUITY_MODELS } from '../../src/sky/obliquity-models.ts'

describe('citations', () => {
  it('has the work of each obliquity model, under its name', () => {
    expect(Object.keys(CITATIONS)).toEqual(expect.arrayContaining(Object.keys(OBLIQUITY_MODELS)))
  })

  it('has every key that an audit may name', () => {
    const source = readFileSync(new URL('../../src/audit/references.ts', import.meta.url), 'utf8')
    const keys = [...source.matchAll(/'([a-z]+\d+)'/g)].map((match) => match[1])
    expect(keys.length).toBeGreaterThan(8)
    expect(Object.keys(CITATIONS)).toEqual(expect.arrayContaining(keys))
  })

  it('has every work that the built-in template names by author and year', () => {
    const template = readFileSync(new URL('../../templates/audit.md', import.meta.url), 'utf8')
    const named = [...template.matchAll(/([A-ZÁ-Ž][\p{L}-]+)(?: et al\.| & [A-Z]\w+)? \(?(\d{4})/gu)]
    expect(named.length).toBeGreaterThan(4)
    for (const [, author, year] of named) {
      const works = Object.values(CITATIONS)
      expect(
        works.filter((work) => work.authors.startsWith(author!) && work.year === Number(year)),
      ).toHaveLength(1)
    }
  })

  it('has each key in the order of the alphabet, so that a work is found', () => {
    expect(Object.keys(CITATIONS)).toEqual(Object.keys(CITATIONS).toSorted())
  })
})
