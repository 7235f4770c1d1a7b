import type {
  Audit,
  Outcome,
  Placement,
  PlanPoint,
  Reproduction,
  SightlineAudit,
  SweepStep,
  Today,
} from '../../src/audit/audit.ts'
import {
  carriedAudit,
  CASES as FIGURE_CASES,
  missedAudit,
  noneAudit,
  partsAudit,
  premiseAudit,
} from './figures/cases.ts'
import { trackOf } from './figures/make-audit.ts'

const CASES: Readonly<Record<Outcome, () => Audit>> = {
  premise: premiseAudit,
  carried: carriedAudit,
  missed: missedAudit,
  none: noneAudit,
  open: partsAudit,
}

export const OUTCOMES = Object.keys(CASES) as Outcome[]

/**
 * An audit with something in each of its fields, made by hand: its figures are shapes to be printed, not results.
 * `changes` replaces whole fields.
 */
export function completeAudit(outcome: Outcome = 'premise', changes: Partial<Audit> = {}): Audit {
  return { ...completed(CASES[outcome]()), ...changes }
}

/** The targets that figures are tried on: cases of figures/cases.ts other than the June solstice sunrise. */
export const KINDS = ['equinox', 'noon', 'moon', 'star', 'vanishing', 'never', 'pair', 'calendar'] as const

/** Such an audit of another target. */
export function auditOfKind(kind: (typeof KINDS)[number], changes: Partial<Audit> = {}): Audit {
  return { ...completed(FIGURE_CASES[kind]!()), ...changes }
}

function completed(audit: Audit): Audit {
  return {
    ...audit,
    source: 'Thornmere visitor leaflet, third printing, page 4',
    claim: { notes: 'Seen by *N. N.* in a dry summer.' },
    summary: ['First paragraph of the finding.', 'Second paragraph of the finding.'],
    findings: [{ question: 'What fits?', answer: 'About 9600 BCE.', because: 'The curve is flat.' }],
    assumptions: [
      {
        what: 'altitude of the horizon',
        said: 'unknown',
        used: 'level, 0° ± 30′',
        basis: 'our choice',
        effect_years: -1041.3,
        effect_of: 'a horizon 30′ higher or lower',
      },
      {
        what: 'humidity',
        said: 'omitted',
        used: 'dry air',
        basis: 'our choice',
        effect_years: 0.2,
        effect_of: 'air saturated with water',
      },
      {
        what: 'dates thought possible',
        said: 'omitted',
        used: '20,001 BCE to 2026 CE',
        basis: 'our choice',
        effect_years: null,
        effect_of: 'moves no date that fits',
      },
    ],
    attachments: [{ path: 'skyline.csv', sha256: '1'.repeat(64) }],
    sightlines: audit.sightlines.map((line) => withSurvey(withDrift(line))),
    plan: {
      north: { words: 'by compass', sd_deg: 0.5 },
      points: [pointAt('hearthstone', 0, 0), pointAt('east-pillar', 84.7, 53.1)],
      lines: audit.sightlines
        .filter(({ measures }) => measures === 'azimuth')
        .map(({ name, azimuth_deg }) => ({
          ...{ sightline: name, from: 0, to: 1, span: null, length_m: 100 },
          azimuth_deg: azimuth_deg?.value ?? null,
        })),
    },
    placements: audit.sightlines.flatMap(placed),
    implied: audit.implied.map((implied) => ({
      ...implied,
      nearest_approach: implied.nearest_approach && { ...implied.nearest_approach, sd_arcmin: 2.5 },
    })),
    checks: [
      {
        step: 'declination',
        printed: '24°12′',
        printed_value: 24.2,
        ours: 24.195,
        ours_printed: '24°11′42″',
        difference: -18,
        difference_printed: '−18″',
        unit: 'arcsec',
        verdict: 'reproduces',
      },
    ],
    reproduction: [
      reproduced({ label: 'Newcomb 1895', year: -9001.4, difference_years: 597.6, model_error_years: -98.2 }),
      reproduced({ label: 'Vondrák 2011', year: -9600, difference_years: 0.2, within_model_range: true }),
      reproduced({ label: 'Stockwell 1873', reason: 'this program does not have that table' }),
    ],
    sweep: { ...audit.sweep, steps: audit.sweep.steps.map((step, index) => tabled(step, index, audit)) },
    second_window: {
      window: { from: -12_000, to: 2026, printed: '12,001 BCE to 2026 CE', stated: false },
      half_bit_arcmin: 12,
      steps: [{ tolerance_arcmin: 0, bits: 1.12, sets95: [[-12_000, -4000]] }],
    },
    budget: [
      { source: 'altitude of the horizon', sd: 668, share: 0.998 },
      { source: 'nutation', sd: 0.3, share: 0.002 },
    ],
    alternatives: [
      alternative('upper limb on the horizon', [-9600, 13_900], -9600),
      alternative('centre on the horizon', [], null),
    ],
    today: audit.sightlines.map(({ name, direction_at_asserted_deg: asserted }) => ({
      ...{ sightline: name, year: 2026.4 },
      ...(asserted === null ? NO_CHANCE : CHANCE),
      ...(asserted === null
        ? { direction_deg: null, offset_arcmin: null, sun_widths: null, offset_cm: null }
        : { direction_deg: 59, offset_arcmin: -65, sun_widths: 2.1, offset_cm: 190 }),
    })),
    warnings: ['The formula is used outside its range.'],
    references: ['vondrak2011', 'laskar2004', 'newcomb1895'],
  }
}

