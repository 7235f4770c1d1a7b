import type { Table } from 'mdast'
import { describe, expect, it } from 'vitest'
import type { Audit } from '../../src/audit/audit.ts'
import { plainText } from '../../src/report/plain-text.ts'
import { PARTS } from '../../src/report/template/parts.ts'
import { TABLES } from '../../src/report/template/tables.ts'
import { VALUES } from '../../src/report/template/values.ts'
import { auditOfKind, completeAudit, severalLinesAudit } from './complete-audit.ts'

function part(name: string, audit: Audit): string {
  return PARTS[name]!(audit).map(plainText).join('\n')
}

function rows(name: string, audit: Audit): string[][] {
  const [table] = TABLES[name]!(audit) as [Table]
  return table.children.map((row) => row.children.map(plainText))
}

function caption(name: string, audit: Audit): string {
  const [table] = TABLES[name]!(audit) as [Table]
  return (table.data?.caption ?? []).map(plainText).join('')
}

describe('the claim', () => {
  it('shows the asserted date as written and as read', () => {
    const asserted = { ...completeAudit().asserted, text: '9600 BCE ± 100' }
    expect(part('claim', completeAudit('premise', { asserted, source: 'Leaflet, p. 4.' }))).toBe(
      '“The east pillar of the Thornmere court marked midsummer sunrise exactly, so it was built then.”\nSource: Leaflet, p. 4. Date asserted: 9600 BCE ± 100 (9701 to 9501 BCE). Independent of the line: radiocarbon (801 to 501 BCE).',
    )
  })

  it('says where there is no source and no independent date', () => {
    expect(part('claim', completeAudit('open', { source: null }))).toContain(
      'The claim names no source. Date asserted: 8001 to 6001 BCE. No independent date is named.',
    )
  })
})

describe('the premise', () => {
  it.each([
    [0, 'The claim takes their work as exact.'],
    [5, 'The claim gives them 5′.'],
    [null, 'The claim does not say how closely.'],
  ])('with an assumed precision of %s arcminutes', (assumed_precision_arcmin, sentence) => {
    expect(part('premise', completeAudit('premise', { assumed_precision_arcmin }))).toContain(sentence)
  })

  it('tells stated ranges and windows from this program’s own', () => {
    const stated = part('premise', completeAudit())
    expect(stated).toContain('The claim file states 10′ to 1° as plausible.')
    expect(stated).toContain('(20,001 BCE to 2026 CE, as the claim file has it)')
    const audit = completeAudit('missed')
    const window = { ...audit.sweep.window, stated: false }
    const own = part('premise', { ...audit, sweep: { ...audit.sweep, window } })
    expect(own).toContain('The claim file states no plausible range; 10′ to 1° stands in for it.')
    expect(own).toContain('(6001 BCE to 2026 CE, this program’s own, as the claim file names none)')
  })

  it('says so where no date fits', () => {
    expect(part('premise', completeAudit('none'))).toContain('Here no date fits;')
    expect(part('premise', completeAudit('missed'))).not.toContain('Here no date fits;')
  })

  it('speaks of several lines as such', () => {
    expect(part('premise', severalLinesAudit())).toMatch(
      /fits the lines; .* All sightlines are taken together\./,
    )
  })

  it('has a table of the marked steps, with sets marked where the window cuts them', () => {
    const audit = completeAudit('none')
    const [head, exact] = rows('premise', audit)
    expect(head).toEqual([
      'Build tolerance',
      'At the marker, 100 m off',
      'Sun’s widths',
      '95 % dates',
      '68 % dates',
      'Bits',
    ])
    expect(exact).toEqual(['0′', '0 cm', '0', '20,001 BCE (edge) to 19,940 BCE', expect.any(String), '1.00'])
    expect(caption('premise', audit)).toContain('(edge): the window cuts the set off here.')
    expect(caption('premise', completeAudit('premise'))).not.toContain('(edge)')
    expect(rows('premise', audit)).toHaveLength(1 + audit.sweep.steps.filter((step) => step.in_table).length)
  })

  it('has no marker where no length is known', () => {
    expect(rows('premise', completeAudit('missed'))[0]![1]).toBe('At 100 m')
  })
})

