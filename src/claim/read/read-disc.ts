import { misread, trimmedStretch } from '../../quantity/misread.ts'
import { foldWord, nearMiss } from '../../quantity/near-miss.ts'
import { quoted } from '../../quantity/quoted.ts'
import { readAngle } from '../../quantity/read-angle.ts'
import type { Reading } from '../../quantity/reading.ts'
import type { Disc } from '../claim.ts'
import { SHOWING } from './kinds.ts'

export const DISC_PARTS = ['upper limb', 'centre', 'lower limb'] as const
export const DISC_EXPECTED = 'upper limb, centre, lower limb, so much of it as in 2′ showing, or unknown'

const CALLED: ReadonlyMap<string, (typeof DISC_PARTS)[number]> = new Map([
  ['upper', 'upper limb'],
  ['top', 'upper limb'],
  ['upperedge', 'upper limb'],
  ['firstgleam', 'upper limb'],
  ['lastgleam', 'upper limb'],
  ['half', 'centre'],
  ['middle', 'centre'],
  ['lower', 'lower limb'],
  ['bottom', 'lower limb'],
  ['loweredge', 'lower limb'],
  ['full', 'lower limb'],
])

/** Reads which part of the disc stands on the horizon: `upper limb`, `centre`, `lower limb` or `2′ showing`. */
export function readDisc(text: string): Reading<Disc> {
  const part = DISC_PARTS.find((word) => foldWord(word) === foldWord(text))
  if (part !== undefined) return { ok: true, value: { part } }
  if (foldWord(text) === 'center') return { ok: true, value: { part: 'centre' } }
  const showing = /\s*showing\s*$/i.exec(text)
  if (showing === null)
    return misread('not-readable', `${quoted(text.trim())} is not a part of the disc`, trimmedStretch(text), {
      expected: DISC_EXPECTED,
      suggestion: CALLED.get(foldWord(text)) ?? nearMiss(text, DISC_PARTS),
    })
  const angle = readAngle(text.slice(0, showing.index), SHOWING)
  return angle.ok ? { ok: true, value: { part: 'showing', showingArcmin: toArcmin(angle.value) } } : angle
}

/** Arcminutes, rounded to a trillionth, which undoes what the way through degrees adds to a whole number. */
export function toArcmin(deg: number): number {
  return Number((deg * 60).toPrecision(12))
}
