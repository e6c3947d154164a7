import Big from 'big.js'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { ItemCode, Level, Rates } from '#shared/contracts/appraisal'
import type { Cost, Quantity } from '#shared/contracts/appraisalResult'
import { itemCode } from '#shared/contracts/appraisal'
import { cost as costContract, quantity as quantityContract } from '#shared/contracts/appraisalResult'
import { measurement } from '#shared/contracts/measurement'
import { compareSchemes } from '#shared/comparison/compareSchemes'
import { minorUnit } from '#shared/pricing/minorUnit'
import { allInCost } from '#shared/pricing/allInCost'
import { itemisedCost } from '#shared/pricing/itemisedCost'
import { priceScheme } from '#shared/pricing/priceScheme'
import { itemisedQuantities } from '#shared/takeoff/itemisedQuantities'
import { ruleDifferences } from '#shared/takeoff/ruleDifferences'
import { RULE_SETS } from '#shared/takeoff/ruleSets'
import { takeOffScheme } from '#shared/takeoff/takeOffScheme'
import { arbitraryRates } from '../support/arbitraryBill'
import { evaluate } from '../support/evaluate'
import { barRun, handSized, levelOf, rectangle, ribbedOf, solidOf } from '../support/handSized'

const ARITHMETIC = 1e-9
const BILLS = 500
const codes = measurement.options
const sumOf = (values: readonly number[]) => values.reduce((sum, value) => sum + value, 0)
const isClose = (a: number, b: number) => Math.abs(a - b) <= ARITHMETIC * Math.max(1, Math.abs(a), Math.abs(b))

/** A floor of one bay or two, of any size, with a small and a larger void, over beams or walls. */
const arbitraryLevel = fc
  .record({
    lx: fc.integer({ min: 4000, max: 9000 }),
    ly: fc.integer({ min: 4000, max: 9000 }),
    kind: fc.constantFrom('beam' as const, 'wall' as const),
    continuity: fc.constantFrom('discontinuous' as const, 'continuous' as const),
    voidSide: fc.integer({ min: 150, max: 2400 }),
    repeat: fc.integer({ min: 1, max: 12 }),
    proppingHeight: fc.integer({ min: 1500, max: 9000 }),
    hasSecond: fc.boolean(),
  })
  .map(({ lx, ly, kind, continuity, voidSide, repeat, proppingHeight, hasSecond }): Level => {
    const edges = [{ supportWidth: 250, kind, continuity }]
    const first = { outline: rectangle(0, 0, lx, ly), edges, voids: [rectangle(600, 700, voidSide, voidSide)], repeat }
    const second = { outline: rectangle(lx, 0, 5000, ly), edges, voids: [rectangle(lx + 900, 900, 200, 150)] }
    return { ...levelOf(first, ...(hasSecond ? [second] : [])), proppingHeight, repeat: 1 + (repeat % 3) }
  })
const arbitraryScheme = fc.oneof(
  fc.integer({ min: 100, max: 700 }).map(solidOf),
  fc
    .record({
      ribWidth: fc.integer({ min: 80, max: 200 }),
      topping: fc.integer({ min: 40, max: 400 }),
      cutBlocks: fc.boolean(),
      mesh: fc.constantFrom('none' as const, 'A142' as const, 'A393' as const),
    })
    .map(ribbedOf),
)
const arbitraryFloor = fc.record({
  level: arbitraryLevel,
  scheme: arbitraryScheme,
  basis: fc.constantFrom('EN1992' as const, 'BS8110' as const),
  bars: fc.array(fc.tuple(fc.constantFrom(8, 12, 20), fc.integer({ min: 1, max: 90 }), fc.integer({ min: 800, max: 12_000 })), {
    maxLength: 4,
  }),
})
type Floor = Parameters<Parameters<typeof arbitraryFloor.map>[0]>[0]

const runsOf = ({ bars }: Floor) => bars.map(([diameter, count, length]) => barRun(diameter as 8, count, length))
function measuredBy(code: (typeof codes)[number], floor: Floor, levels: readonly Level[] = [floor.level]): Quantity[] {
  const sized = handSized(floor.scheme, levels, runsOf(floor))
  return takeOffScheme(floor.scheme, sized, levels, RULE_SETS[code], floor.basis)
}
const flat = (quantities: readonly Quantity[]) => quantities.flatMap((each) => [each, ...(each.analysis ?? [])])
const measuredWork = ({ lines }: Cost) => lines.reduce((sum, { amount }) => sum.plus(amount), new Big(0))
const priced = (code: (typeof codes)[number], floor: Floor, rates: Rates): Cost =>
  costContract.parse(priceScheme(measuredBy(code, floor), rates, 100, [], RULE_SETS[code]))

