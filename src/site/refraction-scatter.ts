/**
 * Standard deviation of refraction from day to day at an apparent altitude, arcminutes:
 * max(0.3′, 9.6′ e^(−h/1°)).
 *
 * A default of this program, fitted to two facts: 0.16° on the horizon (Schaefer & Liller 1990, PASP 102, 796, from
 * memory; Sampson et al. 2003, PASP 115, 1256, find 0.175°), and far less over a higher skyline.
 */
export function refractionScatterArcmin(apparentAltitudeDeg: number): number {
  return Math.max(0.3, 9.6 * Math.exp(-Math.max(0, apparentAltitudeDeg)))
}
