import { parseArgs } from 'node:util'
import { nearMiss } from '../quantity/near-miss.ts'

export const FORMATS = ['pdf', 'md', 'json'] as const
export type Format = (typeof FORMATS)[number]

export type Command =
  | { name: 'help' }
  | { name: 'version' }
  | { name: 'audit'; files: string[]; formats: Format[]; template: string; out: string | null }
  | { name: 'check'; files: string[] }
  | { name: 'new'; file: string }

/** A command line that cannot be followed, in one sentence. */
export interface CommandLineError {
  error: string
}

const OPTIONS = {
  as: { type: 'string', multiple: true },
  template: { type: 'string', multiple: true },
  out: { type: 'string', multiple: true },
  help: { type: 'boolean', short: 'h' },
  version: { type: 'boolean' },
} as const

const COMMANDS = ['audit', 'check', 'new'] as const

/** Reads the words of a command line, without the program's own name. */
export function readCommandLine(argv: readonly string[]): Command | CommandLineError {
  const unknown = argv.find(
    (word) => word.startsWith('--') && !(optionName(word) in OPTIONS) && word !== '--',
  )
  if (unknown !== undefined) {
    return {
      error: `there is no option \`${unknown}\`${hint(optionName(unknown), Object.keys(OPTIONS), '--')}`,
    }
  }
  let parsed: ReturnType<typeof parse>
  try {
    parsed = parse(argv)
  } catch (problem) {
    return { error: (problem as Error).message }
  }
  const { values, positionals } = parsed
  const [command, ...files] = positionals
  if (values.help === true || command === 'help') return { name: 'help' }
  if (values.version === true) return { name: 'version' }
  if (command === undefined) return { error: 'say what to do: audit, check or new' }
  return commandOf(command, files, values)
}

type Values = ReturnType<typeof parse>['values']

function parse(argv: readonly string[]) {
  return parseArgs({ args: [...argv], options: OPTIONS, allowPositionals: true, strict: true })
}

function commandOf(command: string, files: string[], values: Values): Command | CommandLineError {
  if (files.includes('-')) {
    return { error: '`-` is not read as the standard input; save the claim as a file, and name that' }
  }
  switch (command) {
    case 'audit':
      return files.length === 0 ? noFile(command) : auditOf(files, values)
    case 'check':
      return files.length === 0 ? noFile(command) : withoutOptions(values, { name: 'check', files })
    case 'new':
      if (files.length !== 1) return { error: `\`new\` takes one file to write, not ${files.length}` }
      return withoutOptions(values, { name: 'new', file: files[0]! })
    default:
      return { error: `there is no command \`${command}\`${hint(command, COMMANDS, '')}` }
  }
}

function noFile(command: string): CommandLineError {
  return { error: `\`${command}\` needs a claim file, as in: datestone ${command} court.yaml` }
}

function withoutOptions(values: Values, command: Command): Command | CommandLineError {
  const stray = (['as', 'template', 'out'] as const).find((option) => values[option] !== undefined)
  return stray === undefined
    ? command
    : { error: `\`--${stray}\` goes with \`audit\`, not with \`${command.name}\`` }
}

function auditOf(files: string[], values: Values): Command | CommandLineError {
  const device = files.find((file) => /^\/(?:dev|proc)\//.test(file))
  if (device !== undefined) {
    return {
      error: `\`${device}\` has no place beside it for the audit; save the claim as a file, and name that`,
    }
  }
  const twice = (['template', 'out'] as const).find((option) => (values[option]?.length ?? 0) > 1)
  if (twice !== undefined) return { error: `\`--${twice}\` stands there more than once` }
  const asked = values.as?.join(',') ?? 'pdf,md'
  const words = asked.split(',').map((word) => word.trim())
  const wrong = words.find((word) => !FORMATS.includes(word as Format))
  if (wrong !== undefined) {
    return {
      error: `\`--as ${asked}\`: \`${wrong}\` is not a format; write pdf, md or json, with commas between`,
    }
  }
  const formats = [...new Set(words as Format[])]
  const [template = 'audit'] = values.template ?? []
  const [out = null] = values.out ?? []
  return { name: 'audit', files, formats, template, out }
}

function optionName(word: string): string {
  return word.replace(/^--/, '').replace(/=.*$/, '')
}

function hint(word: string, known: readonly string[], prefix: string): string {
  const near = nearMiss(word, known)
  return near === null ? '' : `; did you mean \`${prefix}${near}\`?`
}
