import type { Unstated } from '../../quantity/unstated.ts'
import type { North } from '../claim.ts'

/** Whether the north of a plan is that of the file’s grid, whose convergence follows from the grid. */
export function restsOnGrid(north: North | Unstated): boolean {
  return typeof north !== 'string' && north.from === 'grid' && north.convergence === null
}
