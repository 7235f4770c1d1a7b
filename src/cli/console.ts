/** What a command writes to, and what it must not look up for itself. */
export interface Console {
  stdout: { write(text: string): unknown }
  stderr: { write(text: string): unknown }
  color: boolean
  now: Date
}

/** The exit statuses of the program. */
export const EXIT = { done: 0, claimHasErrors: 1, wrongCommandLine: 2, fileTrouble: 3 } as const
