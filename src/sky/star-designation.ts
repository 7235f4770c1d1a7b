import { foldWord } from '../quantity/near-miss.ts'
import { CONSTELLATIONS, type Constellation } from './constellations.ts'

/** A star as astronomers number or letter it. */
export type StarDesignation =
  | { by: 'hr'; hr: number }
  | { by: 'bayer'; letter: string; number: number | null; constellation: Constellation }
  | { by: 'flamsteed'; number: number; constellation: Constellation }

const GREEK = new Map(
  [
    ...['α alpha', 'β beta', 'γ gamma', 'δ delta', 'ε epsilon', 'ζ zeta', 'η eta', 'θ theta', 'ι iota'],
    ...['κ kappa', 'λ lambda', 'μ mu', 'ν nu', 'ξ xi', 'ο omicron', 'π pi', 'ρ rho', 'σ sigma', 'τ tau'],
    ...['υ upsilon', 'φ phi', 'χ chi', 'ψ psi', 'ω omega'],
  ].flatMap((pair): [string, string][] => {
    const [letter, name] = pair.split(' ')
    return [
      [letter!, name!],
      [name!, name!],
    ]
  }),
)

const CONSTELLATION_OF = new Map(
  CONSTELLATIONS.flatMap((held) =>
    [held.abbreviation, held.name, held.genitive].map((word): [string, Constellation] => [
      foldStarName(word),
      held,
    ]),
  ),
)

const HR_NUMBER = /^(?:hr ?)?(\d+)$/
const LETTERED = /^([a-z]+|[α-ω])[ ^-]*0?(\d)?[ -]*(\D+)$/
const NUMBERED = /^(\d{1,3}) ?(\D+)$/

/**
 * The designation a text states, or null where it is none: `HR 2491` or `2491`, `alpha CMa`, `α Canis Majoris`,
 * `alpha² CVn`, `51 And`. Whether the catalogue has such a star is not asked.
 */
export function readStarDesignation(text: string): StarDesignation | null {
  const plain = plainStarName(text)
  const [, hr] = HR_NUMBER.exec(plain) ?? []
  if (hr !== undefined) return { by: 'hr', hr: Number(hr) }
  return readLettered(plain) ?? readNumbered(plain)
}

function readLettered(plain: string): StarDesignation | null {
  const [, word = '', digit, rest = ''] = LETTERED.exec(plain) ?? []
  const letter = GREEK.get(word)
  const constellation = CONSTELLATION_OF.get(foldStarName(rest))
  if (letter === undefined || constellation === undefined) return null
  return { by: 'bayer', letter, number: digit === undefined ? null : Number(digit), constellation }
}

function readNumbered(plain: string): StarDesignation | null {
  const [, number = '', rest = ''] = NUMBERED.exec(plain) ?? []
  const constellation = CONSTELLATION_OF.get(foldStarName(rest))
  return constellation === undefined ? null : { by: 'flamsteed', number: Number(number), constellation }
}

/** A name as names are compared: without case, accents, spaces and hyphens. */
export function foldStarName(text: string): string {
  return foldWord(plainStarName(text))
}

/** Without case, accents and doubled spaces; superscripts as digits, every form of a Greek letter as the usual one. */
function plainStarName(text: string): string {
  return text
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[\s_]+/g, ' ')
    .trim()
}
