/** What can be wrong with the text of a quantity: one row a code. */
export const MISREAD_CODES = {
  'not-readable': 'The text is not a quantity of the kind this key takes.',
  'unit-missing': 'A bare number: its unit has to be written, since several would be possible.',
  'tolerance-without-unit': 'The number after ± has no unit.',
  'unexpected-tolerance': 'This key takes a plain value; its uncertainty has no place here.',
  'several-tolerances': 'More than one ± or `within` in one value.',
  'negative-uncertainty': 'An uncertainty below zero.',
  'zero-uncertainty': 'A stated uncertainty of zero: used as given, though no measurement is exact.',
  'decimal-comma': 'A comma inside a number; the decimal sign is a point.',
  'fraction-inside': 'Only the last part of an angle in degrees, minutes and seconds may have decimals.',
  'sixty-or-more': 'Minutes or seconds of 60 or more beside a larger unit.',
  'wrong-hemisphere': 'A letter of the compass that does not belong to this angle.',
  'letter-missing': 'An angle that has to say east or west: a bare sign is used in both senses.',
  'sign-and-letter': 'Both a sign and a letter of the compass.',
  'out-of-range': 'A value outside what is possible or what this program computes.',
  'range-backwards': 'A range whose end comes before its start.',
  'range-without-width': 'A range whose two ends are the same.',
  'range-missing': 'One value where a range of two is needed.',
  'date-ambiguous': 'A date in figures, of which the day or the month may come first.',
  'date-incomplete': 'A day of the calendar needs its day, its month and a year of four digits.',
  'year-without-era': 'A year that does not say whether it is BCE or CE.',
  'year-negative': 'A negative year can be an astronomical year number or stand for BCE, one year apart.',
  'year-zero': 'No era has a year 0: 1 BCE is followed by 1 CE.',
  'year-fraction': 'A calendar year is a whole number.',
  'radiocarbon-age':
    'A bare BP is mostly a radiocarbon age, which is not a calendar date; it is read as cal BP.',
} as const

/** A stable name of a kind of problem with the text of a quantity. */
export type MisreadCode = keyof typeof MISREAD_CODES
