import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { type CuttingPlan, cuttingPlan, type WantedLength } from '#shared/schedule/cutting/cuttingPlan'
import { BIN_MM, binPackingClassU } from './support/binPackingClassU'

const wantedOf = (lengths: readonly number[]): WantedLength[] => lengths.map((lengthMm) => ({ lengthMm, count: 1 }))

/** Every piece cut once, no bar overfilled, bounds in order. */
function expectSound(plan: CuttingPlan, wanted: readonly WantedLength[]) {
  const cut = new Map<number, number>()
  for (const { pieces, times, offcutMm } of plan.patterns) {
    expect(times).toBeGreaterThan(0)
    const number = pieces.reduce((sum, { count }) => sum + count, 0)
    const taken = pieces.reduce((sum, { lengthMm, count }) => sum + lengthMm * count, 0)
    expect(taken + (number - 1) * plan.sawCutMm).toBeLessThanOrEqual(plan.stockMm)
    expect(offcutMm).toBe(Math.max(0, plan.stockMm - taken - number * plan.sawCutMm))
    for (const { lengthMm, count } of pieces) cut.set(lengthMm, (cut.get(lengthMm) ?? 0) + count * times)
  }
  const asked = new Map<number, number>()
  for (const { lengthMm, count } of wanted) if (count > 0) asked.set(lengthMm, (asked.get(lengthMm) ?? 0) + count)
  const sorted = (map: Map<number, number>) => [...map].sort(([a], [b]) => a - b)
  expect(sorted(cut)).toEqual(sorted(asked))
  expect(plan.used).toBe(plan.patterns.reduce((sum, { times }) => sum + times, 0))
  expect(plan.used).toBeGreaterThanOrEqual(plan.linearBound - 1e-6)
  expect(Math.ceil(plan.linearBound - 1e-6)).toBeGreaterThanOrEqual(plan.lengthBound)
  if (plan.proof === 'bound') expect(plan.used).toBe(Math.ceil(plan.linearBound - 1e-6))
}

describe('published instances', () => {
  it('of Chvátal, Linear Programming (1983), chapter 13: 452.25 rolls by the program, 453 whole (data seen in a copy, results from memory)', () => {
    const wanted = [
      { lengthMm: 45, count: 97 },
      { lengthMm: 36, count: 610 },
      { lengthMm: 31, count: 395 },
      { lengthMm: 14, count: 211 },
    ]
    const plan = cuttingPlan(wanted, 100)
    expectSound(plan, wanted)
    expect(plan.linearBound).toBeCloseTo(452.25, 6)
    expect([plan.used, plan.proof]).toEqual([453, 'bound'])
  })

  it('of the paper machine, rolls of 5600 mm in 13 widths: 73 rolls (Wikipedia, Cutting stock problem; data seen, result from memory)', () => {
    const widths = [1380, 1520, 1560, 1710, 1820, 1880, 1930, 2000, 2050, 2100, 2140, 2150, 2200]
    const counts = [22, 25, 12, 14, 18, 18, 20, 10, 12, 14, 16, 18, 20]
    const wanted = widths.map((lengthMm, i) => ({ lengthMm, count: counts[i]! }))
    const plan = cuttingPlan(wanted, 5600)
    expectSound(plan, wanted)
    expect([plan.piecesMm, plan.used, plan.proof]).toEqual([407_160, 73, 'bound'])
    // as printed, 0.401 % of the rolls is waste
    expect(100 * plan.wasteShare).toBeCloseTo(0.401, 3)
  })

  it.each(binPackingClassU)('$name of Falkenauer: $bins bins', ({ bins, items }) => {
    const plan = cuttingPlan(wantedOf(items), BIN_MM)
    expectSound(plan, wantedOf(items))
    expect(plan.used).toBe(bins)
  })
})

describe('triplets: bars cut in three without waste, so that their number is the least', () => {
  const triplet = fc
    .tuple(fc.integer({ min: 380, max: 490 }), fc.double({ min: 0, max: 1, noNaN: true }))
    .map(([first, share]) => {
      const second = 250 + Math.floor(share * ((1000 - first) / 2 - 250))
      return [first, second, 1000 - first - second]
    })

  it('are found again', () => {
    fc.assert(
      fc.property(fc.array(triplet, { minLength: 1, maxLength: 15 }), (bars) => {
        const plan = cuttingPlan(wantedOf(bars.flat()), 1000)
        expectSound(plan, wantedOf(bars.flat()))
        expect([plan.used, plan.wasteShare, plan.proof]).toEqual([bars.length, 0, 'bound'])
      }),
      { numRuns: 20 },
    )
  })
})

