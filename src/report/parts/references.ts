import type { BlockContent } from 'mdast'
import type { Audit } from '../../audit/audit.ts'
import { CITATIONS } from '../citations.ts'
import { bullets, emphasis, type Phrase } from '../nodes.ts'

/** Works that the text of the built-in template names. */
const ALWAYS = [
  'auer2000',
  'hohenkerk1985',
  'jcgm100',
  'kass1995',
  'kullback1951',
  'petrie1883',
  'vondrak2011',
]

/** Full citations of the works this audit rests on, by author. */
export function referencesPart(audit: Audit): BlockContent[] {
  const keys = [...new Set([...audit.references, ...ALWAYS])]
  return [bullets(keys.toSorted((a, b) => sortKey(a).localeCompare(sortKey(b), 'en')).map(citation))]
}

function sortKey(key: string): string {
  const work = Object.hasOwn(CITATIONS, key) ? CITATIONS[key] : undefined
  return work ? `${work.authors} ${work.year}` : key
}

function citation(key: string): Phrase[] {
  const work = Object.hasOwn(CITATIONS, key) ? CITATIONS[key] : undefined
  if (!work) return [key]
  return [`${work.authors} ${work.year}. `, emphasis(work.title), `. ${work.where}.`]
}
