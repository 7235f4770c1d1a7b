/** A rectangle with its sides along the axes; y grows downwards. */
export interface Box {
  left: number
  right: number
  top: number
  bottom: number
}

/** The area two boxes share, 0 where they do not meet. */
export function sharedArea(a: Box, b: Box): number {
  const width = Math.min(a.right, b.right) - Math.max(a.left, b.left)
  const height = Math.min(a.bottom, b.bottom) - Math.max(a.top, b.top)
  return width > 0 && height > 0 ? width * height : 0
}
