import { expect, test } from 'vitest'
import * as library from '../src/index.ts'

test('the library exports these and no others', () => {
  expect(Object.keys(library).sort()).toEqual([
    'claimSchema',
    'figuresOf',
    'findStar',
    'formatProblem',
    'magneticDates',
    'makeAudit',
    'newClaim',
    'readClaim',
    'renderTemplate',
    'runCli',
    'writeMarkdown',
    'writePdf',
  ])
})
