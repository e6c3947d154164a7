import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { BuildUp } from '#shared/contracts/buildUp'
import { builtUpRate } from '#shared/pricing/builtUpRate'
import type { BuildUpPrices, PricedResource } from '#shared/pricing/buildUpPrices'
import { minorUnit } from '#shared/pricing/minorUnit'
import { priceScheme } from '#shared/pricing/priceScheme'
import type { PriceLevel } from '#shared/pricing/threeDecimals'
import { arbitraryQuantities, arbitraryRates } from '../support/arbitraryBill'
import { arbitraryBuildUp, arbitraryPrices, millionths } from '../support/arbitraryBuildUp'

const LEVELS = ['low', 'likely', 'high'] as const
const CURRENCIES = ['USD', 'JPY', 'KWD'] as const

/** An exact fraction of whole numbers. */
class Fraction {
  constructor(
    readonly above: bigint,
    readonly below: bigint,
  ) {}
  static of(text: string): Fraction {
    const [whole, decimals = ''] = text.split('.')
    return new Fraction(BigInt(`${whole}${decimals}`), 10n ** BigInt(decimals.length))
  }
  plus = (other: Fraction) => new Fraction(this.above * other.below + other.above * this.below, this.below * other.below)
  times = (other: Fraction) => new Fraction(this.above * other.above, this.below * other.below)
  over = (other: Fraction) => this.times(new Fraction(other.below, other.above))
  /** Half up, as text with so many decimals. */
  print(decimals: number): string {
    const scaled = this.above * 10n ** BigInt(decimals)
    const digits = String((2n * scaled + this.below) / (2n * this.below)).padStart(decimals + 1, '0')
    return decimals === 0 ? digits : `${digits.slice(0, -decimals)}.${digits.slice(-decimals)}`
  }
}

const whole = (count: number) => new Fraction(BigInt(count), 1n)
const raised = (percent: string) => whole(1).plus(Fraction.of(percent).over(whole(100)))

/** The same rate in whole numbers only, written out step by step. */
function priceByFractions({ materials, labour, plant, ...on }: BuildUp, prices: BuildUpPrices, level: PriceLevel): Fraction {
  const priceOf = (code: string) => Fraction.of(prices.resources.get(code)!.price[level])
  const hourOf = (code: string) =>
    prices.gangs
      .get(code)!
      .members.map(({ resource, count }) => Fraction.of(count).times(priceOf(resource)))
      .reduce((sum, each) => sum.plus(each))
  const amounts = [
    ...materials.map(({ resource, quantity, wastePercent, uses }) =>
      priceOf(resource).times(Fraction.of(quantity)).times(raised(wastePercent)).over(whole(uses)),
    ),
    ...labour.map(({ gang, basis, value }) =>
      basis === 'hours' ? hourOf(gang).times(Fraction.of(value)) : hourOf(gang).over(Fraction.of(value)),
    ),
    ...plant.map(({ resource, fuel, outputPerHour }) => {
      const burnt = fuel === null ? whole(0) : Fraction.of(fuel.perHour).times(priceOf(fuel.resource))
      return priceOf(resource).plus(burnt).over(Fraction.of(outputPerHour))
    }),
  ]
  const net = amounts.reduce((sum, each) => sum.plus(each))
  return net.times(raised(on.overheadsPercent)).times(raised(on.profitPercent))
}

const BILLS = 10_000

/** The text of a decimal as a count of millionths. */
const counted = (text: string) => {
  const [units, decimals = ''] = text.split('.')
  return BigInt(`${units}${decimals.padEnd(6, '0')}`)
}

