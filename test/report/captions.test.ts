import { describe, expect, it } from 'vitest'
import type { Audit } from '../../src/audit/audit.ts'
import { premiseCaption } from '../../src/report/captions/premise.ts'
import { trackCaption } from '../../src/report/captions/track.ts'
import { plainText } from '../../src/report/plain-text.ts'
import { CASES } from './figures/cases.ts'

function track(name: string, change: (audit: Audit) => Audit = (audit) => audit): string {
  const audit = change(CASES[name]!())
  return trackCaption(audit, audit.sightlines[0]!).map(plainText).join('')
}

function premise(name: string): string {
  return premiseCaption(CASES[name]!()).map(plainText).join('')
}

describe('the caption of a track', () => {
  it.each([
    ['premise', 'The curve is the azimuth of the June solstice sunrise, year by year;'],
    ['noon', 'The curve is the altitude of the Sun at December solstice noon, year by year;'],
    [
      'moon',
      'The curve is the azimuth of the northern major standstill moonrise, as it would be in each year;',
    ],
    ['star', 'The curve is the azimuth of the rising of Sirius, year by year;'],
    [
      'equinox',
      'The curves are the azimuth of the equinox sunset, year by year (March equinox and September equinox); the pale ground about them',
    ],
    [
      'pair',
      'The curves are the azimuth of the alignment of Kochab and Mizar, one above the other, year by year (Kochab above and Mizar above);',
    ],
  ])('says what the curve is: %s', (name, words) => {
    expect(track(name)).toContain(words)
  })

  it('gives the reason for several dates that is true of the target', () => {
    expect(track('premise')).toMatch(
      /The Earth’s tilt swings to and fro, so one line may have several dates\.$/,
    )
    expect(track('star')).toMatch(/Precession goes round in about 26,000 years, so .* several dates\.$/)
    expect(track('equinox')).toMatch(/an open one a date still to come\.$/)
  })

  it('names a second model where its curve is drawn, and says so where it cannot be told apart', () => {
    expect(track('star')).toContain('Broken: by a second model of precession, over the years that it covers.')
    expect(track('equinox')).toContain('a second model of the Earth’s tilt gives the same to the eye.')
    expect(track('noon')).not.toContain('second model')
  })

  it('says where the course is drawn in part', () => {
    // The fixture swings 62° to either side; the line lies inside.
    expect(track('star')).toContain('Only the part about the line is drawn; the whole course spans 124°.')
    expect(track('premise')).not.toContain('Only the part')
  })

  it('explains the hatching', () => {
    expect(track('vanishing')).toContain('Hatched: years with no rising of Acrux at that altitude.')
    expect(track('never')).toBe(
      'Where the target of midsummer stood over time. Nowhere: in all these years, hatched, there is no rising of Acrux at that altitude. The band is the line as measured.',
    )
    expect(track('star')).not.toContain('atched')
  })

  it('tells a miss from one within the errors', () => {
    expect(track('none')).toMatch(/They do not cross: no date fits\.$/)
    const near = (audit: Audit): Audit => ({
      ...audit,
      implied: audit.implied.map((implied) => ({
        ...implied,
        nearest_approach: { ...implied.nearest_approach!, offset_arcmin: 20, sd_arcmin: 18 },
      })),
    })
    expect(track('none', near)).toMatch(/They do not cross, but come within those errors of each other\.$/)
  })
})

describe('the caption of the sets', () => {
  it('says where the figure shows a part of the window', () => {
    expect(premise('premise')).not.toContain('Only the part')
    expect(premise('narrow')).toContain('Only the part of the window about these dates is drawn.')
    expect(premise('narrow').split(' ').length).toBeLessThanOrEqual(100)
  })
})