describe.each(codes)('measured by %s', (code) => {
  const rules = RULE_SETS[code]

  it('yields arithmetic that evaluates, parts that add up and concrete that reconciles, on any floor', () => {
    fc.assert(
      fc.property(arbitraryFloor, (floor) => {
        for (const { unit, net, parts, split } of flat(measuredBy(code, floor).map((each) => quantityContract.parse(each)))) {
          for (const { expression, value } of parts) expect(isClose(evaluate(expression), value)).toBe(true)
          const whole = sumOf(parts.map(({ value }) => value))
          const half = 0.5 * 10 ** -rules.decimals[unit]
          expect(Math.abs(net - whole)).toBeLessThanOrEqual((rules.isOneAtLeast && whole < half ? 1 : half) + ARITHMETIC * whole)
          if (split) expect(isClose(sumOf(Object.values(split)), whole)).toBe(true)
        }
      }),
      { numRuns: 80 },
    )
  })

  it('bills the mass of every run of bars and every block that is laid', () => {
    fc.assert(
      fc.property(arbitraryFloor, (floor) => {
        const sized = handSized(floor.scheme, [floor.level], runsOf(floor))
        const items = itemisedQuantities(measuredBy(code, floor))
        const partsOf = (family: string) =>
          sumOf(items.filter(({ item }) => item.startsWith(family)).flatMap(({ parts }) => parts.map(({ value }) => value)))
        const repeats = floor.level.panels.map((panel) => panel.repeat * floor.level.repeat)
        const mass = { 8: 0.395, 12: 0.888, 20: 2.47 } as Record<number, number>
        const kg =
          sumOf(floor.bars.map(([diameter, count, length]) => count * (length / 1000) * mass[diameter]!)) * sumOf(repeats)
        expect(isClose(partsOf('steel.bar.') * 1000, kg)).toBe(true)
        const laid = (of: 'blocksWhole' | 'blocksCut') =>
          sumOf(sized.panels.map(({ layout }, at) => (layout?.[of] ?? 0) * repeats[at]!))
        expect(partsOf('blocks.whole')).toBe(laid('blocksWhole'))
        expect(partsOf('blocks.cut')).toBe(laid('blocksCut'))
      }),
      { numRuns: 60 },
    )
  })

  it('takes as much where a level is split into two, and in proportion to repeats', () => {
    fc.assert(
      fc.property(arbitraryFloor, (floor) => {
        const { level } = floor
        const once = itemisedQuantities(measuredBy(code, floor))
        const twice = itemisedQuantities(measuredBy(code, floor, [level, { ...level, mark: 'L2' }]))
        const timesed = itemisedQuantities(measuredBy(code, floor, [{ ...level, repeat: level.repeat * 2 }]))
        once.forEach(({ item, parts }, at) => {
          const whole = sumOf(parts.map(({ value }) => value))
          for (const other of [twice[at]!, timesed[at]!]) {
            expect(other.item).toBe(item)
            expect(isClose(sumOf(other.parts.map(({ value }) => value)), 2 * whole)).toBe(true)
          }
        })
      }),
      { numRuns: 60 },
    )
  })

  it('differs from the rules for comparing by its stated differences and nothing else', () => {
    fc.assert(
      fc.property(arbitraryFloor, (floor) => {
        const { scheme, level, basis } = floor
        const stated = ruleDifferences(scheme, handSized(scheme, [level], runsOf(floor)), [level], rules, basis)
        const [plain, these] = [itemisedQuantities(measuredBy('comparing', floor)), itemisedQuantities(measuredBy(code, floor))]
        const net = (all: typeof plain, item: ItemCode) => all.find((each) => each.item === item)?.net ?? 0
        for (const item of itemCode.options) {
          const differences = stated.filter((each) => each.item === item).map(({ difference }) => difference)
          expect(Math.abs(net(these, item) - net(plain, item) - sumOf(differences))).toBeLessThan(1e-6)
        }
      }),
      { numRuns: 60 },
    )
  })

  it(`prints ${BILLS} bills that add up: lines, what they are made up of, markups and total`, () => {
    fc.assert(
      fc.property(arbitraryFloor, arbitraryRates, (floor, rates) => {
        for (const cost of [priced(code, floor, rates), allInCost(priced(code, floor, rates))]) {
          const printed = [...cost.lines, ...cost.markups].reduce((sum, { amount }) => sum.plus(amount), new Big(0))
          expect(printed.toFixed(10)).toBe(new Big(cost.total).toFixed(10))
          for (const { analysis, amount } of cost.lines) {
            const parts = analysis?.reduce((sum, part) => sum.plus(part.amount), new Big(0))
            if (parts) expect(parts.toFixed(10)).toBe(new Big(amount).toFixed(10))
          }
        }
        const { lines, currency } = priced(code, floor, rates)
        for (const { quantity, rate, amount } of lines) {
          expect(new Big(quantity).times(rate).round(minorUnit(currency), Big.roundHalfUp).toFixed(10)).toBe(
            new Big(amount).toFixed(10),
          )
        }
      }),
      { numRuns: BILLS },
    )
  })
})

describe('what the rules bill together or in another unit', () => {
  it('costs the same to the last minor unit', () => {
    fc.assert(
      fc.property(arbitraryFloor, arbitraryRates, (floor, rates) => {
        const plain = priced('comparing', floor, rates)
        const composite = priced('composite', floor, rates)
        if (floor.level.panels.length === 1 || floor.scheme.kind === 'ribbed') expect(composite.total).toBe(plain.total)
        const itemsOf = ({ lines }: Cost) => lines.map(({ item }) => item).sort()
        expect(itemsOf(itemisedCost(composite))).toEqual(itemsOf(plain))
        const bars = ({ lines }: Cost) =>
          measuredWork({ lines: lines.filter(({ item }) => item.startsWith('steel.bar.')) } as Cost)
        expect(bars(priced('kilograms', floor, rates)).eq(bars(plain))).toBe(true)
      }),
      { numRuns: 200 },
    )
  })

  it('leaves the comparison of two schemes as it is, tipping points included', () => {
    fc.assert(
      fc.property(arbitraryLevel, arbitraryRates, (level, rates) => {
        const comparisonBy = (code: (typeof codes)[number]) => {
          const [ribbed, solid] = [ribbedOf(), solidOf(180)].map((scheme) => {
            const cost = priced(code, { level, scheme, basis: 'EN1992', bars: [[12, 40, 5000]] }, rates)
            return { mark: scheme.mark, cost } as Parameters<typeof compareSchemes>[0]
          })
          return compareSchemes(ribbed!, solid!)
        }
        const plain = comparisonBy('comparing')!
        const composite = comparisonBy('composite')!
        expect(composite).toEqual(plain)
      }),
      { numRuns: 60 },
    )
  })
})
