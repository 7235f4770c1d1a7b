/**
 * One sightline and its target as the inference sees them. Angles in degrees; a year is a Julian epoch.
 * Standard deviations leave the build tolerance out.
 */
export interface Sight {
  name: string
  latitudeDeg: number
  at: 'rising' | 'setting'
  /** Azimuth of the line as built, from true north. */
  azimuthDeg: number
  /** Of the direction, this line's alone. */
  azimuthSdDeg: number
  /** Of the plan's north, an error this line shares with the others of its plan; 0 for a measured azimuth. */
  northSdDeg: number
  /** Geocentric true altitude of the target's centre when it stands on the line's horizon. */
  altitudeDeg: (year: number) => number
  /** Horizon and refraction together. */
  altitudeSdDeg: (year: number) => number
  declinationDeg: (year: number) => number
  /** Of the declination's size: model and nutation, an error shared by every target of the Sun. */
  declinationSdDeg: (year: number) => number
  /** Which way a larger obliquity moves the declination. */
  declinationSign: 1 | -1
}
