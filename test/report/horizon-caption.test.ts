import { describe, expect, it } from 'vitest'
import { horizonCaption } from '../../src/report/captions/horizon.ts'
import { plainText } from '../../src/report/plain-text.ts'
import { FIGURES } from '../../src/report/template/figures.ts'
import { calendarAudit, noonAudit } from './figures/cases.ts'
import { HORIZON_CASES } from './figures/horizon-cases.ts'

function caption(name: string): string {
  const audit = HORIZON_CASES[name]!()
  return horizonCaption(audit, audit.sightlines[0]!).map(plainText).join('')
}

describe('the caption of a horizon', () => {
  it('tells how to read it', () => {
    expect(caption('level')).toBe(
      'The target of midsummer on the skyline. The circles are the Sun at its true size at the June solstice sunrise, ' +
        'to one scale both ways: thick red at the asserted date, grey at the independent one and broken today; ' +
        'refraction flattens the real disc a little. The upright is the line as measured, the bracket under it the ' +
        'build tolerances held plausible, the grey about the line and the skyline one standard deviation, a bar on a ' +
        'stem the directions over the whole of that date; the skyline is drawn level.',
    )
  })

  it.each([
    ['high', 'The circles are the Moon at its mean size at the northern major standstill moonrise'],
    ['star', 'The crosses are the rising of Sirius: thick red at the asserted date'],
    ['north', 'The crosses are the rising of Sirius, seen from 2°24′ up: thick red'],
    ['crowded', 'grey at the independent dates'],
    ['far', 'An arrow points to what lies beyond the picture.'],
    [
      'sea',
      'held plausible (an arrow head where they reach beyond the picture), the whisker at its foot one standard',
    ],
    ['nowhere', 'There is no June solstice sunrise at that altitude in 9700 to 9500 BCE (asserted date).'],
  ])('says what is so of the case `%s`', (name, words) => {
    expect(caption(name)).toContain(words)
  })

  it.each([
    // So high up a disc is round.
    ['high', 'refraction flattens'],
    ['cliff', 'drawn level'],
    ['sea', 'the line and the skyline'],
    ['crowded', 'a bar on a stem'],
    ['level', 'arrow'],
    ['level', 'whisker'],
    ['sea', 'the grey about'],
    ['level', 'There is no'],
    ['nowhere', 'asserted date, grey'],
    // Nothing is drawn but the line and the skyline.
    ['beyond', 'The circles'],
  ])('does not say what is not so of the case `%s`', (name, words) => {
    expect(caption(name)).not.toContain(words)
  })
})

describe('the registry', () => {
  it('has a horizon for each line with a skyline', () => {
    const of = FIGURES.horizon!
    expect(of(HORIZON_CASES.level!()).map(({ name }) => name)).toEqual(['horizon'])
    expect(of(noonAudit())).toEqual([])
    const calendar = calendarAudit()
    const skyline = HORIZON_CASES.level!().sightlines[0]!.skyline
    const lines = calendar.sightlines.map((line, index) => (index === 1 ? line : { ...line, skyline }))
    expect(of({ ...calendar, sightlines: lines }).map(({ name }) => name)).toEqual([
      'horizon-midsummer',
      'horizon-sixty-days',
    ])
  })
})
