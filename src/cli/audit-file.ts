import { basename, dirname, extname, join } from 'node:path'
import type { Audit } from '../audit/audit.ts'
import { makeAudit } from '../audit/make-audit.ts'
import { formatProblem } from '../claim/format-problem.ts'
import { VERSION } from '../version.ts'
import type { Command } from './command-line.ts'
import { type Console, EXIT } from './console.ts'
import { fileTrouble } from './file-trouble.ts'
import { readClaimFile } from './read-claim-file.ts'
import { type OutputFile, writeFiles } from './write-files.ts'

type AuditCommand = Extract<Command, { name: 'audit' }>

/** A template's text, and the name to tell its problems under. */
export interface TemplateSource {
  text: string
  path: string
}

/** Audits one claim file and writes what was asked for; returns the exit status. */
export async function auditFile(
  path: string,
  { formats, out }: AuditCommand,
  template: TemplateSource,
  console: Console,
): Promise<number> {
  const read = await readClaimFile(path, console)
  if ('status' in read) return read.status
  const audit = makeAudit(read.claim, {
    version: VERSION,
    file: basename(path),
    sha256: read.sha256,
    now: console.now,
    readingWarnings: read.warnings,
  })
  const stem = outputStem(path, out)
  const files = [...(formats.includes('json') ? [jsonFile(audit, stem)] : [])]
  if (formats.includes('pdf') || formats.includes('md')) {
    const rendered = await renderedFiles(audit, formats, template, stem, console)
    if (rendered === null) return EXIT.claimHasErrors
    files.push(...rendered)
  }
  try {
    await writeFiles(files)
  } catch (error) {
    console.stderr.write(fileTrouble(error, 'write', (error as NodeJS.ErrnoException).path ?? stem))
    return EXIT.fileTrouble
  }
  for (const file of files.filter((file) => !file.path.endsWith('.svg')))
    console.stdout.write(`${file.path}\n`)
  return EXIT.done
}

/** Where the outputs of a claim file go, without their endings. */
export function outputStem(path: string, out: string | null): string {
  return join(out ?? dirname(path), `${basename(path, extname(path))}.audit`)
}

function jsonFile(audit: Audit, stem: string): OutputFile {
  return { path: `${stem}.json`, data: `${JSON.stringify(audit, null, 2)}\n` }
}

/** The report is loaded only where it is asked for; null where the template has errors. */
async function renderedFiles(
  audit: Audit,
  formats: AuditCommand['formats'],
  template: TemplateSource,
  stem: string,
  console: Console,
): Promise<OutputFile[] | null> {
  const { renderTemplate } = await import('../report/template/render-template.ts')
  const { tree, problems } = renderTemplate(template.text, audit)
  for (const problem of problems) {
    console.stderr.write(`${formatProblem(problem, template.text, template.path, console)}\n`)
  }
  if (tree === null) return null
  const files: OutputFile[] = []
  if (formats.includes('pdf')) {
    const { writePdf } = await import('../report/pdf/write-pdf.ts')
    const warn = (message: string) => console.stderr.write(`datestone: warning: ${message}\n`)
    files.push({ path: `${stem}.pdf`, data: await writePdf(tree, { createdOn: console.now, warn }) })
  }
  if (formats.includes('md')) {
    const { writeMarkdown } = await import('../report/write-markdown.ts')
    const { figuresOf } = await import('../report/figures-of.ts')
    const figurePath = (name: string) => `${basename(stem)}-${name}.svg`
    for (const { name, svg } of figuresOf(tree))
      files.push({ path: join(dirname(stem), figurePath(name)), data: svg })
    files.push({ path: `${stem}.md`, data: writeMarkdown(tree, { figurePath }) })
  }
  return files
}
