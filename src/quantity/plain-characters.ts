const PLAIN: ReadonlyMap<string, string> = new Map([
  ...pairs("'’‘ʹʼ´＇", '′'),
  ...pairs('"“”ʺ˝＂', '″'),
  ...pairs('º˚∘', '°'),
  ...pairs('−‐‑﹣－', '-'),
  ...pairs('＋', '+'),
  ...pairs('\t\u00a0\u2002\u2003\u2007\u2009\u200a\u202f', ' '),
])

/**
 * The same text with each variant of a prime, degree sign, hyphen-minus or space that people and word
 * processors type put as one character, so that offsets stay as they are. Dashes between two values are kept.
 */
export function plainCharacters(text: string): string {
  return [...text].map((character) => PLAIN.get(character) ?? character).join('')
}

function pairs(variants: string, plain: string): [string, string][] {
  return [...variants].map((variant) => [variant, plain])
}
