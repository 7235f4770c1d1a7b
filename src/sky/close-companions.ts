/** A companion that moves the star in a way the catalogue's straight motion does not follow. */
export interface CloseCompanion {
  /** The designation, to know the row by. */
  of: string
  /** Bound on what the catalogue's motion may owe to it, arcseconds a year: a rectangular error. */
  driftArcsecPerYear: number
}

/** What the catalogue's heading says of close binaries: `up to some 0.05 arcsec/yr, 0.2 for alpha Centauri`. */
const USUAL_DRIFT = 0.05
const ALPHA_CENTAURI_DRIFT = 0.2

/**
 * Stars of the catalogue, by HR number, whose companion takes them about in some twenty to a thousand years, by more
 * than some 0.01″ a year. A shorter turn averages out in the catalogue's motion, a longer one is slower than its
 * error. Drawn up from memory of the lists of visual binaries; not complete.
 *
 * Taken as an error of the motion, growing for ever: an upper bound where the motion listed is the pair's own, as for
 * alpha Centauri and Castor, whose two stars are listed with nearly the same one.
 */
const CLOSE_COMPANIONS: ReadonlyMap<number, CloseCompanion> = new Map(
  (
    [
      [5459, 'alpha1 Cen', ALPHA_CENTAURI_DRIFT],
      [5460, 'alpha2 Cen', ALPHA_CENTAURI_DRIFT],
      [2491, 'alpha CMa'], // Sirius, 50 years
      [2943, 'alpha CMi'], // Procyon, 41 years
      [2891, 'alpha Gem'], // Castor, both stars, some 450 years
      [2890, 'alpha Gem'],
      [4825, 'gamma Vir'], // Porrima, both stars, 169 years
      [4826, 'gamma Vir'],
      [4057, 'gamma1 Leo'], // Algieba and its companion, some 500 years
      [4058, 'gamma2 Leo'],
      [5788, 'delta Ser'], // both stars, some 1,000 years
      [5789, 'delta Ser'],
      [4730, 'alpha1 Cru'], // Acrux, both stars, over 1,000 years
      [4731, 'alpha2 Cru'],
      [219, 'eta Cas'], // 480 years
      [6212, 'zeta Her'], // 34 years
      [4301, 'alpha UMa'], // Dubhe, 44 years
      [3594, 'kappa UMa'], // 36 years
      [3569, 'iota UMa'], // with a faint pair, some 800 years
      [3579, 'HR 3579'], // 10 Ursae Majoris, 22 years
      [6378, 'eta Oph'], // Sabik, 88 years
      [6149, 'lambda Oph'], // Marfik, 129 years
      [7194, 'zeta Sgr'], // Ascella, 21 years
      [8130, 'tau Cyg'], // 50 years
      [7528, 'delta Cyg'], // some 800 years
      [4819, 'gamma Cen'], // 84 years
      [7882, 'beta Del'], // Rotanev, 27 years
      [963, 'alpha For'], // some 270 years
      [8974, 'gamma Cep'], // 67 years
      [4844, 'beta Mus'], // some 190 years
      [5776, 'gamma Lup'], // 190 years
      [3786, 'psi Vel'], // 34 years
      [3485, 'delta Vel'], // some 140 years
      [4216, 'mu Vel'], // some 140 years
    ] as [number, string, number?][]
  ).map(([hr, of, driftArcsecPerYear = USUAL_DRIFT]) => [hr, { of, driftArcsecPerYear }]),
)

/** The companion that makes a star's place uncertain over long times, or null where none is known here. */
export function closeCompanionOf(star: { hr: number }): CloseCompanion | null {
  return CLOSE_COMPANIONS.get(star.hr) ?? null
}

/** The HR numbers of all of them. */
export const STARS_WITH_CLOSE_COMPANIONS: readonly number[] = [...CLOSE_COMPANIONS.keys()]
