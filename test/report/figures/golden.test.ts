import { describe, expect, it } from 'vitest'
import { premiseFigure } from '../../../src/report/figures/premise-figure.ts'
import { trackFigure } from '../../../src/report/figures/track-figure.ts'
import { writeSvg } from '../../../src/report/write-svg.ts'
import { CASES } from './cases.ts'
import { differsFromGolden } from './golden.ts'

// The golden files were looked at as pictures when they were taken; what they show is asserted in the other tests.
describe.each(Object.entries(CASES))('the figures of the case `%s`', (name, makeCase) => {
  it('are drawn as they were', () => {
    const audit = makeCase()
    expect(differsFromGolden(`${name}-premise.svg`, writeSvg(premiseFigure(audit).drawing))).toBeNull()
    expect(
      differsFromGolden(`${name}-track.svg`, writeSvg(trackFigure(audit, 'midsummer').drawing)),
    ).toBeNull()
  })
})
