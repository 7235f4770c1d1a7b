import { describe, expect, test } from 'vitest'
import { readingsOf } from '../../src/audit/readings-of.ts'
import { expectWithin } from '../published/expect-within.ts'
import { auditOf, claimText } from './audit-of.ts'
import { settledLine } from './settled.ts'

/** A line due east, 80 m long, from the middle of a gap of 3 m to a post of 1.2 m. */
function dueEast(sighted: string | null): string {
  const stated = sighted === null ? '' : `, sighted: ${sighted}`
  return claimText({
    points:
      '{gate: {east: 0 m, north: 0 m, uncertainty: 1 cm, width: 3 m, form: gap}, post: {east: 80 m, north: 0 m, uncertainty: 1 cm, width: 1.2 m}}',
    sightlines: `{one: {from: gate, to: post, horizon: 0° ± 1′${stated}}}`,
    target: '{body: sun, event: equinox, sense: declination zero, at: rising, disc: centre}',
  })
}

/** Looking east, what is to the right lies south: the azimuth of the line between two places by plain geometry. */
function azimuthBetween(fromSouthM: number, toSouthM: number): number {
  return 90 + (Math.atan2(toSouthM - fromSouthM, 80) * 180) / Math.PI
}

describe('the part that is sighted turns the line', () => {
  test.each([
    ['{from: middle, to: axis}', 0, 0],
    ['{from: middle, to: left edge}', 0, -0.6],
    ['{from: middle, to: right edge}', 0, 0.6],
    ['{from: left side, to: axis}', -1.5, 0],
    ['{from: right side, to: axis}', 1.5, 0],
    ['{from: left side, to: right edge}', -1.5, 0.6],
    ['{from: right side, to: right edge}', 1.5, 0.6],
    ['{from: unknown, to: unknown}', 0, 0],
    [null, 0, 0],
  ])('%s', (sighted, from, to) => {
    expectWithin(settledLine(dueEast(sighted)).measuredDeg, azimuthBetween(from, to), 1e-9, 'degrees')
  })

  test('past north, where the azimuth starts again', () => {
    const text = dueEast('{from: middle, to: left edge}').replace(
      'east: 80 m, north: 0 m',
      'east: 0 m, north: 80 m',
    )
    const turn = (Math.atan2(0.6, 80) * 180) / Math.PI
    expectWithin(settledLine(text).measuredDeg, 360 - turn, 1e-9, 'degrees')
  })
})

describe('the other readings', () => {
  const SOUTH = { left: -1, middle: 0, right: 1 }
  const PART = { left: 'left edge', middle: 'axis', right: 'right edge' } as const
  const SIDE = { left: 'left side', middle: 'middle', right: 'right side' } as const
  const parts = ['left', 'middle', 'right'] as const

  test.each(parts.flatMap((from) => parts.map((to) => [from, to] as const)))(
    'of a line from %s to %s: each other part of one of its ends, the other as the claim has it',
    (from, to) => {
      const line = settledLine(dueEast(`{from: ${SIDE[from]}, to: ${PART[to]}}`))
      const readings = readingsOf(line).filter(
        ({ choice }) => choice.startsWith('part of ') && choice !== 'part of the disc',
      )
      const got = readings.map(({ choice, value, isOwn, line: read }) => ({
        choice,
        value,
        isOwn,
        azimuth: read.measuredDeg,
      }))
      const of = (name: string) => got.filter(({ choice }) => choice === `part of ${name} that is sighted`)
      expect(got).toHaveLength(6)
      for (const part of parts) {
        const gate = of('gate').filter(({ value }) => value === `the ${SIDE[part]}`)
        const post = of('post').filter(({ value }) => value === `the ${PART[part]}`)
        expect([gate.length, post.length]).toEqual([1, 1])
        expect([gate[0]!.isOwn, post[0]!.isOwn]).toEqual([part === from, part === to])
        expectWithin(gate[0]!.azimuth, azimuthBetween(1.5 * SOUTH[part], 0.6 * SOUTH[to]), 1e-9, 'degrees')
        expectWithin(post[0]!.azimuth, azimuthBetween(1.5 * SOUTH[from], 0.6 * SOUTH[part]), 1e-9, 'degrees')
      }
    },
  )

  test('stand in the audit, the claim’s own first in each choice and marked', () => {
    const { alternatives } = auditOf(dueEast('{from: middle, to: left edge}'))
    const rows = alternatives.map(({ choice, value, is_claims }) => [choice, value, is_claims])
    expect(rows).toEqual([
      ['sense of equinox', 'declination zero', true],
      ['sense of equinox', 'midway in days', false],
      ['sense of equinox', 'midway in direction', false],
      ['part of the disc', 'centre on the horizon', true],
      ['part of the disc', 'upper limb on the horizon', false],
      ['part of the disc', 'lower limb on the horizon', false],
      ['part of gate that is sighted', 'the middle', true],
      ['part of gate that is sighted', 'the left side', false],
      ['part of gate that is sighted', 'the right side', false],
      ['part of post that is sighted', 'the left edge', true],
      ['part of post that is sighted', 'the axis', false],
      ['part of post that is sighted', 'the right edge', false],
    ])
  })

  test('leave out the ends of points without a width', () => {
    const text = claimText({
      points: '{a: {east: 0 m, north: 0 m}, b: {east: 80 m, north: 60 m, width: 1 m}}',
      sightlines: '{one: {from: a, to: b}}',
    })
    const choices = readingsOf(settledLine(text)).map(({ choice }) => choice)
    expect(new Set(choices)).toEqual(new Set(['part of the disc', 'part of b that is sighted']))
  })
})
