import { expect, test } from 'vitest'
import { CLAIM_SCHEMA, type Schema } from '../../src/claim/claim-schema.ts'
import { KEYS, type KeyTable } from '../../src/claim/keys.ts'

function propertiesOf(schema: Schema): Readonly<Record<string, Schema>> {
  return schema.properties as Readonly<Record<string, Schema>>
}

const file = propertiesOf(CLAIM_SCHEMA)
const sightline = file.sightlines!.additionalProperties as Schema

const line = propertiesOf(sightline)
const horizons = propertiesOf(line.span!).horizons!

/** The mapping that may stand in the place of a plain value. */
function otherwise({ anyOf }: Schema): Schema {
  return (anyOf as Schema[])[1]!
}

/** The kinds of target that a schema allows, with the keys of each. */
function targetsIn(what: string, { anyOf }: Schema): [string, Schema, KeyTable][] {
  const tables = [KEYS.sunTarget, KEYS.spanTarget, KEYS.moonTarget, KEYS.starTarget, KEYS.starPairTarget]
  const kinds = anyOf as readonly Schema[]
  expect(kinds).toHaveLength(tables.length)
  return tables.map((table, kind) => [`${what}, kind ${kind}`, kinds[kind]!, table])
}

/** Each mapping of the schema with the keys the reader takes in its place. */
const MAPPINGS: readonly [string, Schema, KeyTable][] = [
  ['the file', CLAIM_SCHEMA, KEYS.file],
  ['structure', file.structure!, KEYS.structure],
  ['north', otherwise(file.north!), KEYS.north],
  ['grid', file.grid!, KEYS.grid],
  ['a point', otherwise(file.points!).additionalProperties as Schema, KEYS.point],
  ['a sightline', sightline, KEYS.sightline],
  ['sighted', otherwise(line.sighted!), KEYS.sighted],
  ['a span', line.span!, KEYS.span],
  ['the horizons of a span', otherwise(horizons), KEYS.spanHorizons],
  ['a horizon', otherwise(line.horizon!), KEYS.horizon],
  ['a horizon of a span', otherwise(propertiesOf(otherwise(horizons)).june!), KEYS.horizon],
  ...targetsIn('the target', file.target!),
  ...targetsIn('the target of a sightline', propertiesOf(sightline).target!),
  ['an independent date', file.other_dates!.items as Schema, KEYS.otherDate],
  ['atmosphere', file.atmosphere!, KEYS.atmosphere],
  ['claimed', file.claimed!, KEYS.claimed],
]

test.each(MAPPINGS)('%s has the keys that are read, and the same are required', (_, schema, table) => {
  const keys = Object.entries(table)
  const accepted = keys.map(([key]) => key)
  const required = keys.filter(([, use]) => use === 'required').map(([key]) => key)
  expect(Object.keys(propertiesOf(schema)).toSorted()).toEqual(accepted.toSorted())
  expect((schema.required as string[]).toSorted()).toEqual(required.toSorted())
  expect(schema.additionalProperties).toBe(false)
})

test('points may be a table, or have settings beside them', () => {
  const [table, named] = file.points!.anyOf as Schema[]
  expect(table).toMatchObject({ type: 'string' })
  expect(Object.keys(propertiesOf(named!))).toEqual(Object.keys(KEYS.pointSettings))
})

test('the mappings above are all there are', () => {
  const tables = [KEYS.pointSettings, ...MAPPINGS.map(([, , table]) => table)]
  expect(new Set<KeyTable>(tables)).toEqual(new Set<KeyTable>(Object.values(KEYS)))
})

test('every key is explained', () => {
  for (const [, schema] of MAPPINGS)
    for (const property of Object.values(propertiesOf(schema))) expect(property.description).toMatch(/\.$/)
})

test('it is JSON and names its dialect', () => {
  expect(JSON.parse(JSON.stringify(CLAIM_SCHEMA))).toEqual(CLAIM_SCHEMA)
  expect(CLAIM_SCHEMA.$schema).toBe('https://json-schema.org/draft/2020-12/schema')
})

test('every way to write a target has words of its own for its body', () => {
  const kinds = (file.target!.anyOf as Schema[]).map(propertiesOf)
  expect(kinds.map(({ body }) => body?.enum)).toEqual([['sun'], ['sun'], ['moon'], undefined, undefined])
  expect(kinds[3]?.body?.not).toEqual({ enum: ['sun', 'moon'] })
})

/** Whether a value holds to a schema, for the words of JSON Schema that the claim's uses (2020-12). */
function holds(schema: Schema, value: unknown): boolean {
  const all = (key: string) => (schema[key] as Schema[] | undefined) ?? []
  const isObject = typeof value === 'object' && value !== null && !Array.isArray(value)
  const entries = isObject ? Object.entries(value) : []
  const known = (schema.properties ?? {}) as Record<string, Schema>
  const others = schema.additionalProperties as Schema | false | undefined
  return (
    (schema.type !== 'object' || isObject) &&
    (schema.type !== 'string' || typeof value === 'string') &&
    (!('const' in schema) || schema.const === value) &&
    (!('enum' in schema) || (schema.enum as unknown[]).includes(value)) &&
    (!('anyOf' in schema) || all('anyOf').some((each) => holds(each, value))) &&
    (!('oneOf' in schema) || all('oneOf').filter((each) => holds(each, value)).length === 1) &&
    ((schema.required ?? []) as string[]).every((key) => isObject && Object.hasOwn(value, key)) &&
    entries.every(([key, entry]) => {
      if (Object.hasOwn(known, key)) return holds(known[key]!, entry)
      return others === undefined || (others !== false && holds(others, entry))
    })
  )
}

test.each<[string, Schema, unknown]>([
  ['horizons of a span that are unknown', line.span!, { angle: '50°', horizons: 'unknown' }],
  ['horizons of a span', line.span!, { angle: '50°', horizons: { june: '1°', december: 'unknown' } }],
  ['a point called file', file.points!, { file: { east: '1 m', north: '2 m' } }],
  ['a point called uncertainty', file.points!, { uncertainty: { latitude: '1° N', longitude: '2° E' } }],
  ['settings beside points', file.points!, { file: 'a.csv', uncertainty: '5 cm' }],
  ['a zone on an ellipsoid', file.grid!, { zone: 'UTM 55 S', ellipsoid: 'GRS80' }],
  ['a convergence', file.grid!, { convergence: '1° W' }],
  ['a distance and a rise', line.horizon!, { distance: '8 km', rise: '120 m' }],
])('the schema accepts %s', (_, schema, value) => {
  expect(holds(schema, value)).toBe(true)
})

test.each<[string, Schema, unknown]>([
  ['one horizon of a span', line.span!, { angle: '50°', horizons: '1°' }],
  ['an ellipsoid alone', file.grid!, { ellipsoid: 'GRS80' }],
  ['a zone and a convergence', file.grid!, { zone: 'UTM 55 S', convergence: '1° W' }],
  ['a point without a place', file.points!, { a: { uncertainty: '5 cm' } }],
  ['a point of half a place', file.points!, { a: { east: '5 m' } }],
  ['a point called file without a place', file.points!, { file: { uncertainty: '5 cm' } }],
  ['a distance without a rise', line.horizon!, { distance: '8 km' }],
  ['two forms of a horizon', line.horizon!, { distance: '8 km', rise: '120 m', sea: '25 m' }],
  ['a horizon of nothing', line.horizon!, {}],
])('the schema refuses %s', (_, schema, value) => {
  expect(holds(schema, value)).toBe(false)
})
