import { wrap180 } from '../../quantity/degrees.ts'
import { quoted } from '../../quantity/quoted.ts'
import type { Grid, Structure } from '../claim.ts'
import { type Context, type Field, peek, reportWarning } from './field.ts'
import { plainText } from './read-text.ts'

/** Grids of whole countries reach some 16° from their meridian. */
const FAR_DEG = 20

/** Warns of a grid whose meridian, or whose side of the equator, is far from that of the structure. */
export function warnFarGrid(
  field: Field | undefined,
  grid: Grid | null,
  structure: Structure | null,
  context: Context,
): void {
  if (field === undefined || grid?.by !== 'projection' || structure === null) return
  const { centralMeridianDeg, falseNorthingM } = grid.projection
  const { latitudeDeg, longitudeDeg } = structure
  const zone = peek(field, 'zone')
  const named = { ...field, node: zone ?? peek(field, 'central_meridian') }
  const text = quoted(plainText(named) ?? grid.name)
  const awayDeg = longitudeDeg === null ? 0 : Math.abs(wrap180(longitudeDeg - centralMeridianDeg))
  if (awayDeg > FAR_DEG)
    reportWarning(
      context,
      named,
      'far-from-structure',
      `${text} has its meridian ${Math.round(awayDeg)}° from the structure`,
      {
        expected: 'the grid of the place; the zone, or E for W, may have slipped',
      },
    )
  const isSouth = zone !== null && falseNorthingM > 0
  if (zone !== null && Math.abs(latitudeDeg) > FAR_DEG && isSouth !== latitudeDeg < 0)
    reportWarning(
      context,
      named,
      'far-from-structure',
      `${text} is on the other side of the equator from the structure`,
      {
        expected: 'N or S as a side of the equator, not as a band of latitude',
      },
    )
}
