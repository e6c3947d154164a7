/**
 * Every cell of the coefficient tables of two-way panels, BS 8110-1:1997, and lines between them.
 *
 * Table 3.12: moments seen in a published copy, shears in two worked examples. Table 3.13: seen in several independent public encodings.
 * Table 3.14: two encodings agree but for one entry, a third on panels 1 to 4; same as memory. Table 3.15: from memory, digits cross-checked
 * against two encodings which each contain slips.
 */
import { describe, expect, it } from 'vitest'
import { liftedTwoWayForces } from '#shared/sizing/analysis/liftedTwoWayForces'
import { ONE_WAY_COEFFICIENTS, ONE_WAY_CONDITIONS } from '#shared/sizing/tables/oneWayCoefficients'
import { restrainedMoments } from '#shared/sizing/tables/restrainedMoments'
import { restrainedShear } from '#shared/sizing/tables/restrainedShears'
import { simplySupportedCoefficients } from '#shared/sizing/tables/simplySupportedCoefficients'
import type { TwoWayCase } from '#shared/sizing/tables/twoWayCase'

const RATIOS = [1, 1.1, 1.2, 1.3, 1.4, 1.5, 1.75, 2]
/** Numbers of a row as the tables print it, without the point. */
const row = (text: string, digits: number) => text.split(' ').map((cell) => Number(cell) / 10 ** digits)

describe('Table 3.12', () => {
  it('holds the printed coefficients and its conditions', () => {
    expect(ONE_WAY_COEFFICIENTS.moment).toEqual({
      outerSupport: 0,
      endSpan: 0.086,
      firstInteriorSupport: 0.086,
      interiorSpan: 0.063,
      interiorSupport: 0.063,
    })
    expect(ONE_WAY_COEFFICIENTS.shear).toEqual({ outerSupport: 0.4, firstInteriorSupport: 0.6, interiorSupport: 0.5 })
    expect(ONE_WAY_COEFFICIENTS.continuousOuter).toEqual({
      outerSupportMoment: 0.04,
      endSpanMoment: 0.075,
      outerSupportShear: 0.46,
    })
    expect(ONE_WAY_CONDITIONS).toMatchObject({ leastBayM2: 30, greatestImposedToDead: 1.25, greatestImposedKnPerM2: 5 })
  })
})

describe('Table 3.13, corners that may lift', () => {
  const short = row('62 74 84 93 99 104 113 118', 3)
  const long = row('62 61 59 55 51 46 37 29', 3)
  it.each(RATIOS.map((ratio, i) => [ratio, short[i]!, long[i]!]))('at %d has %d and %d', (ratio, alphaX, alphaY) => {
    expect(simplySupportedCoefficients(ratio)).toEqual({ short: alphaX, long: alphaY })
    const forces = liftedTwoWayForces({ load: 10, shortMm: 4000, longMm: 4000 * ratio })
    expect(forces.short.saggingNmm / (10 * 4000 ** 2)).toBeCloseTo(alphaX, 12)
    expect(forces.long.saggingNmm / (10 * 4000 ** 2)).toBeCloseTo(alphaY, 12)
  })

  it('runs straight between columns', () => {
    expect(simplySupportedCoefficients(1.625).short).toBeCloseTo((0.104 + 0.113) / 2, 12)
    expect(simplySupportedCoefficients(1.04).long).toBeCloseTo(0.062 - 0.4 * 0.001, 12)
  })
})

