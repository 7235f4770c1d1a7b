import { quoted } from '../../quantity/quoted.ts'
import { LONGEST_TABLE } from '../longest-table.ts'
import { checkCharacters } from './check-characters.ts'
import { type Context, type Field, reportError, valueStretch } from './field.ts'
import { withLineFeeds } from './line-ends.ts'
import { readFileName } from './read-file-name.ts'

/** A file beside the claim file, with a context that tells its problems at their place in it. */
export interface BesideFile {
  path: string
  text: string
  context: Context
}

/** Reads the file that a field names; null, with the problem reported, where it cannot be read or is no text. */
export function readBesideFile(field: Field, context: Context): BesideFile | null {
  const path = readFileName(field, context)
  if (path === null) return null
  const read = context.beside.read(path)
  if ('trouble' in read) {
    reportError(context, field, 'file-not-read', `${quoted(path)} cannot be read: ${read.trouble}`, {
      expected: 'a file in the folder of the claim file, by its path from there',
    })
    return null
  }
  context.beside.attachments.set(path, read.sha256)
  if (read.text.length > LONGEST_TABLE) {
    reportError(context, field, 'file-too-large', `${quoted(path)} is ${read.text.length} characters long`, {
      expected: `a table of at most ${LONGEST_TABLE} characters`,
    })
    return null
  }
  const { text } = read
  const besideContext = contextOf(path, text, field, context)
  const problems = checkCharacters(text.replace(/^\ufeff/, ' '))
  for (const problem of problems) besideContext.report({ ...problem, path: field.path })
  return problems.length === 0 ? { path, text, context: besideContext } : null
}

function contextOf(path: string, text: string, field: Field, context: Context): Context {
  const beside = { path, text, namedAt: valueStretch(field).offset }
  return {
    ...context,
    text,
    lineOf: (offset) => withLineFeeds(text.slice(0, offset)).split('\n').length,
    report: (problem) => context.report({ ...problem, beside }),
  }
}
