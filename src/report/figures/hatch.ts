import type { Box } from './box.ts'
import { round2 } from './shape.ts'

/**
 * Path data of parallel lines that fill a box, cut at its edges by computation (no clipping, which not every
 * output draws). `rising` lines lean to the right as they go up; `spacing` is along the horizontal.
 */
export function hatch(box: Box, spacing: number, rising: boolean): string {
  const height = box.bottom - box.top
  const width = box.right - box.left
  if (!(width > 0 && height > 0)) return ''
  const parts: string[] = []
  // Each line leaves the bottom edge (rising) or the top edge (falling) at `start` and runs at 45° to the right.
  for (let start = box.left - height + spacing / 2; start < box.right; start += spacing) {
    const first = Math.max(0, box.left - start)
    const last = Math.min(height, box.right - start)
    if (last - first < 0.05) continue
    const y = (along: number) => (rising ? box.bottom - along : box.top + along)
    parts.push(`M${round2(start + first)} ${round2(y(first))}L${round2(start + last)} ${round2(y(last))}`)
  }
  return parts.join('')
}
