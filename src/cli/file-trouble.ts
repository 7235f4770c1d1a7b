import { visibleControls } from '../quantity/quoted.ts'

/** What the commonest system errors mean to a person. */
const MEANINGS: Readonly<Record<string, string>> = {
  ENOENT: 'there is no such file or folder',
  EISDIR: 'it is a folder',
  ENOTDIR: 'a part of its path is not a folder',
  EACCES: 'permission is denied',
  EPERM: 'it is not permitted',
  EROFS: 'the disk is read-only',
  ENOSPC: 'the disk is full',
  ELOOP: 'its links lead round in a circle',
  ENAMETOOLONG: 'its name is too long',
  ENXIO: 'it is not a plain file',
  ERR_INVALID_ARG_VALUE: 'no file can have such a name',
  EEXIST: 'it exists already, and is left alone',
}

/** One line for stderr about a file that could not be read or written. */
export function fileTrouble(error: unknown, deed: 'read' | 'write', path: string): string {
  return troubleLine(deed, path, meaningOf(error))
}

/** The same line where the trouble is known in words. */
export function troubleLine(deed: 'read' | 'write', path: string, trouble: string): string {
  return `datestone: cannot ${deed} ${visibleControls(path)}: ${trouble}\n`
}

/** What a system error means to a person: `there is no such file or folder`. */
export function meaningOf(error: unknown): string {
  const { code, message } = error as NodeJS.ErrnoException
  return (code && MEANINGS[code]) ?? message
}
