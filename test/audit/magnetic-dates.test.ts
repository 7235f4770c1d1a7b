import { expect, test } from 'vitest'
import { MAGNETIC_DATES } from '../../src/audit/magnetic-dates.ts'
import { MAGNETIC_MODEL_SPAN } from '../../src/site/magnetic-declination.ts'

test('the dates told to readers of claims are those of the models', () => {
  expect(MAGNETIC_DATES).toEqual(MAGNETIC_MODEL_SPAN)
})
