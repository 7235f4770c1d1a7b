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
  ['the horizons of a span', horizons, KEYS.spanHorizons],
  ['a horizon', otherwise(line.horizon!), KEYS.horizon],
  ['a horizon of a span', otherwise(propertiesOf(horizons).june!), KEYS.horizon],
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
