import type { Problem } from '../../quantity/problem.ts'
import { IN_BRACES, IN_QUOTES } from './key-inside-text.ts'

/** Whether the break of syntax is confined to one plain text, so that the rest of the file can still be read. */
export function isMendable({ expected }: Problem): boolean {
  return expected === IN_QUOTES || expected === IN_BRACES
}

/**
 * The file with the marked text made harmless, for reading what stands around it: of the same length, so that
 * all offsets stay. The text itself is not as written any more and must not be used.
 */
export function mendYaml(text: string, { offset, length }: Problem): string {
  const end = offset + length
  const harmless = text
    .slice(offset, end)
    .replace(/^[^\p{L}\p{N}]/u, 'x')
    .replace(/:(?=\s|$)/g, '∶')
    .replace(/(?<=\s)#/g, '♯')
  return (
    text.slice(0, offset) + (harmless.length === length ? harmless : 'x'.repeat(length)) + text.slice(end)
  )
}