/** The same claim with a second line, bare of length and with a target that never reaches it. */
export function severalLinesAudit(outcome: Outcome = 'premise'): Audit {
  const audit = completeAudit(outcome)
  const [first] = audit.sightlines
  const second: SightlineAudit = {
    ...first!,
    name: 'midwinter',
    event: 'December solstice sunset',
    length_m: null,
    air: null,
    drift: null,
    notes: [],
    direction_at_asserted_deg: null,
    offset_at_asserted_arcmin: null,
    closest_in_asserted: null,
  }
  const line = { value: 57.9077, sd: 1 / 60 }
  return {
    ...audit,
    sightlines: [first!, second].map((line) => ({ ...line, sweep: audit.sweep })),
    tracks: [...audit.tracks, { ...trackOf('vondrak2011', line, 0), sightline: 'midwinter' }],
    implied: [
      ...audit.implied,
      {
        sightline: 'midwinter',
        model: 'vondrak2011',
        dates: [],
        nearest_approach: { year: -7440, offset_arcmin: null, sd_arcmin: null, sun_widths: null },
      },
    ],
    today: [
      ...audit.today,
      { ...audit.today[0]!, sightline: 'midwinter', direction_deg: null, offset_arcmin: null, ...NO_CHANCE },
    ],
    reproduction: [
      ...audit.reproduction,
      { ...audit.reproduction[0]!, sightline: 'midwinter', from: 'claimed declination' },
    ],
  }
}

function withDrift(line: SightlineAudit): SightlineAudit {
  if (line.direction_at_asserted_deg === null) return line
  return {
    ...line,
    air: { pressure_hpa: 938.7, temperature_c: 10.8, humidity: 0.5, lapse_k_per_km: 6.5 },
    offset_at_asserted_arcmin: -1.8,
    offset_at_asserted_sd_arcmin: 2.5,
    closest_in_asserted: { year: -9600, offset_arcmin: -1.2, sd_arcmin: 2.5 },
    drift: {
      arcmin_per_century: -0.41,
      cm_per_century: -1.2,
      sun_widths_per_millennium: 0.14,
      years_per_arcmin: 24,
    },
  }
}

