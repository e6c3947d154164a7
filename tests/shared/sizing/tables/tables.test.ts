/**
 * Tables against the values of the reference sheet: every corner, and between columns.
 *
 * BS 8110-1:1997, Tables 3.12 to 3.15; EN 1992-1-1:2004, Table 3.1; EN 1992-1-2:2004, Tables 5.5, 5.6, 5.8. Seen or remembered as each
 * table's own docstring says.
 */
import { describe, expect, it } from 'vitest'
import { meanTensileStrength, PRINTED_TENSILE_STRENGTH_MPA } from '#shared/sizing/en1992/meanTensileStrength'
import { ribFire, slabFire } from '#shared/sizing/en1992/fire'
import { barAreaMm2 } from '#shared/sizing/tables/bars'
import { FABRIC } from '#shared/sizing/tables/fabric'
import { interpolate } from '#shared/sizing/tables/interpolate'
import { ONE_WAY_COEFFICIENTS } from '#shared/sizing/tables/oneWayCoefficients'
import { restrainedMoments } from '#shared/sizing/tables/restrainedMoments'
import { restrainedShear } from '#shared/sizing/tables/restrainedShears'
import { simplySupportedCoefficients } from '#shared/sizing/tables/simplySupportedCoefficients'
import { type TwoWayCase, twoWayCase } from '#shared/sizing/tables/twoWayCase'

/** Half of the last printed digit of BS 4483 areas, mm²/m, and of EN 1992-1-1 Table 3.1, MPa. */
const HALF_DIGIT = 0.05

describe('interpolate', () => {
  it('gives printed values at columns, straight lines between, ends beyond', () => {
    const at = (x: number) => interpolate([1, 2, 4], [10, 20, 10], x)
    expect([0, 1, 1.5, 2, 3, 4, 9].map(at)).toEqual([10, 10, 15, 20, 15, 10, 10])
  })
})

describe('Table 3.12', () => {
  it('holds the printed coefficients', () => {
    expect(ONE_WAY_COEFFICIENTS.moment).toEqual({
      outerSupport: 0,
      endSpan: 0.086,
      firstInteriorSupport: 0.086,
      interiorSpan: 0.063,
      interiorSupport: 0.063,
    })
    expect(ONE_WAY_COEFFICIENTS.shear).toEqual({ outerSupport: 0.4, firstInteriorSupport: 0.6, interiorSupport: 0.5 })
  })
})

describe('Table 3.13', () => {
  it.each([
    [1, 0.062, 0.062],
    [1.15, 0.079, 0.06],
    [1.5, 0.104, 0.046],
    [2, 0.118, 0.029],
  ])('gives at ly/lx %d the coefficients %d and %d', (aspect, short, long) => {
    expect(simplySupportedCoefficients(aspect).short).toBeCloseTo(short, 10)
    expect(simplySupportedCoefficients(aspect).long).toBeCloseTo(long, 10)
  })
})

describe('Table 3.14', () => {
  /** Panel, first and last short support, first and last short span, long support, long span. */
  const corners: [TwoWayCase, number, number, number, number, number, number][] = [
    [1, 0.031, 0.063, 0.024, 0.048, 0.032, 0.024],
    [2, 0.039, 0.067, 0.029, 0.05, 0.037, 0.028],
    [3, 0.039, 0.089, 0.03, 0.067, 0.037, 0.028],
    [4, 0.047, 0.093, 0.036, 0.07, 0.045, 0.034],
    [5, 0.046, 0.07, 0.034, 0.053, 0, 0.034],
    [6, 0, 0, 0.034, 0.1, 0.045, 0.034],
    [7, 0.057, 0.098, 0.043, 0.074, 0, 0.044],
    [8, 0, 0, 0.042, 0.105, 0.058, 0.044],
    [9, 0, 0, 0.055, 0.111, 0, 0.056],
  ]
  it.each(corners)('holds the corners of panel %d', (panel, firstHog, lastHog, firstSag, lastSag, longHog, longSag) => {
    const [first, last] = [restrainedMoments(panel, 1), restrainedMoments(panel, 2)]
    expect(first).toEqual({ shortSupport: firstHog, shortSpan: firstSag, longSupport: longHog, longSpan: longSag })
    expect(last).toEqual({ shortSupport: lastHog, shortSpan: lastSag, longSupport: longHog, longSpan: longSag })
  })

  it('holds the entries that public encodings get wrong', () => {
    expect(restrainedMoments(3, 1.3).shortSupport).toBe(0.062)
    expect(restrainedMoments(3, 1.3).longSupport).toBe(0.037)
    expect(restrainedMoments(4, 1.3).longSupport).toBe(0.045)
  })

  it('runs straight between columns', () => {
    expect(restrainedMoments(4, 1.34).shortSupport).toBeCloseTo(0.069 + 0.4 * (0.074 - 0.069), 12)
    expect(restrainedMoments(4, 1.625).shortSpan).toBeCloseTo((0.059 + 0.065) / 2, 12)
  })

  it('numbers the nine cases by their discontinuous edges', () => {
    const cases = ([0, 1, 2] as const).map((long) => ([0, 1, 2] as const).map((short) => twoWayCase(long, short)))
    expect(cases).toEqual([
      [1, 2, 5],
      [3, 4, 7],
      [6, 8, 9],
    ])
  })
})

