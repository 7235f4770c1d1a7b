import { LARGEST_TOLERANCE_ARCMIN } from '../inference/limits.ts'
import { formatArcmin } from '../quantity/format-angle.ts'

const LARGEST = formatArcmin(LARGEST_TOLERANCE_ARCMIN)

/** Why a limit has no value, in the words of the report. */
export const NO_OTHER = 'the claim names no independent date'
export const OVERLAPS = 'it is much the same date as the asserted one, so no line could tell the two apart'
export const LEADS_NEVER = 'the asserted date does not lead by 3 to 1 at any tolerance'
export const LEADS_ALWAYS = `the asserted date still leads by 3 to 1 at ${LARGEST}, the largest tolerance looked at`
export const NEVER_HELD = `the 95 % dates do not hold all of it even at ${LARGEST}, the largest tolerance looked at`
export const OUTSIDE = 'it lies outside the window, at least in part'
export const ALWAYS_TELLS = `the line still tells half a bit at ${LARGEST}, the largest tolerance looked at`