describe('ratios and limits', () => {
  it('gives each ratio in figures and words, an overflowing one by its power of ten', () => {
    expect(rows('ratios', completeAudit()).slice(0, 5)).toEqual([
      ['Build tolerance', 'Against radiocarbon'],
      // e^1167 = 10^(1167 / ln 10) = 10^506.8
      ['0′', 'about 10⁵⁰⁷: very strong, for the asserted date'],
      ['57″', '293: very strong, for the asserted date'],
      ['1.8′', '0.35: barely worth a mention, for the other'],
      ['3.5′', 'neither date fits at all'],
    ])
    expect(TABLES.ratios!(completeAudit('open'))).toEqual([])
  })

  it('gives each limit as an angle and a distance, or its reason', () => {
    const limits = [
      {
        ...{
          overlaps: false,
          ratio_3_steady: true,
          against: 'radiocarbon',
          ratio_3_arcmin: 23.2,
          ratio_3_cm: 67.5,
          ratio_3_reason: null,
        },
        ...{ other_date_in_95_arcmin: null, other_date_in_95_cm: null },
        ...{ other_date_in_95_reason: 'it lies outside the window', half_bit_arcmin: 0, half_bit_cm: 0 },
        half_bit_reason: null,
      },
      {
        ...{
          overlaps: false,
          ratio_3_steady: null,
          against: null,
          ratio_3_arcmin: null,
          ratio_3_cm: null,
          ratio_3_reason: null,
        },
        ...{ other_date_in_95_arcmin: 0, other_date_in_95_cm: 0, other_date_in_95_reason: null },
        ...{ half_bit_arcmin: 25.8, half_bit_cm: null, half_bit_reason: null },
      },
    ]
    expect(rows('limits', completeAudit('premise', { limits })).slice(1)).toEqual([
      ['radiocarbon', '23′ (68 cm)', 'none: it lies outside the window', '0′: at every tolerance'],
      ['none named', 'none', '0′: at every tolerance', '26′'],
    ])
  })

  it('says of a lead that it is not one at every tolerance', () => {
    const limit = { ...completeAudit().limits[0]!, ratio_3_arcmin: 12, ratio_3_cm: null }
    const limits = [{ ...limit, ratio_3_steady: false }]
    expect(rows('limits', completeAudit('premise', { limits }))[1]![1]).toBe(
      '12′, but not at every tolerance below that',
    )
  })

  it('names the second window and what it makes of the half-bit limit', () => {
    expect(part('second_window', completeAudit())).toContain(
      'Within 12,001 BCE to 2026 CE, the line tells less than half a bit from a tolerance of 12′.',
    )
    const second_window = { ...completeAudit().second_window, half_bit_arcmin: null }
    expect(part('second_window', { ...severalLinesAudit(), second_window })).toContain(
      'there is no tolerance from which the lines tell less than half a bit.',
    )
    expect(rows('second_window', completeAudit())[1]).toEqual([
      '0′',
      '12,001 BCE (edge) to 4000 BCE',
      '1.12',
      '1.00',
    ])
  })
})

