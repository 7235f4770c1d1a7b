import type { AngleKind } from './angle-kind.ts'
import { diagnoseAngle } from './diagnose-angle.ts'
import { mapReading, misread, type Stretch, trimmedStretch } from './misread.ts'
import { plainCharacters } from './plain-characters.ts'
import { quoted } from './quoted.ts'
import type { Reading } from './reading.ts'

/** An angle as printed: its value and half a unit of its last printed digit, both in degrees. */
export interface PrintedAngle {
  deg: number
  halfDeg: number
}

const NUMBER = String.raw`\d+(?:\.\d+)?|\.\d+`
const DEGREE = '(?:°|deg(?:ree)?s?(?![a-z]))'
const MINUTE = '(?:′(?!′)|arcmin(?:ute)?s?(?![a-z]))'
const SECOND = '(?:″|′′|arcsec(?:ond)?s?(?![a-z]))'
const WITH_UNITS = new RegExp(
  String.raw`^\s*(?<lead>[NSEW])?\s*(?<sign>[-–+])?\s*` +
    String.raw`(?:(?<degrees>${NUMBER})\s*${DEGREE}\s*)?` +
    String.raw`(?:(?<minutes>${NUMBER})\s*${MINUTE}\s*)?` +
    String.raw`(?:(?<seconds>${NUMBER})\s*${SECOND}\s*)?(?<trail>[NSEW])?\s*$`,
  'di',
)
const BARE = new RegExp(
  String.raw`^\s*(?<lead>[NSEW])?\s*(?<sign>[-–+])?\s*(?<degrees>${NUMBER})\s*(?<trail>[NSEW])?\s*$`,
  'di',
)
const THREE_GROUPS =
  /^\s*(?<lead>[NSEW])?\s*(?<sign>[-–+])?\s*(?<degrees>\d+) +(?<minutes>\d+) +(?<seconds>\d+(?:\.\d+)?)\s*(?<trail>[NSEW])?\s*$/di

const PARTS = [
  { part: 'degrees', seconds: 3600 },
  { part: 'minutes', seconds: 60 },
  { part: 'seconds', seconds: 1 },
] as const

/**
 * Reads an angle in degrees as people print it: `49°34′18″`, `49 34 18`, `49.5717°`, `−0°12′`, `10′`, `30″`,
 * `41°16′12″ N`. A number without a unit is refused, except three groups, which are degrees, minutes, seconds, and
 * where the kind takes bare degrees.
 */
export function readAngle(text: string, kind: AngleKind): Reading<number> {
  return mapReading(readPrintedAngle(text, kind), ({ deg }) => deg)
}

/** Like `readAngle`, and tells how finely the angle is printed. */
export function readPrintedAngle(text: string, kind: AngleKind): Reading<PrintedAngle> {
  const plain = plainCharacters(text)
  const match = matchAngle(plain, kind)
  if (match === null) return diagnoseAngle(text, plain, kind)
  const size = sizeOf(match, text)
  if (!size.ok) return size
  const sign = signOf(match, text, kind)
  if (!sign.ok) return sign
  if (kind.needsLetter === true && size.value.deg !== 0 && !hasLetter(match)) return letterMissing(text, kind)
  const deg = sign.value * size.value.deg
  if (deg >= kind.lowDeg && deg <= kind.highDeg)
    return { ok: true, value: { ...size.value, deg: deg === 0 ? 0 : deg } }
  return misread('out-of-range', `${quoted(text.trim())} cannot be ${kind.name}`, trimmedStretch(text), {
    expected: `${kind.name} ${kind.limits}`,
  })
}

function matchAngle(plain: string, { takesBareDegrees = false }: AngleKind): RegExpExecArray | null {
  const match =
    WITH_UNITS.exec(plain) ?? THREE_GROUPS.exec(plain) ?? (takesBareDegrees ? BARE.exec(plain) : null)
  return match !== null && PARTS.some(({ part }) => match.groups?.[part] !== undefined) ? match : null
}

function sizeOf(match: RegExpExecArray, text: string): Reading<PrintedAngle> {
  const present = PARTS.filter(({ part }) => match.groups?.[part] !== undefined)
  let total = 0
  for (const [index, { part, seconds }] of present.entries()) {
    const digits = match.groups?.[part] ?? ''
    const isLast = index === present.length - 1
    if (!isLast && digits.includes('.')) return fractionInside(digits, stretchOf(match, part))
    if (index > 0 && Number(digits) >= 60) return sixtyOrMore(text, part, digits, stretchOf(match, part))
    total += Number(digits) * seconds
  }
  const last = present.at(-1) ?? PARTS[0]
  const decimals = (match.groups?.[last.part] ?? '').split('.')[1]?.length ?? 0
  return { ok: true, value: { deg: total / 3600, halfDeg: (last.seconds * 10 ** -decimals) / 7200 } }
}

function signOf(match: RegExpExecArray, text: string, kind: AngleKind): Reading<number> {
  const { sign, lead, trail } = match.groups ?? {}
  const place = stretchOf(match, trail === undefined ? 'lead' : 'trail')
  const letter = (trail ?? lead)?.toUpperCase()
  if (letter === undefined) return { ok: true, value: sign === undefined || sign === '+' ? 1 : -1 }
  if ((lead !== undefined && trail !== undefined) || kind.letters?.includes(letter) !== true)
    return wrongHemisphere(letter, text, place, kind)
  const letters = kind.letters.join(' or ')
  if (sign !== undefined)
    return misread(
      'sign-and-letter',
      `${quoted(text.trim())} has both a sign and a letter`,
      trimmedStretch(text),
      {
        expected: kind.needsLetter === true ? `${letters} without a sign` : `either a sign or ${letters}`,
      },
    )
  return { ok: true, value: letter === kind.letters[0] ? 1 : -1 }
}

function hasLetter({ groups }: RegExpExecArray): boolean {
  return groups?.lead !== undefined || groups?.trail !== undefined
}

function letterMissing(text: string, kind: AngleKind) {
  const [first, second] = kind.letters ?? ['E', 'W']
  const size = text.trim().replace(/^[-–+−＋﹣－‐‑]\s*/u, '')
  return misread(
    'letter-missing',
    `${quoted(text.trim())} does not say ${first} or ${second}`,
    trimmedStretch(text),
    {
      expected: `${kind.name} such as ${kind.example}`,
      suggestion: `${size} ${first} or ${size} ${second}`,
    },
  )
}

function wrongHemisphere(letter: string, text: string, place: Stretch, kind: AngleKind) {
  const message = `${quoted(letter)} in ${quoted(text.trim())} does not belong to ${kind.name}`
  const expected = kind.letters === null ? `${kind.name} ${kind.limits}` : kind.letters.join(' or ')
  return misread('wrong-hemisphere', message, place, { expected })
}

function fractionInside(digits: string, place: Stretch) {
  return misread('fraction-inside', `${quoted(digits)} has decimals although a smaller unit follows`, place, {
    expected: 'decimals in the last part only, such as 49°34.3′',
  })
}

function sixtyOrMore(text: string, part: string, digits: string, place: Stretch) {
  const message = `${quoted(digits)} ${part} in ${quoted(text.trim())}: there are only 60 in the next larger unit`
  return misread('sixty-or-more', message, place, { expected: `${part} below 60` })
}

function stretchOf(match: RegExpExecArray, group: string): Stretch {
  const [start, end] = match.indices?.groups?.[group] ?? [0, match[0].length]
  return { offset: start, length: end - start }
}
