import { wrap180 } from '../../quantity/degrees.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Grid, GridProjection, Structure } from '../claim.ts'
import { type Context, type Field, peek, reportError, reportWarning } from './field.ts'
import { isBeyondGrid } from './is-beyond-grid.ts'
import { plainText } from './read-text.ts'

/** Grids of whole countries reach some 16° from their meridian. */
const FAR_DEG = 20

/**
 * Tells of a grid whose meridian, or whose side of the equator, is far from that of the structure. Where something rests
 * on the grid, `isNeeded`, and the projection does not reach the structure, that is an error and gives false.
 */
export function checkFarGrid(
  field: Field | undefined,
  grid: Grid | null,
  { structure, isNeeded }: { structure: Structure | null; isNeeded: boolean },
  context: Context,
): boolean {
  if (field === undefined || grid?.by !== 'projection' || structure === null) return true
  const zone = peek(field, 'zone')
  const named = { ...field, node: zone ?? peek(field, 'central_meridian') }
  const text = quoted(plainText(named) ?? grid.name)
  if (zone !== null) warnOtherSide(named, text, grid.projection, structure, context)
  return checkMeridian(named, text, grid.projection, { structure, isNeeded }, context)
}

function checkMeridian(
  field: Field,
  text: string,
  projection: GridProjection,
  { structure, isNeeded }: { structure: Structure; isNeeded: boolean },
  context: Context,
): boolean {
  const { latitudeDeg, longitudeDeg } = structure
  if (longitudeDeg === null) return true
  const awayDeg = Math.abs(wrap180(longitudeDeg - projection.centralMeridianDeg))
  if (awayDeg <= FAR_DEG) return true
  const isUsable = !isNeeded || !isBeyondGrid({ latitudeDeg, longitudeDeg }, projection)
  const message = `${text} has its meridian ${Math.round(awayDeg)}° from the structure`
  const expected = 'the grid of the place; the zone, or E for W, may have slipped'
  if (isUsable) reportWarning(context, field, 'far-from-structure', message, { expected })
  else
    reportError(context, field, 'far-from-structure', `${message}, farther than its projection reaches`, {
      expected,
    })
  return isUsable
}

function warnOtherSide(
  field: Field,
  text: string,
  { falseNorthingM }: GridProjection,
  { latitudeDeg }: Structure,
  context: Context,
): void {
  if (Math.abs(latitudeDeg) <= FAR_DEG || falseNorthingM > 0 === latitudeDeg < 0) return
  const message = `${text} is on the other side of the equator from the structure`
  const expected = 'N or S as a side of the equator, not as a band of latitude'
  reportWarning(context, field, 'far-from-structure', message, { expected })
}
