import { newClaim } from './claim/new-claim.ts'
import { auditFile, outputStem } from './cli/audit-file.ts'
import { type Command, readCommandLine } from './cli/command-line.ts'
import { type Console, EXIT } from './cli/console.ts'
import { fileTrouble } from './cli/file-trouble.ts'
import { findTemplate, templateTrouble } from './cli/find-template.ts'
import { HELP } from './cli/help.ts'
import { readClaimFile } from './cli/read-claim-file.ts'
import { VERSION } from './version.ts'

export type { Console } from './cli/console.ts'

/** The command line as a function: runs `argv` (without the program's own name) and returns the exit status. */
export async function runCli(argv: readonly string[], console: Console): Promise<number> {
  const command = readCommandLine(argv)
  if ('error' in command) {
    console.stderr.write(`datestone: ${command.error}\nTry: datestone --help\n`)
    return EXIT.wrongCommandLine
  }
  switch (command.name) {
    case 'help':
      console.stdout.write(HELP)
      return EXIT.done
    case 'version':
      console.stdout.write(`${VERSION}\n`)
      return EXIT.done
    case 'new':
      return writeNew(command.file, console)
    case 'check':
      return worst(command.files, (file) => checkFile(file, console))
    case 'audit':
      return audit(command, console)
  }
}

async function audit(command: Extract<Command, { name: 'audit' }>, console: Console): Promise<number> {
  const stems = command.files.map((file) => outputStem(file, command.out))
  const twice = command.files.find((_, i) => stems.indexOf(stems[i]!) !== i)
  if (twice !== undefined) {
    console.stderr.write(
      `datestone: ${twice} would overwrite the audit of another of the files; audit it by itself\n`,
    )
    return EXIT.wrongCommandLine
  }
  try {
    const template = await findTemplate(command.template)
    return await worst(command.files, (file) => auditFile(file, command, template, console))
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === undefined) throw error
    console.stderr.write(templateTrouble(error, command.template))
    return EXIT.fileTrouble
  }
}

async function checkFile(file: string, console: Console): Promise<number> {
  const read = await readClaimFile(file, console)
  if ('status' in read) return read.status
  console.stdout.write(`${file}: no errors\n`)
  return EXIT.done
}

async function writeNew(file: string, console: Console): Promise<number> {
  const { writeFile } = await import('node:fs/promises')
  try {
    await writeFile(file, newClaim(), { flag: 'wx' })
  } catch (error) {
    console.stderr.write(fileTrouble(error, 'write', file))
    return EXIT.fileTrouble
  }
  console.stdout.write(`${file}\n`)
  return EXIT.done
}

/** Runs a deed for each file, in turn; the highest status of all. */
async function worst(files: readonly string[], deed: (file: string) => Promise<number>): Promise<number> {
  let status: number = EXIT.done
  for (const file of files) status = Math.max(status, await deed(file))
  return status
}