describe('the track', () => {
  it('tells of each line its target, air, dwell, place and movement', () => {
    expect(part('tracks', severalLinesAudit())).toBe(
      [
        'midsummer. Target: June solstice sunrise, upper limb on the horizon. The line is 100 m long. Refraction is traced for 939 hPa, 11 °C and 50 % humidity. Around the solstice the Sun’s place on the horizon stays within 1′ of its extreme for 9.3 days. At the asserted date the target stood at azimuth 57°54′; the line points 1.8′ ± 2.5′ to the left of it. It then moved 25″ a century to the left, which is 1.2 cm at the marker, or 0.14 of the Sun’s width in 1,000 years. Each minute of arc stands for 24 years.',
        'midwinter. Target: June solstice sunrise, upper limb on the horizon. The refraction is the one the claim file gives. At the asserted date (9701 to 9501 BCE) there was no December solstice sunset at that altitude.',
      ].join('\n'),
    )
  })

  it('prints each measured step with its standard deviation', () => {
    expect(rows('lines', completeAudit())[1]).toEqual([
      'midsummer',
      '57°54′ ± 1′',
      '1°30′ ± 2′',
      '20.3′ ± 2.0′',
      '16.31′',
      '0°54′ ± 3′',
      '24°12′ ± 3′',
    ])
  })

  it('lists every date, names those outside the window and those to come', () => {
    const implied = [
      {
        ...{ sightline: 'midsummer', model: 'vondrak2011', nearest_approach: null },
        dates: [
          { year: -23_456, low95: -23_480, high95: -23_420, in_window: false, future: false },
          { year: -9601.4, low95: null, high95: null, in_window: true, future: false },
          { year: 2020.2, low95: 2010, high95: 2031, in_window: true, future: false },
          { year: 13_904, low95: 13_604, high95: 14_204, in_window: false, future: true },
        ],
      },
      { sightline: 'midsummer', model: 'laskar2004', dates: [], nearest_approach: null },
    ]
    expect(rows('dates', completeAudit('premise', { implied })).slice(1)).toEqual([
      ['23,455 BCE', '23,480 to 23,420 BCE', 'outside the window'],
      ['9600 BCE', 'runs into that of a neighbouring date', 'in the window'],
      ['2020 CE', '2010 to 2031 CE', 'in the window'],
      ['13,900 CE', '13,600 to 14,200 CE', 'outside the window, still to come'],
    ])
    expect(part('approach', completeAudit('premise', { implied }))).toBe('')
  })

  it('names the nearest approach where no date of the window fits', () => {
    const approach = (offset_arcmin: number | null, dates: Audit['implied'][number]['dates'] = []) => {
      const sd_arcmin = offset_arcmin === null ? null : 2.5
      const nearest_approach = { year: -7443, offset_arcmin, sd_arcmin, sun_widths: offset_arcmin && 1.7 }
      const implied = [{ sightline: 'midsummer', model: 'vondrak2011', dates, nearest_approach }]
      return part('approach', completeAudit('none', { implied }))
    }
    expect(approach(-56)).toBe(
      'No date in the window or within 10,000 years of it puts the target exactly on the line midsummer. Within the window it came nearest in 7440 BCE, when the line pointed 56′ ± 2.5′ (1.7 times the Sun’s width) to the left of it.',
    )
    expect(approach(0.001)).toMatch(/when the line pointed at it\.$/)
    expect(approach(null)).toMatch(
      /At this latitude there is no June solstice sunrise at that altitude in any year of the window\.$/,
    )
    const later = { year: 9000, low95: 8000, high95: 10_000, in_window: false, future: true }
    expect(approach(56, [later])).toMatch(
      /^No date in the window puts .* 56′ ± 2\.5′ .* to the right of it\.$/,
    )
  })

  it('tells the day of a sighting by the place’s time and by universal time where the two part', () => {
    const audit = completeAudit()
    const [today] = audit.today
    const at = (utc: string) => ({ ...audit, today: [{ ...today!, next: { ...today!.next!, utc } }] })
    // 21 June dawns at 150° E while it is 20 June by universal time.
    expect(part('today', at('2027-06-20T20:56Z'))).toContain(
      'is on 21 June 2027 by the place’s own time, at 20:56 UTC on 20 June 2027.',
    )
    expect(part('today', at('2027-06-21T03:06Z'))).toContain('is on 21 June 2027, at 03:06 UTC.')
  })

  it('says where the target stands today', () => {
    expect(part('today', severalLinesAudit())).toBe(
      'midsummer. Today (2026 CE) the target stands at azimuth 59°00′; the line points 1°05′ (2.1 times the Sun’s width, 1.9 m at the marker) to the left of it. The next chance to look for oneself is on 21 June 2027, at 03:06 UTC. From 20 June 2027 to 23 June 2027 the Sun stands within 1′ of its declination of that day, and any of these does as well. The place from which it stands over the foresight is 1.9 m ± 30 cm to the left of the backsight, as one looks along the line. Take a coat.\nmidwinter. Today (2026 CE) the target is not to be seen: there is no December solstice sunset at that altitude. There is no chance to look for oneself: none is reckoned here.',
    )
  })
})