describe('Table 3.15', () => {
  it.each([
    [1, 'long', true, 1, 0.33],
    [1, 'long', true, 2, 0.5],
    [3, 'long', false, 1.4, 0.32],
    [4, 'long', true, 1.6, 0.54 + (0.1 / 0.25) * 0.03],
    [7, 'short', false, 1.2, 0.29],
    [8, 'short', true, 1.9, 0.45],
    [9, 'long', false, 1.75, 0.48],
  ] as const)('gives panel %d, %s edge, continuous %s, at %d: %d', (panel, edge, isContinuous, aspect, value) => {
    expect(restrainedShear(panel, edge, isContinuous, aspect)).toBeCloseTo(value, 12)
  })

  it('has no value for an edge that the panel has not', () => {
    expect(restrainedShear(9, 'long', true, 1)).toBeNull()
    expect(restrainedShear(1, 'short', false, 1)).toBeNull()
  })
})

describe('fire tables', () => {
  it('give slabs their thickness and axis distance', () => {
    expect(slabFire(60, 'oneWay').size.value).toBe(80)
    expect(slabFire(120, 'oneWay').bars.value).toBe(40)
    expect(slabFire(90, 'twoWay').bars.value).toBe(15)
    expect(slabFire(240, 'twoWayLong').bars.value).toBe(50)
  })

  it('give ribs a width, and an axis distance between the columns', () => {
    expect(ribFire(60, 120, false, 0).size.value).toBe(120)
    expect(ribFire(60, 140, false, 0).bars.value).toBeCloseTo(37.5, 10)
    expect(ribFire(60, 160, true, 0).bars.value).toBeCloseTo(18.5, 10)
  })

  it('leave Table 5.6 once moments were redistributed by 20 %', () => {
    expect(ribFire(60, 120, true, 0).bars.value).toBe(25)
    expect(ribFire(60, 120, true, 0.2).bars.value).toBe(40)
  })

  it('ask 10 mm more to the side up to the second width only', () => {
    expect(ribFire(60, 160, false, 0).sideAxisMm?.value).toBe(45)
    expect(ribFire(60, 161, false, 0).sideAxisMm).toBeNull()
  })
})

describe('materials', () => {
  it.each(Object.entries(PRINTED_TENSILE_STRENGTH_MPA))('gives C%s the printed fctm of %d MPa', (fck, printed) => {
    expect(Math.abs(meanTensileStrength(Number(fck)) - printed)).toBeLessThanOrEqual(HALF_DIGIT)
  })

  it.each([
    [8, 50.3],
    [10, 78.5],
    [12, 113.1],
    [16, 201.1],
    [20, 314.2],
    [25, 490.9],
  ] as const)('gives a bar of %d mm its area of %d mm²', (diameter, printed) => {
    expect(Math.abs(barAreaMm2(diameter) - printed)).toBeLessThanOrEqual(HALF_DIGIT)
  })

  it.each([
    ['A142', 6],
    ['A193', 7],
    ['A252', 8],
    ['A393', 10],
  ] as const)('gives %s the area of %d mm wires at 200', (mesh, wire) => {
    expect(Math.abs(FABRIC[mesh].areaMm2PerM - (Math.PI * wire ** 2 * 5) / 4)).toBeLessThanOrEqual(HALF_DIGIT)
  })
})