describe('Table 3.14, corners held down', () => {
  /** Panel, short support, short span (three decimals), long support, long span. */
  const panels: [TwoWayCase, string | null, string, number, number][] = [
    [1, '31 37 42 46 50 53 59 63', '24 28 32 35 37 40 44 48', 0.032, 0.024],
    [2, '39 44 48 52 55 58 63 67', '29 33 36 39 41 43 47 50', 0.037, 0.028],
    [3, '39 49 56 62 68 73 82 89', '30 36 42 47 51 55 62 67', 0.037, 0.028],
    [4, '47 56 63 69 74 78 87 93', '36 42 47 51 55 59 65 70', 0.045, 0.034],
    [5, '46 50 54 57 60 62 67 70', '34 38 40 43 45 47 50 53', 0, 0.034],
    [6, null, '34 46 56 65 72 78 91 100', 0.045, 0.034],
    [7, '57 65 71 76 81 84 92 98', '43 48 53 57 60 63 69 74', 0, 0.044],
    [8, null, '42 54 63 71 78 84 96 105', 0.058, 0.044],
    [9, null, '55 65 74 81 87 92 103 111', 0, 0.056],
  ]
  it.each(panels)('panel %d', (panel, hogging, sagging, longSupport, longSpan) => {
    RATIOS.forEach((ratio, i) => {
      const shortSupport = hogging === null ? 0 : row(hogging, 3)[i]!
      expect(restrainedMoments(panel, ratio)).toEqual({ shortSupport, shortSpan: row(sagging, 3)[i]!, longSupport, longSpan })
    })
  })

  it('runs straight between columns', () => {
    expect(restrainedMoments(4, 1.34).shortSupport).toBeCloseTo(0.069 + 0.4 * 0.005, 12)
    expect(restrainedMoments(7, 1.875).shortSpan).toBeCloseTo((0.069 + 0.074) / 2, 12)
  })
})

describe('Table 3.15, shear', () => {
  /** Panel, edge, whether it is continuous, and its row or its one value (two decimals). */
  const edges: [TwoWayCase, 'long' | 'short', boolean, string][] = [
    [1, 'long', true, '33 36 39 41 43 45 48 50'],
    [1, 'short', true, '33'],
    [2, 'long', true, '36 39 42 44 45 47 50 52'],
    [2, 'short', true, '36'],
    [2, 'short', false, '24'],
    [3, 'long', true, '36 40 44 47 49 51 55 59'],
    [3, 'long', false, '24 27 29 31 32 34 36 38'],
    [3, 'short', true, '36'],
    [4, 'long', true, '40 44 47 50 52 54 57 60'],
    [4, 'long', false, '26 29 31 33 34 35 38 40'],
    [4, 'short', true, '40'],
    [4, 'short', false, '26'],
    [5, 'long', true, '40 43 45 47 48 49 52 54'],
    [5, 'short', false, '26'],
    [6, 'long', false, '26 30 33 36 38 40 44 47'],
    [6, 'short', true, '40'],
    [7, 'long', true, '45 48 51 53 55 57 60 63'],
    [7, 'long', false, '30 32 34 35 36 37 39 41'],
    [7, 'short', false, '29'],
    [8, 'long', false, '29 33 36 38 40 42 45 48'],
    [8, 'short', true, '45'],
    [8, 'short', false, '30'],
    [9, 'long', false, '33 36 39 41 43 45 48 50'],
    [9, 'short', false, '33'],
  ]
  it.each(edges)('panel %d, %s edge, continuous %s', (panel, edge, isContinuous, printed) => {
    const cells = row(printed, 2)
    RATIOS.forEach((ratio, i) => expect(restrainedShear(panel, edge, isContinuous, ratio)).toBe(cells[i] ?? cells[0]))
  })

  it('has no other edges', () => {
    const listed = new Set(edges.map(([panel, edge, isContinuous]) => `${panel} ${edge} ${isContinuous}`))
    for (const panel of [1, 2, 3, 4, 5, 6, 7, 8, 9] as const)
      for (const edge of ['long', 'short'] as const)
        for (const isContinuous of [true, false])
          if (!listed.has(`${panel} ${edge} ${isContinuous}`)) expect(restrainedShear(panel, edge, isContinuous, 1.2)).toBeNull()
  })

  it('runs straight between columns', () => {
    expect(restrainedShear(3, 'long', true, 1.6)).toBeCloseTo(0.51 + 0.4 * 0.04, 12)
  })
})
