import fc from 'fast-check'
import type { BuildUp } from '#shared/contracts/buildUp'
import type { ThreePrices } from '#shared/contracts/resource'
import type { BuildUpPrices, PricedResource } from '#shared/pricing/buildUpPrices'

/** A decimal text of so many millionths. */
export const millionths = (count: number): string =>
  `${Math.floor(count / 1_000_000)}.${String(count % 1_000_000).padStart(6, '0')}`

const amount = (least: number, most: number) => fc.integer({ min: least, max: most }).map(millionths)
const prices: fc.Arbitrary<ThreePrices> = fc
  .tuple(fc.nat(900_000_000), fc.nat(90_000_000), fc.nat(90_000_000))
  .map(([low, more, still]) => ({ low: millionths(low), likely: millionths(low + more), high: millionths(low + more + still) }))
const resourceOf = (kind: PricedResource['kind']) =>
  prices.map((price): PricedResource => ({ kind, description: `a ${kind}`, unit: 'kg', price }))

const MATERIALS = ['m1', 'm2', 'm3'] as const
const LABOUR = ['l1', 'l2'] as const

/** An edition of three materials, two labour resources, a machine and two gangs. */
export const arbitraryPrices: fc.Arbitrary<BuildUpPrices> = fc
  .tuple(
    fc.array(resourceOf('material'), { minLength: 3, maxLength: 3 }),
    fc.array(resourceOf('labour'), { minLength: 2, maxLength: 2 }),
    resourceOf('plant'),
    fc.array(fc.tuple(amount(1, 9_000_000), amount(1, 9_000_000)), { minLength: 2, maxLength: 2 }),
  )
  .map(([materials, labour, plant, counts]) => ({
    resources: new Map<string, PricedResource>([
      ...MATERIALS.map((code, index) => [code, materials[index]!] as const),
      ...LABOUR.map((code, index) => [code, labour[index]!] as const),
      ['p1', plant],
    ]),
    gangs: new Map(
      counts.map(([first, second], index) => [
        `g${index + 1}`,
        {
          description: 'a gang',
          members: [
            { resource: 'l1', count: first },
            { resource: 'l2', count: second },
          ],
        },
      ]),
    ),
  }))

const percent = fc.integer({ min: 0, max: 1_000_000 }).map((count) => (count / 10_000).toFixed(4))

/** A build-up of that edition with up to nine lines. */
export const arbitraryBuildUp: fc.Arbitrary<BuildUp> = fc.record({
  materials: fc.array(
    fc.record({
      resource: fc.constantFrom(...MATERIALS),
      quantity: amount(1, 40_000_000),
      wastePercent: percent,
      uses: fc.integer({ min: 1, max: 200 }),
      isBlock: fc.boolean(),
      source: fc.constant(''),
    }),
    { minLength: 1, maxLength: 3 },
  ),
  labour: fc.array(
    fc.record({
      gang: fc.constantFrom('g1', 'g2'),
      basis: fc.constantFrom('hours' as const, 'output' as const),
      value: amount(1000, 40_000_000),
      source: fc.constant(''),
    }),
    { maxLength: 3 },
  ),
  plant: fc.array(
    fc.record({
      resource: fc.constant('p1'),
      fuel: fc.option(fc.record({ resource: fc.constantFrom(...MATERIALS), perHour: amount(1, 20_000_000) }), { nil: null }),
      outputPerHour: amount(1000, 40_000_000),
      source: fc.constant(''),
    }),
    { maxLength: 3 },
  ),
  overheadsPercent: percent,
  profitPercent: percent,
})
