import type { BlockContent } from 'mdast'
import type { Audit } from '../../audit/audit.ts'
import { CITATIONS } from '../citations.ts'
import { bullets, emphasis, type Phrase } from '../nodes.ts'
import { bodiesOf, hasRisingStar } from '../wording/bodies.ts'

/** Works that the text of the built-in template names, whatever the audit. */
const ALWAYS = [
  'auer2000',
  'hohenkerk1985',
  'jcgm100',
  'kass1995',
  'kullback1951',
  'petrie1883',
  'vondrak2011',
]

/** Works that it names where the Sun or the Moon, where stars, where a rising star is among the targets. */
const OF_TILT = ['laskar2004']
const OF_STARS = ['hoffleit1991']
const OF_RISING_STARS = ['rozenberg1966']

/** Full citations of the works this audit rests on, by author. */
export function referencesPart(audit: Audit): BlockContent[] {
  const { tilt, stars } = bodiesOf(audit)
  const named = [
    ...ALWAYS,
    ...(tilt ? OF_TILT : []),
    ...(stars ? OF_STARS : []),
    ...(hasRisingStar(audit) ? OF_RISING_STARS : []),
  ]
  const keys = [...new Set([...audit.references, ...named])]
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
