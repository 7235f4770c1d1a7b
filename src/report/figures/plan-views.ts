import { type AcrossScale, magnified } from './plan-across.ts'
import { type PlanFlags, planFlags } from './plan-flags.ts'
import { planNotes } from './plan-notes.ts'
import type { PlanSource } from './plan-source.ts'

/** The view along one line, from the top: its head, notes, the flags of its dates, the board, the fan of sight. */
export interface PlanView {
  source: PlanSource
  notes: readonly string[]
  flags: PlanFlags
  top: number
  boardTop: number
  board: number
  /** From the board down to the eye. */
  depth: number
}

/** Down to the baseline of the head, and of each note after it. */
export const VIEW_ROW = 9
const HEAD = 11

const BOARD = 10
const GAP = 9
const LEAST_DEPTH = 9
const MOST_DEPTH = 130

/**
 * Stacks the views from `top` down in about the height `most`, all of one depth and one magnification; `isShort` has
 * their flags in one line each.
 */
export function stackViews(
  sources: readonly PlanSource[],
  scale: AcrossScale,
  { top, most, isShort }: { top: number; most: number; isShort: boolean },
): { views: PlanView[]; factor: number; height: number } {
  const heads = sources.map((source) => {
    const notes = planNotes(source, scale.right - scale.left)
    const flags = planFlags(source, scale, isShort)
    return { source, notes, flags, height: HEAD + notes.length * VIEW_ROW + flags.height }
  })
  const fixed = heads.reduce((sum, head) => sum + head.height + BOARD + GAP, 0)
  const room = Math.max(LEAST_DEPTH, Math.min(MOST_DEPTH, (most - fixed) / sources.length))
  const { factor, height: depth } = magnified(scale, room)
  const views: PlanView[] = []
  let at = top
  for (const { height, ...head } of heads) {
    views.push({ ...head, top: at, boardTop: at + height, board: BOARD, depth })
    at += height + BOARD + depth + GAP
  }
  return { views, factor, height: at - top }
}
