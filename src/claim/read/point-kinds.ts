import { type AngleKind, LATITUDE, LONGITUDE } from '../../quantity/angle-kind.ts'
import { ELEVATION, inMetres, type UnitKind } from '../../quantity/unit-kind.ts'
import type { KEYS } from '../keys.ts'
import { EASTING, NORTHING, PLAN_LENGTH, POINT_UNCERTAINTY, WIDTH } from './kinds.ts'

export type PointKey = keyof typeof KEYS.point

/** The coordinates of each kind of point, with the key of its height. */
export const PLACES = {
  plan: { keys: ['east', 'north'], height: 'up', called: 'on the plan' },
  grid: { keys: ['easting', 'northing'], height: 'elevation', called: 'on the grid' },
  geographic: {
    keys: ['latitude', 'longitude'],
    height: 'elevation',
    called: 'in latitude and longitude',
  },
} as const satisfies Record<string, { keys: readonly [PointKey, PointKey]; height: PointKey; called: string }>

export type PlaceKind = keyof typeof PLACES

/** A coordinate of the plan beside one of the grid, neither with its own: the first one tells which is meant. */
const MIXED = [
  { has: 'easting', stray: 'north', meant: 'northing', kind: 'grid' },
  { has: 'east', stray: 'northing', meant: 'north', kind: 'plan' },
] as const satisfies readonly { has: PointKey; stray: PointKey; meant: PointKey; kind: PlaceKind }[]

export type MixedPlace = (typeof MIXED)[number]

/** The halves of two places among these keys, or null where one place is whole or nothing is mixed. */
export function mixedPlace(has: (key: PointKey) => boolean): MixedPlace | null {
  const isWhole = [PLACES.plan, PLACES.grid].some(({ keys }) => keys.every(has))
  return isWhole ? null : (MIXED.find((mixed) => has(mixed.has) && has(mixed.stray)) ?? null)
}

/** What the readers of a point's values have to know. */
export interface PointKinds {
  east: UnitKind
  north: UnitKind
  easting: UnitKind
  northing: UnitKind
  up: UnitKind
  elevation: UnitKind
  uncertainty: UnitKind
  width: UnitKind
  latitude: AngleKind
  longitude: AngleKind
}

/** In a claim file every value states its unit. */
export const WITH_UNITS: PointKinds = {
  east: PLAN_LENGTH,
  north: PLAN_LENGTH,
  easting: EASTING,
  northing: NORTHING,
  up: PLAN_LENGTH,
  elevation: ELEVATION,
  uncertainty: POINT_UNCERTAINTY,
  width: WIDTH,
  latitude: LATITUDE,
  longitude: LONGITUDE,
}

/** In a table a bare number is in metres or degrees. */
export const BARE: PointKinds = {
  east: inMetres(PLAN_LENGTH, '84.65'),
  north: inMetres(PLAN_LENGTH, '53.09'),
  easting: inMetres(EASTING, '273741.297'),
  northing: inMetres(NORTHING, '5796489.777'),
  up: inMetres(PLAN_LENGTH, '0.4'),
  elevation: inMetres(ELEVATION, '640'),
  uncertainty: inMetres(POINT_UNCERTAINTY, '0.05'),
  width: inMetres(WIDTH, '0.6'),
  latitude: { ...LATITUDE, example: '41.27', takesBareDegrees: true },
  longitude: { ...LONGITUDE, example: '23.0833', takesBareDegrees: true },
}