describe('the track of other targets', () => {
  it('tells of a measured altitude what lies above or below it', () => {
    const audit = auditOfKind('noon')
    expect(part('tracks', audit)).toContain(
      'At the asserted date the target stood at altitude 34°35′; the altitude measured lies 1.8′ ± 2.5′ below it. It then moved 25″ a century downwards,',
    )
    expect(part('premise', audit)).toContain('about the intended one, as an angle up or down.')
    expect(rows('lines', audit).slice(0, 2)).toEqual([
      [
        ...['Sightline', 'Azimuth', 'Altitude measured', 'Refraction', 'Half the Sun’s width'],
        ...['Centre’s true altitude', 'Declination'],
      ],
      [
        ...['midsummer', 'south, on the meridian', '34°35′ ± 3′', '1.3′ ± 0.3′', '16.31′'],
        ...['34°34′ ± 3′', '24°12′ ± 3′'],
      ],
    ])
  })

  it('leaves out the steps that no line has', () => {
    expect(rows('lines', auditOfKind('star'))[0]).toEqual([
      ...['Sightline', 'Azimuth', 'Horizon', 'Refraction', 'True altitude', 'Declination'],
    ])
    expect(rows('lines', auditOfKind('pair'))).toEqual([
      ['Sightline', 'Azimuth'],
      ['midsummer', '359°52′ ± 2′'],
    ])
    expect(caption('lines', auditOfKind('pair'))).toMatch(/^The line as measured;/)
    expect(rows('lines', auditOfKind('moon'))[0]![4]).toBe('Half the Moon’s width')
  })

  it('marks a step that one line has and another has not', () => {
    const [star, moon] = [auditOfKind('star'), auditOfKind('moon')]
    const audit = { ...star, sightlines: [...star.sightlines, ...moon.sightlines] }
    expect(rows('lines', audit).map((row) => row[4])).toEqual(['Half the Moon’s width', '–', '15.54′'])
  })

  it('does not speak of air for two stars, nor of a drift where there is none to speak of', () => {
    expect(part('tracks', auditOfKind('pair'))).not.toContain('efraction')
    const audit = auditOfKind('equinox')
    const drift = { ...audit.sightlines[0]!.drift!, arcmin_per_century: 0.001 }
    const still = { ...audit, sightlines: audit.sightlines.map((line) => ({ ...line, drift })) }
    expect(part('tracks', still)).toMatch(/ It then all but stood still\.$/)
  })

  it('names the best year of an asserted date in whose course the target moves on', () => {
    const audit = auditOfKind('star')
    const closest_in_asserted = { year: -2451.3, offset_arcmin: 0.4, sd_arcmin: 2.5 }
    const lines = (offset: number) =>
      audit.sightlines.map((line) => ({ ...line, offset_at_asserted_arcmin: offset, closest_in_asserted }))
    expect(part('tracks', { ...audit, sightlines: lines(40) })).toContain(
      'Of the asserted years the line fits 2452 BCE best; the line points 24″ ± 2.5′ to the right of it as it stood then.',
    )
    expect(part('tracks', { ...audit, sightlines: lines(1) })).not.toContain('best')
  })

  it('says where a star is never to be seen', () => {
    const audit = auditOfKind('never')
    expect(part('tracks', audit)).toContain(
      'At the asserted date (9701 to 9501 BCE) there was no rising of Acrux at that altitude.',
    )
    expect(part('approach', audit)).toBe(
      'No date in the window or within 10,000 years of it puts the target exactly on the line midsummer. At this latitude there is no rising of Acrux at that altitude in any year of the window.',
    )
    expect(part('today', audit)).toBe(
      'midsummer. Today (2026 CE) the target is not to be seen: there is no rising of Acrux at that altitude. There is no chance to look for oneself: none is reckoned here.',
    )
  })

  it('tells that the Moon stands there in some years only', () => {
    expect(part('today', auditOfKind('moon'))).toMatch(
      /^midsummer\. Today \(2026 CE\), in a year of such a standstill, the target stands at azimuth 59°00′;/,
    )
  })
})

