import { nearMiss } from '../quantity/near-miss.ts'
import { CONSTELLATIONS } from './constellations.ts'
import { designationOf, STARS, type Star } from './star-catalogue.ts'
import { foldStarName, readStarDesignation, type StarDesignation } from './star-designation.ts'

/** The outcome of looking for a star. */
export type StarSearch =
  | {
      star: Star
      /** Fainter stars that the same name or letter may mean, brightest first. */
      sharedWith: readonly Star[]
    }
  | {
      star: null
      /** `not listed`: a proper designation, but of no star of this catalogue, so most likely a fainter one. */
      because: 'not listed' | 'unknown name'
      /** What may have been meant, nearest first. */
      suggestions: readonly string[]
    }

/** The last number in the Bright Star Catalogue, 5th edition. */
const LAST_HR = 9110
const MOST_SUGGESTIONS = 3
/** More slips than this in one name are no slips. */
const MOST_SLIPS = 3

/**
 * The star that a text names, by proper name, Bayer letter, Flamsteed or HR number, without regard to case and
 * accents. Where several stars share what is written, the brightest is meant and the others are told.
 */
export function findStar(text: string): StarSearch {
  const designation = readStarDesignation(text)
  const found = designation === null ? starsNamed(text) : STARS.filter((star) => answers(star, designation))
  const [star, ...sharedWith] = found
  if (star !== undefined) return { star, sharedWith }
  if (designation === null)
    return { star: null, because: 'unknown name', suggestions: suggestionsFor(text, WORDS) }
  const known = designation.by !== 'hr' || (designation.hr >= 1 && designation.hr <= LAST_HR)
  const because = known ? 'not listed' : 'unknown name'
  return { star: null, because, suggestions: unnumbered(designation) }
}

/** Stars of a proper name: those spelt so before those that differ in spaces or hyphens, each brightest first. */
function starsNamed(text: string): Star[] {
  const wanted = foldStarName(text)
  const spelling = text.trim().toLowerCase()
  const named = STARS.filter(({ name }) => name !== null && foldStarName(name) === wanted)
  const isSpeltSo = (star: Star) => star.name?.toLowerCase() === spelling
  return [...named.filter(isSpeltSo), ...named.filter((star) => !isSpeltSo(star))]
}

function answers(star: Star, designation: StarDesignation): boolean {
  if (designation.by === 'hr') return star.hr === designation.hr
  if (star.constellation !== designation.constellation.abbreviation) return false
  if (designation.by === 'flamsteed') return star.flamsteed === designation.number
  const { letter, number } = designation
  return star.bayer === letter && (number === null || star.bayerNumber === number)
}

/** `zeta UMa` for `zeta1 UMa`: the catalogue numbers only some of the stars that share a letter. */
function unnumbered(designation: StarDesignation): string[] {
  if (designation.by !== 'bayer' || designation.number === null) return []
  const alike = STARS.filter((star) => answers(star, { ...designation, number: null }))
  return [...new Set(alike.map(designationOf))].slice(0, MOST_SUGGESTIONS)
}

/** Every way to write a star that a slip of the pen can be held against. */
const WORDS: readonly string[] = [...new Set(STARS.flatMap(spellings))]

function spellings(star: Star): string[] {
  const names = star.name === null ? [] : [star.name]
  const genitive = CONSTELLATIONS.find((held) => held.abbreviation === star.constellation)?.genitive
  if (star.bayer === null) return names
  return [...names, designationOf(star), `${star.bayer} ${genitive}`]
}

function suggestionsFor(text: string, words: readonly string[], most = MOST_SUGGESTIONS): string[] {
  const word = nearMiss(foldStarName(text), words, MOST_SLIPS)
  if (word === null || most === 0) return []
  const others = words.filter((other) => other !== word)
  return [word, ...suggestionsFor(text, others, most - 1)]
}
