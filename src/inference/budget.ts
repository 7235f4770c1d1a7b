import { horizonCrossing } from '../site/horizontal.ts'
import { driftDegPerYear } from './implied-dates.ts'
import type { Sight } from './sight.ts'

/** One source of error: a standard deviation in degrees, of the line, of the altitude or of the declination. */
export interface ErrorSource {
  source: string
  of: 'azimuth' | 'altitude' | 'declination'
  sdDeg: number
}

export interface BudgetShare {
  source: string
  /** Standard deviation of the date, years. */
  sd: number
  /** Of the variance, 0 to 1. */
  share: number
}

/**
 * The linear budget of a date (JCGM 100:2008, section 5): each source times its sensitivity, over the movement of the
 * target. Largest first; empty where the target is level or not reached, where no linear budget exists.
 */
export function dateBudget(sight: Sight, year: number, sources: readonly ErrorSource[]): BudgetShare[] {
  const crossing = horizonCrossing(
    sight.declinationDeg(year),
    sight.altitudeDeg(year),
    sight.latitudeDeg,
    sight.at,
  )
  const drift = driftDegPerYear(sight, year)
  if (crossing === null || drift === null || drift === 0) return []
  const sensitivity = { azimuth: 1, altitude: crossing.perAltitude, declination: crossing.perDeclination }
  const rows = sources.map(({ source, of, sdDeg }) => ({
    source,
    sd: Math.abs((sensitivity[of] * sdDeg) / drift),
  }))
  const variance = rows.reduce((sum, row) => sum + row.sd ** 2, 0)
  return rows
    .map((row) => ({ ...row, share: variance === 0 ? 0 : row.sd ** 2 / variance }))
    .sort((a, b) => b.sd - a.sd)
}