describe('the lines of a calendar', () => {
  it('has a row for each, and one for all', () => {
    const audit = auditOfKind('calendar')
    const [head, ...lines] = rows('each_line', audit)
    expect(head).toEqual([
      ...['Sightline', 'Target', 'Built exactly', '95 % dates at 10′', 'Bits at 10′', 'Bits at 1°'],
      'Ratio to radiocarbon at 10′',
    ])
    expect(lines.map(([name]) => name)).toEqual(['midsummer', 'thirty days', 'sixty days', 'all together'])
    // The fixture's bits are 1.5/(n (1 + τ/20)), its sets 2500 n + 90 τ years to either side of 5001 BCE, its ratios 3/n.
    expect(lines[1]).toEqual([
      ...['thirty days', 'sunrise 30 days after the June solstice', expect.any(String)],
      ...['10,900 BCE to 900 CE', '0.50', '0.19', '1.5'],
    ])
    expect(TABLES.each_line!(completeAudit())).toEqual([])
  })

  it('names the ratio to each of several dates', () => {
    const audit = auditOfKind('calendar')
    const second = { ...audit.other_dates[0]!, label: 'pollen' }
    const several = { ...audit, other_dates: [...audit.other_dates, second] }
    expect(rows('each_line', several)[1]!.at(-1)).toBe('radiocarbon: 3.0; pollen: –')
  })
})

describe('the arithmetic', () => {
  it('speaks of the model that a target rests on', () => {
    expect(part('arithmetic', completeAudit())).toContain('a model of the Earth’s tilt')
    expect(part('arithmetic', auditOfKind('star'))).toContain(
      'The last step, from where a star stood to a date, depends on a model of precession;',
    )
    const both = { ...auditOfKind('star') }
    both.sightlines = [...both.sightlines, ...auditOfKind('moon').sightlines]
    expect(part('arithmetic', both)).toMatch(/Earth’s tilt; .* For stars that step depends on/)
    expect(rows('reproduction', both)[0]).toContain('Model')
    expect(caption('reproduction', both)).toMatch(/by each model of the Earth’s tilt or of precession\.$/)
    expect(rows('reproduction', auditOfKind('star'))[0]![0]).toBe('Precession after')
  })

  it('says what there was to redo', () => {
    expect(part('arithmetic', completeAudit('premise', { checks: [], reproduction: [] }))).toBe(
      'The claim file quotes no intermediate results, so there are no steps to redo one by one.',
    )
    expect(part('arithmetic', completeAudit())).toMatch(/^Each result that the source prints/)
  })

  it('tells each model’s date from the asserted one and from this audit’s model, and where it is out of range', () => {
    expect(rows('reproduction', completeAudit()).slice(1)).toEqual([
      [
        ...['Newcomb 1895', '9002 BCE', '598 years later', '98 years earlier'],
        'within 10,000 years of 2000, as its author states; the date lies outside',
      ],
      ['Vondrák 2011', '9601 BCE', 'none', '–', 'within 10,000 years of 2000, as its author states'],
      [
        ...['Stockwell 1873', 'none', '–', '–'],
        'within 10,000 years of 2000, as its author states; this program does not have that table',
      ],
    ])
    expect(caption('reproduction', completeAudit())).toContain('from the sightline,')
  })

  it('says from what each date is drawn where that differs', () => {
    const origins = rows('reproduction', severalLinesAudit()).map(([from]) => from)
    expect(origins).toEqual(['From', 'midsummer', 'midsummer', 'midsummer', 'midwinter, claimed declination'])
  })
})

