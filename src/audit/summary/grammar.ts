/** The words that change with the number of lines. */
export interface Grammar {
  /** `the line`, `the lines`. */
  lines: string
  it: string
  was: string
  does: string
  favours: string
  tells: string
}

export function grammarOf(lines: readonly unknown[]): Grammar {
  return lines.length === 1
    ? { lines: 'the line', it: 'it', was: 'was', does: 'does', favours: 'favours', tells: 'tells' }
    : { lines: 'the lines', it: 'they', was: 'were', does: 'do', favours: 'favour', tells: 'tell' }
}
