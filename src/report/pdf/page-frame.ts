import { plainRun } from './inline-runs.ts'
import { drawRule } from './rule.ts'
import type { Shaper } from './shaper.ts'
import type { Painter } from './strip.ts'
import { FRAME, PAGE, QUIET_INK, TEXT } from './style.ts'
import { linesOfRuns, paintLine } from './text-lines.ts'

export interface Folio {
  readonly page: number
  readonly pages: number
}

const HEAD_BASELINE = 48
const FOOT_BASELINE = PAGE.height - 40

/** Short title and page number over a page; the first page has its number in the foot only. */
export function paintPageFrame(painter: Painter, shape: Shaper, shortTitle: string, folio: Folio): void {
  painter.tagger.artifact('Pagination', () => {
    const number = `page ${folio.page} of ${folio.pages}`
    if (folio.page === 1) return paintAt(painter, shape, number, 'right', FOOT_BASELINE)
    paintAt(painter, shape, shortTitle, 'left', HEAD_BASELINE)
    paintAt(painter, shape, number, 'right', HEAD_BASELINE)
    const rule = { left: FRAME.left, width: FRAME.width, weight: 0.4, colour: QUIET_INK }
    drawRule(painter, rule, HEAD_BASELINE + 5.5)
  })
}

const TITLE_WIDTH = FRAME.width - 80

function paintAt(
  painter: Painter,
  shape: Shaper,
  text: string,
  side: 'left' | 'right',
  baseline: number,
): void {
  const lines = linesOfRuns([plainRun(text, TEXT.runningHead)], TEXT.runningHead, TITLE_WIDTH, shape)
  const [line] = lines.length === 1 ? lines : shortened(text, shape)
  const left = side === 'left' ? FRAME.left : FRAME.left + FRAME.width - line!.width
  paintLine(painter, line!, left, baseline, null)
}

/** The words that fit, and an ellipsis. */
function shortened(text: string, shape: Shaper): ReturnType<typeof linesOfRuns> {
  const words = text.split(/\s+/)
  for (let count = words.length - 1; count > 0; count--) {
    const run = plainRun(`${words.slice(0, count).join(' ')}…`, TEXT.runningHead)
    const lines = linesOfRuns([run], TEXT.runningHead, TITLE_WIDTH, shape)
    if (lines.length === 1) return lines
  }
  return linesOfRuns([plainRun(text, TEXT.runningHead)], TEXT.runningHead, TITLE_WIDTH, shape)
}
