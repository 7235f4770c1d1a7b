/**
 * Coefficient of terrestrial refraction: the curvature of a ray of sight along the ground as a share of the Earth's.
 * Gauss found 0.13 in the survey of Hanover (from memory). Its standard deviation of 0.05 is a default of this program:
 * by day over land the coefficient runs from about 0 to 0.2, and over a cold sea higher.
 */
export const TERRESTRIAL_REFRACTION = { coefficient: 0.13, sd: 0.05 } as const

/** Mean radius of the Earth, metres: (2a + b)/3 of the WGS84 ellipsoid, 6,371,009 m, to a thousand metres. */
export const MEAN_EARTH_RADIUS_M = 6_371_000