describe('readings, budget, assumptions', () => {
  it('marks the reading that this audit takes', () => {
    expect(rows('alternatives', completeAudit()).slice(1)).toEqual([
      ['part of the disc', 'upper limb on the horizon (as in this audit)', '9600 BCE', '13,900 CE'],
      ['part of the disc', 'centre on the horizon', 'no date', '–'],
    ])
    expect(rows('alternatives', severalLinesAudit())[1]![0]).toBe('midsummer')
  })

  it('holds the budget against draws, and says why they part', () => {
    const check = { year: -9600, linear_sd: 630, sampled_sd: 646, no_date_share: 0, agree: true }
    expect(part('budget_check', completeAudit('premise', { budget_check: check }))).toBe(
      'Taken together these make 630 years, one standard deviation about 9600 BCE. Drawn at random from the same errors, again and again, the date scatters by 650 years: the two routes agree.',
    )
    const bent = { ...check, sampled_sd: 400, no_date_share: 0.214, agree: false }
    expect(part('budget_check', completeAudit('premise', { budget_check: bent }))).toContain(
      'by 400 years, and in 21 % of the draws no date fits at all. The two part because the track bends there',
    )
    const lost = { ...check, sampled_sd: null, no_date_share: 1, agree: false }
    expect(part('budget_check', completeAudit('premise', { budget_check: lost }))).toContain(
      'Drawn at random from the same errors, the line has no date at all:',
    )
    expect(part('budget_check', completeAudit('none', { budget_check: null }))).toBe('')
  })

  it('rounds the budget, and says of which line it is', () => {
    expect(rows('budget', completeAudit()).slice(1)).toEqual([
      ['altitude of the horizon', '670', '100 %'],
      ['nutation', 'under 1', 'under 1 %'],
    ])
    expect(caption('budget', severalLinesAudit())).toContain('nearest the asserted one on midsummer,')
  })

  it('keeps the order of the assumptions', () => {
    expect(rows('assumptions', completeAudit()).slice(1)).toEqual([
      [
        ...['altitude of the horizon (said to be unknown)', 'level, 0° ± 30′', 'our choice'],
        '1000 years: a horizon 30′ higher or lower',
      ],
      ['humidity', 'dry air', 'our choice', 'under 1 year: air saturated with water'],
      ['dates thought possible', '20,001 BCE to 2026 CE', 'our choice', 'moves no date that fits'],
    ])
  })
})

describe('references', () => {
  it('are in the order of their authors, each once, an unknown key as it is', () => {
    const audit = completeAudit('premise', { references: ['vondrak2011', 'newcomb1895', 'nobody1900'] })
    const lines = PARTS.references!(audit).flatMap((list) =>
      'children' in list ? list.children.map(plainText) : [],
    )
    expect(lines.map((line) => line.split(/[, ]/)[0])).toEqual([
      ...['Auer', 'Hohenkerk', 'Joint', 'Kass', 'Kullback', 'Laskar', 'Newcomb', 'nobody1900', 'Petrie'],
      'Vondrák',
    ])
  })
})

describe('values', () => {
  it.each([
    ['asserted_date', '9701 to 9501 BCE'],
    ['made_on', '2026-06-01'],
    ['plausible_precision', '10′ to 1°'],
    ['sightlines', 'midsummer and midwinter'],
    ['structure.latitude', '41°16′12″ N'],
    ['structure.name', 'Thornmere court'],
    ['window', '20,001 BCE to 2026 CE'],
  ])('%s is %s', (name, value) => {
    expect(VALUES[name]!(severalLinesAudit())).toBe(value)
  })

  it('names the south, and a source that is missing', () => {
    const structure = { name: 'South', latitude_deg: -16.5, longitude_deg: null, elevation_m: 0 }
    const audit = completeAudit('premise', { structure, source: null })
    expect(VALUES['structure.latitude']!(audit)).toBe('16°30′00″ S')
    expect(VALUES.source!(audit)).toBe('no source named')
  })
})