/** Every tenth step is printed; the ratios run from overflow through a figure to nothing left. */
function tabled(step: SweepStep, index: number, audit: Audit): SweepStep {
  const shown = [
    { value: null, ln: 1167, words: 'very strong, for the asserted date' },
    { value: 293, ln: 5.68, words: 'very strong, for the asserted date' },
    { value: 0.35, ln: -1.05, words: 'barely worth a mention, for the other' },
    { value: null, ln: null, words: 'neither date fits at all' },
  ]
  const ratios = audit.other_dates.map(({ label }) => ({ against: label, ...shown[(index / 10) % 4]! }))
  return { ...step, in_table: index % 10 === 0, ratios: index % 10 === 0 ? ratios : [] }
}

function reproduced(row: Partial<Reproduction> & { label: string }): Reproduction {
  return {
    model: row.label,
    from: 'sightline',
    sightline: 'midsummer',
    year: null,
    difference_years: null,
    within_model_range: row.year === undefined ? null : false,
    model_range: 'within 10,000 years of 2000, as its author states',
    model_error_years: null,
    reason: null,
    ...row,
  }
}

function alternative(value: string, years: number[], nearest: number | null) {
  const is_claims = value.startsWith('upper')
  return {
    sightline: 'midsummer',
    choice: 'part of the disc',
    value,
    is_claims,
    years,
    nearest_year: nearest,
  }
}

const CHANCE: Pick<Today, 'next' | 'next_reason'> = {
  next: {
    date: '2027-06-21',
    utc: '2027-06-21T03:06Z',
    days: ['2027-06-20', '2027-06-23'],
    direction_deg: 59,
    stand_right_m: -1.9,
    stand_sd_m: 0.3,
    notes: ['Take a coat.'],
  },
  next_reason: null,
}
const NO_CHANCE = { next: null, next_reason: 'none is reckoned here' } as const

function pointAt(name: string, east_m: number, north_m: number): PlanPoint {
  return { name, east_m, north_m, sd_m: 0.03, width_m: null, form: null }
}

/** A line with something said of its survey, its horizon and the claim's refraction. */
function withSurvey(line: SightlineAudit): SightlineAudit {
  const { azimuth_deg: azimuth, altitude_deg: altitude } = line
  if (line.measures !== 'azimuth' || line.body === 'two stars' || azimuth === null || altitude === null)
    return line
  return {
    ...line,
    survey: ['Bearing on the plan 60°40′00″.', 'Bearings were turned by 2°45′44″ west.'],
    skyline: {
      from: 'altitude',
      words: 'as measured',
      nodes: [[azimuth.value, altitude.value]],
      at_line_deg: altitude,
    },
    refraction_check: {
      stated_arcmin: 34,
      traced_arcmin: 22.9,
      sea_level_arcmin: 34.5,
      is_sea_level: true,
      effect_years: -812.4,
    },
  }
}

function placed({
  name,
  measures,
  body,
  azimuth_deg,
  altitude_deg,
  semidiameter_arcmin,
}: SightlineAudit): Placement[] {
  if (azimuth_deg === null || altitude_deg === null) return []
  const line = measures === 'azimuth' ? azimuth_deg.value : altitude_deg.value
  const at = (kind: Placement['kind'], label: string, printed: string, arcmin: number): Placement => ({
    ...{ sightline: name, kind, label, printed, year: 0, from: 0, to: 0 },
    direction_deg: line + arcmin / 60,
    direction_range_deg: [line + arcmin / 60 - 0.01, line + arcmin / 60 + 0.01],
    offset_arcmin: -arcmin,
    offset_sd_arcmin: 2.5,
    offset_cm: measures === 'azimuth' ? Math.abs(arcmin) * 2.9 : null,
    disc:
      measures === 'azimuth' && (body === 'sun' || body === 'moon') && semidiameter_arcmin !== null
        ? {
            azimuth_deg: line + arcmin / 60,
            altitude_deg: altitude_deg.value - semidiameter_arcmin.value / 60,
            semidiameter_arcmin: semidiameter_arcmin.value,
          }
        : null,
  })
  return [
    at('asserted', 'asserted date', '9701 to 9501 BCE', 1.8),
    at('independent', 'radiocarbon', '801 to 501 BCE', 36),
    at('today', 'today', '2026 CE', 65),
  ]
}
