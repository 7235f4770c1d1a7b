import { MISREAD_CODES } from '../quantity/misread-codes.ts'

/** Every kind of problem with a claim file: one row a code. */
export const PROBLEM_CODES = {
  ...MISREAD_CODES,
  'file-too-large': 'The file is too long to be a claim.',
  'nested-too-deep': 'Brackets or indentation nested deeper than any claim needs.',
  'too-many-problems': 'The file has more problems than are listed.',
  'not-utf8': 'The file is not UTF-8 text at this place.',
  'control-character': 'An invisible control character stands in the text.',
  'line-ends': 'The lines end with a lone carriage return, as old Macintoshes wrote them.',
  'yaml-syntax': 'The file breaks a rule of YAML at this place.',
  'yaml-feature':
    'A feature of YAML that claim files do not use: anchors, aliases, tags, merges, directives.',
  'empty-file': 'The file holds nothing but space or comments.',
  'not-a-mapping': 'Keys with values are expected here.',
  'not-a-list': 'A list is expected here.',
  'not-text': 'One plain value is expected here, not a list or a mapping.',
  'empty-value': 'The key has no value.',
  'empty-name': 'A point or a sightline has an empty name.',
  'unknown-key': 'The claim file has no such key here.',
  'duplicate-key': 'The same key or name stands twice in one mapping.',
  'missing-key': 'A key that the claim cannot do without is missing.',
  'out-of-place': 'The key or word is legal elsewhere, but has no place beside the others here.',
  'unused-key': 'The key is legal, but nothing is computed from it.',
  'not-in-this-version': 'The claim file may say this, but this version cannot compute it.',
  'comma-in-braces': 'A comma inside { } or [ ] has cut a value in two.',
  'comment-cuts-text': 'A # after a space begins a comment, which has cut the text.',
  'unknown-word': 'The value is none of the words this key takes.',
  'unknown-body': 'The name is that of no body whose place this program computes.',
  'not-two-stars': 'Two different stars are needed for one to stand above the other.',
  'unknown-point': 'A sightline names a point that the file does not describe.',
  'line-to-itself': 'A sightline begins and ends at the same point.',
  'points-coincide': 'The two points of a sightline stand at the same place of the plan.',
  'direction-twice': 'A sightline has both an azimuth and points.',
  'event-twice': 'A target has both an event and a day.',
  'duplicate-label': 'Two independent dates have the same label.',
  'date-out-of-reach': 'A date outside the years for which the orbit of the Earth is tabulated here.',
  'date-outside-window': 'A date outside the window of dates thought possible.',
  'window-too-narrow': 'A window too narrow to weigh dates against each other.',
  'formula-lacking': 'The claim rests on a table this program does not have; that step cannot be tested.',
} as const

/** A stable name of a kind of problem. */
export type ProblemCode = keyof typeof PROBLEM_CODES