describe('builtUpRate', () => {
  it('is what exact fractions rounded half up give', () => {
    fc.assert(
      fc.property(arbitraryBuildUp, arbitraryPrices, fc.constantFrom(...CURRENCIES), (buildUp, prices, currency) => {
        const { price } = builtUpRate(buildUp, prices, currency)
        for (const level of LEVELS) {
          expect(price[level]).toBe(priceByFractions(buildUp, prices, level).print(minorUnit(currency)))
        }
      }),
      { numRuns: 3000 },
    )
  })

  it('rounds exact halves up, though its parts are thirds, sevenths and thirteenths', () => {
    fc.assert(
      fc.property(fc.constantFrom(3, 7, 13, 117), fc.nat(999_999), (uses, cents) => {
        const price = millionths(cents * 10_000 + 5000)
        const resource: PricedResource = {
          kind: 'material',
          description: 'a',
          unit: 'kg',
          price: { low: price, likely: price, high: price },
        }
        const line = { resource: 'm', quantity: '1', wastePercent: '0', uses, isBlock: false, source: '' }
        const buildUp = {
          materials: Array.from({ length: uses }, () => line),
          labour: [],
          plant: [],
          overheadsPercent: '0',
          profitPercent: '0',
        }
        const built = builtUpRate(buildUp, { resources: new Map([['m', resource]]), gangs: new Map() }, 'USD')
        expect(built.price.likely).toBe(((cents + 1) / 100).toFixed(2))
      }),
      { numRuns: 300 },
    )
  })

  it('is never cheaper with a dearer input', () => {
    const codes = ['m1', 'm2', 'm3', 'l1', 'l2', 'p1']
    fc.assert(
      fc.property(
        arbitraryBuildUp,
        arbitraryPrices,
        fc.constantFrom(...codes),
        fc.nat(50_000_000),
        (buildUp, prices, code, more) => {
          const before = builtUpRate(buildUp, prices, 'USD').price
          const old = prices.resources.get(code)!
          const dearer = (text: string) => millionths(Number(counted(text)) + more)
          const { low, likely, high } = old.price
          const price = { low: dearer(low), likely: dearer(likely), high: dearer(high) }
          const resources = new Map([...prices.resources, [code, { ...old, price }] as const])
          const after = builtUpRate(buildUp, { ...prices, resources }, 'USD').price
          for (const level of LEVELS) expect(counted(after[level]) >= counted(before[level])).toBe(true)
        },
      ),
    )
  })

  it('is low, then likely, then high, in every line and in all', () => {
    fc.assert(
      fc.property(arbitraryBuildUp, arbitraryPrices, (buildUp, prices) => {
        const { lines, net, overheads, profit, price } = builtUpRate(buildUp, prices, 'USD')
        for (const { low, likely, high } of [...lines, net, overheads, profit, price]) {
          expect(counted(low) <= counted(likely)).toBe(true)
          expect(counted(likely) <= counted(high)).toBe(true)
        }
      }),
    )
  })

  it('shows lines that add up to the net, and parts that add up to the rate, within what is not printed', () => {
    fc.assert(
      fc.property(arbitraryBuildUp, arbitraryPrices, (buildUp, prices) => {
        const { lines, net, overheads, profit, price } = builtUpRate(buildUp, prices, 'USD')
        const sum = (texts: readonly string[]) => texts.reduce((all, text) => all + counted(text), 0n)
        const apart = (a: bigint, b: bigint) => (a > b ? a - b : b - a)
        const halfStep = 50n // millionths: half of the fourth decimal
        for (const level of LEVELS) {
          const added = sum(lines.map((line) => line[level]))
          expect(apart(added, counted(net[level])) <= halfStep * BigInt(lines.length + 1)).toBe(true)
          const gross = sum([net[level], overheads[level], profit[level]])
          expect(apart(gross, counted(price[level])) <= 5000n + 3n * halfStep).toBe(true)
        }
      }),
    )
  })

  it('scales: a thousand times every price is a thousand times the rate, in a currency without decimals', () => {
    fc.assert(
      fc.property(arbitraryBuildUp, arbitraryPrices, (buildUp, prices) => {
        const times1000 = (text: string) => String(counted(text) / 1000n) // prices of whole thousandths below
        const thousandths = (text: string) => millionths(Number((counted(text) / 1000n) * 1000n))
        const priced = (change: (text: string) => string): BuildUpPrices => ({
          ...prices,
          resources: new Map(
            [...prices.resources].map(([code, { price, ...own }]) => [
              code,
              { ...own, price: { low: change(price.low), likely: change(price.likely), high: change(price.high) } },
            ]),
          ),
        })
        const inThousandths = builtUpRate(buildUp, priced(thousandths), 'KWD').price.likely
        fc.pre(counted(inThousandths) < 900_000_000_000n)
        expect(builtUpRate(buildUp, priced(times1000), 'JPY').price.likely).toBe(String(BigInt(inThousandths.replace('.', ''))))
      }),
    )
  })

  it('prices ten thousand bills without drift: their lines and markups add up to the total', () => {
    fc.assert(
      fc.property(
        arbitraryQuantities,
        arbitraryRates,
        arbitraryBuildUp,
        arbitraryPrices,
        (quantities, rates, buildUp, prices) => {
          const price = builtUpRate(buildUp, prices, rates.currency).price.likely
          fc.pre(counted(price) < 100_000_000_000n)
          const items = Object.fromEntries(
            quantities.map(({ item }, index) => [item, index % 2 === 0 ? price : (rates.items[item] ?? price)]),
          )
          const { lines, markups, total } = priceScheme(quantities, { ...rates, items }, 257.22)
          const scale = 10n ** BigInt(minorUnit(rates.currency))
          for (const { rate, quantity, amount } of lines) {
            expect(amount).toBe(Fraction.of(rate).times(Fraction.of(quantity)).print(minorUnit(rates.currency)))
          }
          const added = [...lines, ...markups].reduce((sum, each) => sum + (counted(each.amount) * scale) / 1_000_000n, 0n)
          expect(added).toBe((counted(total) * scale) / 1_000_000n)
        },
      ),
      { numRuns: BILLS },
    )
  }, 120_000)
})
