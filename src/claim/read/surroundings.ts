import type { Grid, Target } from '../claim.ts'
import type { ReadPoints } from './read-points.ts'

/**
 * What the sightlines refer to. `grid` and `shared`, the top-level target, are null where they are not there, cannot be
 * read or, of a grid, do not reach the structure; `hasGrid` and `hasShared` tell whether the file has the key.
 */
export interface Surroundings {
  points: ReadPoints
  grid: Grid | null
  hasGrid: boolean
  shared: Target | null
  hasShared: boolean
}
