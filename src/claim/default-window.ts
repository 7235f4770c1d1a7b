/** The dates thought possible where the claim names no window, 20001 BCE to 2026 CE; a choice of this program. */
export const DEFAULT_WINDOW = { from: -20000, to: 2026 } as const
