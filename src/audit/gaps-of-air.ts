import type { Claim } from '../claim/claim.ts'
import { formatNumber } from '../quantity/format-number.ts'
import { isUnstated } from '../quantity/unstated.ts'
import type { Air } from '../site/air.ts'
import type { Gap } from './gap.ts'
import { inBothLines } from './in-both-lines.ts'
import { airOf } from './settle-sightline.ts'
import type { SightlineInputs } from './sightline-inputs.ts'

/** What the claim leaves open of the air that refraction is traced through. */
export function airGaps(claim: Claim): Gap[] {
  const { atmosphere, structure } = claim
  const air = airOf(claim)
  const gap = (
    what: string,
    said: unknown,
    used: string,
    basis: string,
    words: string,
    changes: (air: Air) => Partial<Air>[],
  ): Gap[] => {
    if (!isUnstated(said)) return []
    const of = (line: SightlineInputs) => changes(air).map((change) => withAir(line, change))
    return [{ what, said, used, basis, change: { words, of } }]
  }
  const height = `${formatNumber(air.heightM, 4)} m`
  return [
    ...gap(
      'temperature',
      atmosphere.temperatureC,
      `${formatNumber(air.temperatureC, 3)} °C`,
      `standard atmosphere (ISO 2533) at ${height}`,
      'air 10 °C warmer or colder',
      ({ temperatureC }) => [{ temperatureC: temperatureC + 10 }, { temperatureC: temperatureC - 10 }],
    ),
    ...gap(
      'pressure',
      atmosphere.pressureHpa,
      `${formatNumber(air.pressureHpa, 4)} hPa`,
      `standard atmosphere (ISO 2533) at ${height}`,
      '10 hPa more or less, as the weather brings',
      ({ pressureHpa }) => [{ pressureHpa: pressureHpa + 10 }, { pressureHpa: pressureHpa - 10 }],
    ),
    ...gap(
      'humidity',
      atmosphere.humidity,
      'dry air',
      'the least of the effects of air; our choice',
      'air saturated with water',
      () => [{ humidity: 1 }],
    ),
    ...gap(
      'fall of temperature with height',
      atmosphere.lapseKPerKm,
      `${formatNumber(air.lapseKPerKm, 3)} K/km`,
      'standard atmosphere (ISO 2533)',
      '1 K/km more or less',
      ({ lapseKPerKm }) => [{ lapseKPerKm: lapseKPerKm + 1 }, { lapseKPerKm: lapseKPerKm - 1 }],
    ),
    ...gap(
      'height above sea level',
      structure.elevationM,
      height,
      'sea level; our choice',
      'a place 500 m up',
      () => [airOf({ ...claim, structure: { ...structure, elevationM: 500 } })],
    ),
  ]
}

function withAir(line: SightlineInputs, change: Partial<Air>): SightlineInputs {
  return inBothLines(line, (own) =>
    own.refraction.by === 'claim'
      ? own
      : { ...own, refraction: { by: 'ray trace', air: { ...own.refraction.air, ...change } } },
  )
}
