import { mkdir, rename, rm, stat, writeFile } from 'node:fs/promises'
import { basename, dirname, join } from 'node:path'

export interface OutputFile {
  path: string
  data: string | Uint8Array
}

/**
 * Writes files whole or not at all: each under a temporary name beside its place first, then all renamed into place.
 * What goes wrong before the renaming leaves nothing behind, and a folder in the place of a file is found before it.
 * Throws the system's error, its `path` being the file that could not be written.
 */
export async function writeFiles(files: readonly OutputFile[]): Promise<void> {
  const staged = files.map((file, i) => ({ ...file, temporary: temporaryName(file.path, i) }))
  let current = ''
  try {
    for (const { path } of staged) {
      current = path
      await refuseFolder(path)
    }
    for (const { path, temporary, data } of staged) {
      current = path
      await mkdir(dirname(path), { recursive: true })
      await writeFile(temporary, data, { flag: 'wx' })
    }
    for (const { path, temporary } of staged) {
      current = path
      await rename(temporary, path)
    }
  } catch (error) {
    // Where a temporary file cannot be there, removing it fails too; what is told is the first error.
    await Promise.allSettled(staged.map(({ temporary }) => rm(temporary, { force: true })))
    throw Object.assign(error as Error, { path: current })
  }
}

async function refuseFolder(path: string): Promise<void> {
  const isFolder = await stat(path).then(
    (found) => found.isDirectory(),
    (error: NodeJS.ErrnoException) => {
      if (error.code === 'ENOENT') return false
      throw error
    },
  )
  if (isFolder) throw Object.assign(new Error('it is a folder'), { code: 'EISDIR' })
}

function temporaryName(path: string, index: number): string {
  return join(dirname(path), `.${basename(path)}.${process.pid}-${index}.part`)
}
