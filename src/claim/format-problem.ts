import pc from 'picocolors'
import type { Problem } from '../quantity/problem.ts'
import { visibleControls } from '../quantity/quoted.ts'
import { cutAround } from './read/cut-around.ts'
import { withLineFeeds } from './read/line-ends.ts'

/**
 * Prints a problem for a terminal: `file:line:column: error: message`, then the line it stands on, cut to
 * 80 columns around the marked place, with carets below it, and what to write instead. Lines and columns
 * count from 1, columns in characters. A problem of a file beside `file` is printed with the name and a line of that.
 */
export function formatProblem(
  problem: Problem,
  ownText: string,
  ownFile: string,
  options: { color?: boolean } = {},
): string {
  const colors = pc.createColors(options.color ?? false)
  const { severity, message, path, expected, suggestion, beside } = problem
  const text = beside?.text ?? ownText
  const file = beside === undefined ? ownFile : ownFile.replace(/[^/\\]*$/, '') + beside.path
  const { line, column } = positionOf(text, problem.offset)
  const paint = severity === 'error' ? colors.red : colors.yellow
  const place = colors.bold(`${visibleControls(file)}:${line}:${column}:`)
  const excerpt = excerptOf(text, problem)
  const details = [
    path === null ? null : `field: ${visibleControls(path)}`,
    expected === null ? null : `expected: ${visibleControls(expected)}`,
    suggestion === null ? null : `write: ${visibleControls(suggestion)}`,
  ]
  return [
    `${place} ${paint(`${severity}:`)} ${visibleControls(message)}`,
    `  ${excerpt.shown}`,
    `  ${paint(excerpt.carets)}`,
    ...details.filter((detail) => detail !== null).map((detail) => `  ${detail}`),
  ].join('\n')
}

/** Line and column of an offset, both from 1; a column is one character (code point), a tab included. */
export function positionOf(text: string, offset: number): { line: number; column: number } {
  const before = withLineFeeds(text).slice(0, offset)
  const inLine = before.slice(before.lastIndexOf('\n') + 1).replace(/^\ufeff/, '')
  return { line: before.split('\n').length, column: [...inLine].length + 1 }
}

function excerptOf(written: string, { offset, length }: Problem): { shown: string; carets: string } {
  const text = withLineFeeds(written)
  const start = text.slice(0, offset).lastIndexOf('\n') + 1
  const line = /^[^\n]*/.exec(text.slice(start))?.[0].replace(/\r$/, '') ?? ''
  const from = Math.min(offset - start, line.length)
  return cutAround(line, from, Math.min(from + length, line.length))
}
