/**
 * What stands in for the things a claim leaves out. Every one that is used is listed in the report with its effect.
 * Standard deviations unless said otherwise; all of them are this program's own choices.
 */
export const DEFAULTS = {
  /** Dates thought possible: 20,001 BCE to 2026 CE. */
  window: { from: -20_000, to: 2026 },
  plausible: { lowArcmin: 10, highArcmin: 60 },
  /** Half-width given to a level horizon that nobody measured. */
  unknownHorizonSdDeg: 0.5,
  horizonSdDeg: 2 / 60,
  azimuthSdDeg: 2 / 60,
  altitudeSdDeg: 2 / 60,
  /** By what a point is given in: a survey of the plan, a hand-held satellite receiver, coordinates off a map or a control network. */
  pointSdM: { plan: 0.05, geographic: 3, grid: 1 },
  /** Of two satellite positions that north was found by, where only one of the two figures is stated. */
  gpsAccuracyM: 0.02,
  gpsBaselineM: 100,
  /** Of a horizon by its distance and rise: a map's contour, and its scale. */
  riseSdM: 5,
  distanceSdShare: 0.01,
  /** Of the height of the eye above the sea. */
  eyeSdM: 1,
  disc: 'upper limb',
  /** At noon nothing stands on the horizon: the middle of the disc, or of its light. */
  discAtNoon: 'centre',
  equinoxSense: 'declination zero',
  visibilityRule: 'extinction',
  sightedAltitudeSdDeg: 0.5,
  elevationM: 0,
  humidity: 0,
} as const

/** Years beyond the window in which dates are still looked for, and named as outside it. */
export const YEARS_BEYOND_WINDOW = 10_000