describe('small wants', () => {
  /** Fewest bars by trying every place for every piece: independent of the plan's own search. */
  function fewest(lengths: readonly number[], stock: number, saw: number): number {
    let best = lengths.length
    const sorted = [...lengths].sort((a, b) => b - a)
    const rooms: number[] = []
    function place(at: number): void {
      if (rooms.length >= best) return
      if (at === sorted.length) {
        best = rooms.length
        return
      }
      const size = sorted[at]! + saw
      const tried = new Set<number>()
      rooms.forEach((room, bar) => {
        if (room < size || tried.has(room)) return
        tried.add(room)
        rooms[bar] = room - size
        place(at + 1)
        rooms[bar] = room
      })
      rooms.push(stock + saw - size)
      place(at + 1)
      rooms.pop()
    }
    place(0)
    return best
  }

  it('take as few bars as trying everything finds, and say so', () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: 8, max: 100 }), { minLength: 1, maxLength: 10 }),
        fc.integer({ min: 0, max: 4 }),
        (lengths, saw) => {
          const plan = cuttingPlan(wantedOf(lengths), 100, saw)
          expectSound(plan, wantedOf(lengths))
          expect(plan.used).toBe(fewest(lengths, 100, saw))
          expect(plan.proof).not.toBeNull()
        },
      ),
      { numRuns: 300 },
    )
  })
})

describe('any wants', () => {
  it('are cut once each, in no more bars than one more than the bound', () => {
    const wanted = fc.array(fc.record({ lengthMm: fc.integer({ min: 30, max: 480 }), count: fc.integer({ min: 0, max: 60 }) }), {
      minLength: 1,
      maxLength: 12,
    })
    fc.assert(
      fc.property(wanted, (all) => {
        const lengths = all.map(({ lengthMm, count }) => ({ lengthMm: lengthMm * 25, count }))
        const plan = cuttingPlan(lengths, 12_000)
        expectSound(plan, lengths)
        expect(plan.used).toBeLessThanOrEqual(Math.ceil(plan.linearBound - 1e-6) + 1)
      }),
      { numRuns: 60 },
    )
  })

  it('count no piece more often than it is wanted in the linear program', () => {
    // 5 and 6 do not fit one bar of 10: two bars; if 5 could be cut twice from a bar, half a bar would seem enough for it
    const plan = cuttingPlan(wantedOf([5, 6]), 10)
    expect(plan.linearBound).toBeCloseTo(2, 9)
    expect([plan.used, plan.lengthBound, plan.proof]).toEqual([2, 2, 'bound'])
  })

  it('take no bar where nothing is wanted', () => {
    expect(cuttingPlan([{ lengthMm: 500, count: 0 }], 12_000)).toMatchObject({ used: 0, patterns: [], wasteShare: 0 })
  })

  it('are refused where a length is not whole or longer than the stock', () => {
    expect(() => cuttingPlan([{ lengthMm: 12_025, count: 1 }], 12_000)).toThrow(/up to the stock of 12000, got 12025/)
    expect(() => cuttingPlan([{ lengthMm: 100.5, count: 1 }], 12_000)).toThrow(RangeError)
    expect(() => cuttingPlan([{ lengthMm: 100, count: 1 }], 12_000, -1)).toThrow(/saw cut/)
  })

  it('lose the saw cuts between pieces, none where the last piece ends the bar', () => {
    // three of 4000 fill a bar when sheared; with a saw cut of 4 two fit
    expect(cuttingPlan([{ lengthMm: 4000, count: 6 }], 12_000).used).toBe(2)
    expect(cuttingPlan([{ lengthMm: 4000, count: 6 }], 12_000, 4).used).toBe(3)
    expect(cuttingPlan([{ lengthMm: 5998, count: 4 }], 12_000, 4).used).toBe(2)
  })
})
