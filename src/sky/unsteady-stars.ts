/** Magnitudes between which a star varies. */
export interface Unsteadiness {
  brightest: number
  faintest: number
}

/**
 * Stars of the catalogue, by HR number, whose light changes by 0.8 magnitudes or more: the magnitude listed is that
 * of one time only, and where such a star is first visible changes with it. From memory of the General Catalogue of
 * Variable Stars.
 */
const UNSTEADY_STARS: ReadonlyMap<number, Unsteadiness> = new Map([
  [5958, { brightest: 2, faintest: 10.8 }], // T Coronae Borealis: invisible but for a few days in some eighty years
  [681, { brightest: 2, faintest: 10.1 }], // Mira
  [2061, { brightest: 0, faintest: 1.6 }], // Betelgeuse
  [264, { brightest: 1.6, faintest: 3 }], // gamma Cassiopeiae
  [936, { brightest: 2.1, faintest: 3.4 }], // Algol, for ten hours every third day
  [7106, { brightest: 3.3, faintest: 4.4 }], // beta Lyrae
  [8571, { brightest: 3.5, faintest: 4.4 }], // delta Cephei
  [7570, { brightest: 3.5, faintest: 4.4 }], // eta Aquilae
  [1605, { brightest: 2.9, faintest: 3.8 }], // epsilon Aurigae, every 27 years
  [6406, { brightest: 2.7, faintest: 4 }], // Rasalgethi
])

/** How far a star's light varies, or null where it is steady enough. */
export function unsteadinessOf(star: { hr: number }): Unsteadiness | null {
  return UNSTEADY_STARS.get(star.hr) ?? null
}

/** The HR numbers of all of them. */
export const STARS_OF_UNSTEADY_LIGHT: readonly number[] = [...UNSTEADY_STARS.keys()]
