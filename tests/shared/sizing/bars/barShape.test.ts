/** Lengths by BS 8666:2005, Table 3, as a public copy prints them (00, 11, 21 seen); radii and steps from memory; the arithmetic by hand. */
import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { anchoredEnd } from '#shared/sizing/bars/barEnds'
import { totalLengthMm } from '#shared/sizing/bars/barRuns'
import { cutLengthMm, formulaLengthMm, shapeOf } from '#shared/sizing/bars/barShape'
import { cutBars } from '#shared/sizing/bars/cutBars'

describe('a shape', () => {
  it.each([
    // 00: A
    [12, 5983, [0, 0], '00', [6000], 6000, 6000],
    // 11: A + B − 0.5r − d = 2000 + 300 − 0.5·24 − 12
    [12, 2000, [300, 0], '11', [2000, 300], 2276, 2300],
    // 11 at 20 mm, r = 70: 1500 + 200 − 35 − 20
    [20, 1500, [0, 200], '11', [1500, 200], 1645, 1650],
    // 21: A + B + C − r − 2d = 150 + 1000 + 200 − 32 − 2·16, the side between the legs rounded down to 5
    [16, 1004, [150, 200], '21', [150, 1000, 200], 1286, 1300],
    // dimensions to 5 mm
    [8, 1122.4, [183.7, 0], '11', [1125, 185], 1294, 1300],
  ] as const)('of diameter %d over %d with legs %j is %s', (diameter, plan, legs, code, dimensions, formula, cut) => {
    const shape = shapeOf(plan, legs)
    expect(shape).toEqual({ code, dimensionsMm: dimensions })
    expect(formulaLengthMm(shape, diameter)).toBe(formula)
    expect(cutLengthMm(shape, diameter)).toBe(cut)
  })

  it('keeps its length when a floor is turned and a length moves by less than a hundredth', () => {
    expect(shapeOf(4500.009, [0, 0]).dimensionsMm).toEqual([4500])
    expect(shapeOf(4499.991, [0, 0]).dimensionsMm).toEqual([4500])
    expect(shapeOf(4500.02, [0, 0]).dimensionsMm).toEqual([4525])
  })
})

describe('an end', () => {
  it('is straight where the support has room, else turned by what is missing, at least what a bend takes', () => {
    expect(anchoredEnd(12, 200, 225)).toEqual({ pastMm: 200, legMm: 0 })
    expect(anchoredEnd(12, 400, 225)).toEqual({ pastMm: 225, legMm: 175 })
    expect(anchoredEnd(12, 240, 225)).toEqual({ pastMm: 225, legMm: 125 }) // P of 12 mm
  })
})

describe('a line longer than the stock', () => {
  const made = { diameter: 12, stockMm: 12_000, lapMm: () => 500 } as const

  it('is cut as stock lengths and a rest that laps', () => {
    // 30 000 + 2 · 500 = 12 000 + 12 000 + 7000
    const bars = cutBars(made, { parts: [30_000], legs: [0, 0] })
    expect(bars.map(({ lengthMm }) => lengthMm)).toEqual([12_000, 12_000, 7000])
  })

  it('keeps its legs at its two ends', () => {
    const bars = cutBars(made, { parts: [20_000], legs: [300, 200] })
    expect(bars.map(({ shape }) => shape.code)).toEqual(['11', '11'])
    // first: A + 300 − 12 − 12 = 12 000, A = 11 720 to 5 mm (11 724); rest 20 500 − 11 720 = 8780
    expect(bars[0]).toEqual({ shape: { code: '11', dimensionsMm: [11_720, 300] }, lengthMm: 12_000 })
    expect(bars[1]).toEqual({ shape: { code: '11', dimensionsMm: [8780, 200] }, lengthMm: 8975 })
  })

  it('has no bar longer than the stock, none shorter than its lap, and covers its length and laps', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 100, max: 60_000 }),
        fc.integer({ min: 240, max: 720 }),
        fc.integer({ min: 200, max: 1500 }),
        fc.constantFrom([0, 0], [150, 0], [0, 200], [150, 200]),
        (plan, stock, lap, legs) => {
          const stockMm = stock * 25
          const piece = { parts: [plan], legs: legs as [number, number] }
          const lines = { diameter: 12, stockMm, lapMm: () => lap, each: 3, pieces: [piece] } as const
          const bars = cutBars(lines, piece)
          expect(bars.every(({ lengthMm }) => lengthMm <= stockMm && lengthMm % 25 === 0)).toBe(true)
          if (bars.length > 1) expect(bars.at(-1)!.lengthMm).toBeGreaterThan(lap)
          const along = bars.reduce((sum, { shape: { code, dimensionsMm } }) => sum + dimensionsMm[code === '21' ? 1 : 0]!, 0)
          expect(along - (bars.length - 1) * lap - plan).toBeGreaterThan(-5.011)
          expect(along - (bars.length - 1) * lap - plan).toBeLessThan(25)
          expect(totalLengthMm(lines)).toBe(3 * bars.reduce((sum, { lengthMm }) => sum + lengthMm, 0))
        },
      ),
    )
  })
})
