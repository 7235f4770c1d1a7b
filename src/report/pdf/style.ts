import type { Face } from '../fonts/font-faces.ts'

/** All lengths in this folder are PostScript points, y downwards from the top of the page. A4. */
export const PAGE = { width: 595.28, height: 841.89 }

/**
 * The frame that text, tables and figures stand in. Running text keeps to the narrower `measure`, some 80
 * characters; what has columns or scales takes the whole width.
 */
export const FRAME = { left: 82, top: 76, width: 432, height: 692, measure: 388 }

/** Widest a figure can stand without being scaled down. */
export const COLUMN_WIDTH = FRAME.width

export const INK = '#141414'
export const QUIET_INK = '#555555'
export const LINK_INK = '#1c3f72'
export const RULE_INK = '#141414'

/** How a kind of text is set: its three faces, size, line distance. */
export interface TextStyle {
  readonly regular: Face
  readonly emphasis: Face
  readonly strong: Face
  readonly size: number
  readonly leading: number
  readonly colour: string
  /** Lines of like length, the last one too: for headings. */
  readonly balanced: boolean
}

const serif = { regular: 'serif', emphasis: 'serifItalic', strong: 'serifSemibold' } as const
const sans = { regular: 'sans', emphasis: 'sansItalic', strong: 'sansSemibold' } as const
const semibold = { regular: 'sansSemibold', emphasis: 'sansSemibold', strong: 'sansSemibold' } as const
const code = { regular: 'code', emphasis: 'code', strong: 'code' } as const
const plain = { colour: INK, balanced: false }
const balanced = { colour: INK, balanced: true }

export const TEXT = {
  body: { ...serif, ...plain, size: 10, leading: 14 },
  title: { ...semibold, ...balanced, size: 20, leading: 24 },
  section: { ...semibold, ...balanced, size: 13, leading: 17 },
  subsection: { ...semibold, ...balanced, size: 10.5, leading: 14 },
  minor: { ...semibold, ...balanced, size: 9, leading: 13 },
  caption: { ...sans, ...plain, size: 8.5, leading: 11.5 },
  table: { ...sans, ...plain, size: 8.5, leading: 11 },
  tableHead: { ...semibold, ...plain, size: 8.5, leading: 11 },
  code: { ...code, ...plain, size: 8, leading: 11.5 },
  runningHead: { ...sans, ...plain, size: 8, leading: 11, colour: QUIET_INK },
} as const satisfies Record<string, TextStyle>

/** Baseline of a line of text below the top of its strip: capitals, two thirds of the size, stand centred. */
export function baselineOf(style: TextStyle): number {
  return (style.leading + 0.66 * style.size) / 2
}
