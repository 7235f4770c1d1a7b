/**
 * One line of a claim and the target it is held against, as the inference sees them. Angles in degrees; a year is a
 * Julian epoch. Standard deviations leave the build tolerance out.
 */
export interface Sight {
  name: string
  /** What the line gives: its azimuth from true north, an apparent altitude on the meridian, or the angle of two lines. */
  measures: 'azimuth' | 'altitude' | 'angle'
  measuredDeg: number
  /** Names the pair of points it runs between, in either direction: such lines share their build error. */
  axis: string | null
  /** Of the measurement, this line's alone. */
  measuredSdDeg: number
  /**
   * Of the north it rests on, an error that this line shares with all others of the same north; 0 for a measured
   * azimuth. Negative where that error turns this line the other way round.
   */
  northSdDeg: number
  /** Names that north, such as the plan's or the grid's; null where there is none. */
  northOf: string | null
  /** The standard deviation of what was built, in build tolerances: 1, or √2 for the angle between two built lines. */
  toleranceScale: number
  /** The directions its target may have in one year, all as likely: a date counts as the mean over them. */
  branches: readonly Branch[]
}

/** One course of a target through the years. */
export interface Branch {
  /** The direction an exact line would have had in a year; null where the target is not to be seen so. */
  predict: (year: number) => Prediction | null
  /**
   * Near the meridian direction does not answer errors in proportion: then the directions over the run of likely
   * errors. Null where the prediction's errors say enough; empty where the target is out of their reach too.
   */
  curve?: (year: number) => readonly CurvePiece[] | null
  /** By how much the target misses the altitude it is to be seen at, degrees; null where that cannot be told. */
  shortfallDeg?: (year: number) => number | null
}

export interface Prediction {
  directionDeg: number
  errors: readonly PredictionError[]
  /** Where the centre of its disc is seen then, where a skyline to both sides decides it; absent on a level horizon. */
  discCentre?: { azimuthDeg: number; altitudeDeg: number }
}

/** A source of error of the target's direction. */
export interface PredictionError {
  source: string
  /** What one standard deviation of it does to the direction, degrees, with its sign. */
  effectDeg: number
  /** Whether every target whose place rests on the obliquity shares it. */
  shared: boolean
}

/** A run of likely errors, in their standard deviations, and the directions at its two ends, straight in between. */
export interface CurvePiece {
  fromSd: number
  toSd: number
  fromDeg: number
  toDeg: number
}
