/**
 * The colours of the figures, chosen by their lightness so that they stay apart in grey print
 * (CIE L*: paper 100, outside 95, 95 % set 85, 68 % set 64, accent 30, ink 9).
 */
export const PALETTE = {
  paper: '#ffffff',
  outside: '#f0f0f0',
  set95: '#d4d4d4',
  set68: '#9b9b9b',
  rule: '#8a8a8a',
  muted: '#4d4d4d',
  accent: '#8a1c12',
  ink: '#1a1a1a',
} as const
