import { type Context, type Field, reportError } from './field.ts'
import { readEntries } from './read-entries.ts'

/** Reads a mapping whose keys are names that people choose: points, sightlines. */
export function readNames(field: Field, context: Context, expected: string): readonly Field[] | null {
  const entries = readEntries(field, context, expected)
  return entries?.filter((entry) => entry.name.trim() !== '' || !reportNameless(entry, context)) ?? null
}

function reportNameless(entry: Field, context: Context): true {
  reportError(context, entry, 'empty-name', 'this entry has an empty name', {
    expected: 'a name',
    at: entry.keyAt,
  })
  return true
}
