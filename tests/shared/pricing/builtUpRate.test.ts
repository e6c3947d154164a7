import { describe, expect, it } from 'vitest'
import { buildUp as buildUpContract } from '#shared/contracts/buildUp'
import type { ThreePrices } from '#shared/contracts/resource'
import { builtUpRate } from '#shared/pricing/builtUpRate'
import { BuildUpRefusedError } from '#shared/pricing/buildUpRefused'
import type { BuildUpPrices, PricedResource } from '#shared/pricing/buildUpPrices'
import { withBlockResource } from '#shared/pricing/withBlockResource'

// Output figures: /references/trade.md "Rates"; the prices are invented and round, so that the arithmetic can be read.
const resource = (kind: PricedResource['kind'], unit: string, low: string, likely: string, high: string) =>
  ({ kind, unit, description: `${kind} by ${unit}`, price: { low, likely, high } }) satisfies PricedResource
const PRICES: BuildUpPrices = {
  resources: new Map<string, PricedResource>([
    ['bar', resource('material', 't', '800', '900', '1000')],
    ['wire', resource('material', 'kg', '1.5', '2', '2.5')],
    ['mesh', resource('material', 'm²', '2', '2.5', '3')],
    ['block', resource('material', 'nr', '0.7', '0.8', '0.9')],
    ['block.big', resource('material', 'nr', '1', '1.2', '1.4')],
    ['ply', resource('material', 'm²', '9', '12', '15')],
    ['mix', resource('material', 'm³', '90', '100', '110')],
    ['diesel', resource('material', 'l', '1', '1.25', '1.5')],
    ['fixer', resource('labour', 'h', '6', '7', '8')],
    ['mason', resource('labour', 'h', '5', '6', '7')],
    ['helper', resource('labour', 'h', '3', '4', '5')],
    ['pump', resource('plant', 'h', '50', '60', '70')],
  ]),
  gangs: new Map([
    ['one fixer', { description: 'One steel fixer', members: [{ resource: 'fixer', count: '1' }] }],
    ['one helper', { description: 'One helper', members: [{ resource: 'helper', count: '1' }] }],
    [
      'layers',
      {
        description: 'Two masons, one helper',
        members: [
          { resource: 'mason', count: '2' },
          { resource: 'helper', count: '1' },
        ],
      },
    ],
  ]),
}
const rateOf = (asked: object, currency = 'USD') =>
  builtUpRate(buildUpContract.parse({ materials: [], labour: [], plant: [], ...asked }), PRICES, currency)
const likelyOf = (asked: object, currency?: string) => rateOf(asked, currency).price.likely
const refusal = (asked: object) => {
  try {
    rateOf(asked)
  } catch (error) {
    if (error instanceof BuildUpRefusedError) return error.issues
    throw error
  }
  throw new Error('expected a refusal')
}
const threeOf = ({ low, likely, high }: ThreePrices) => [low, likely, high]

describe('rates by the outputs of the trade', () => {
  it('fixes a tonne of 12 mm bars in 1000 / 14 hours of a steel fixer, at 14 kg an hour', () => {
    const built = rateOf({ labour: [{ gang: 'one fixer', basis: 'output', value: '0.014' }] })
    // 1000 / 14 = 71.428571… h; × 6, 7, 8 = 428.571…, 500, 571.428…
    expect(threeOf(built.price)).toEqual(['428.57', '500.00', '571.43'])
    expect(built.lines[0]!.expression).toBe('(1 × 7) ÷ 0.014 an hour')
  })

  it('adds 10 kg of tying wire and 2 % of waste to the tonne', () => {
    const built = rateOf({
      materials: [
        { resource: 'bar', quantity: '1', wastePercent: '2' },
        { resource: 'wire', quantity: '10' },
      ],
      labour: [{ gang: 'one fixer', basis: 'output', value: '0.014' }],
    })
    // 900 × 1.02 = 918; 10 × 2 = 20; 500: 1438
    expect(built.lines.map(({ likely }) => likely)).toEqual(['918.0000', '20.0000', '500.0000'])
    expect(built.price.likely).toBe('1438.00')
    expect(built.lines[0]!.expression).toBe('1 t × 900 × (1 + 2 %)')
  })

  it.each([
    ['0.05', '3.40'], // 2.5 × 1.22 = 3.05; 7 × 0.05 = 0.35
    ['0.10', '3.75'], // 3.05 + 0.70
  ])('lays a square metre of mesh with laps of 22 %% in %s hours for %s', (hours, price) => {
    const materials = [{ resource: 'mesh', quantity: '1', wastePercent: '22' }]
    expect(likelyOf({ materials, labour: [{ gang: 'one fixer', basis: 'hours', value: hours }] })).toBe(price)
  })

  it.each([
    ['25', '0.99'], // 0.8 × 1.04 = 0.832; 4 / 25 = 0.16: 0.992
    ['40', '0.93'], // 0.832 + 4 / 40 = 0.932
  ])('lays %s blocks in a man-hour for %s each, with 4 %% broken', (output, price) => {
    const materials = [{ resource: 'block', quantity: '1', wastePercent: '4', isBlock: true }]
    expect(likelyOf({ materials, labour: [{ gang: 'one helper', basis: 'output', value: output }] })).toBe(price)
  })

  it.each([
    [5, '2.64'], // 12 × 1.1 / 5
    [8, '1.65'], // 12 × 1.1 / 8
    [1, '13.20'],
  ])('spreads a sheet of formwork over %d uses: %s', (uses, price) => {
    const built = rateOf({ materials: [{ resource: 'ply', quantity: '1', wastePercent: '10', uses }] })
    expect(built.price.likely).toBe(price)
    expect(built.lines[0]!.expression).toBe(`1 m² × 12 × (1 + 10 %)${uses === 1 ? '' : ` ÷ ${uses} uses`}`)
  })

  it('mixes and places a cubic metre of concrete on site in 29 man-hours', () => {
    const materials = [{ resource: 'mix', quantity: '1', wastePercent: '5' }]
    // 100 × 1.05 + 29 × 4 = 221
    expect(likelyOf({ materials, labour: [{ gang: 'one helper', basis: 'hours', value: '29' }] })).toBe('221.00')
  })

  it('pumps 12 to 25 m³ an hour with the fuel that the pump burns', () => {
    const pumped = (outputPerHour: string) =>
      rateOf({ plant: [{ resource: 'pump', fuel: { resource: 'diesel', perHour: '8' }, outputPerHour }] })
    // (60 + 8 × 1.25) / 12 = 5.8333; / 25 = 2.8
    expect(pumped('12').price).toEqual({ low: '4.83', likely: '5.83', high: '6.83' })
    expect(pumped('25').price.likely).toBe('2.80')
    expect(pumped('12').lines[0]!.expression).toBe('(60 + 8 l × 1.25) ÷ 12 an hour')
  })
})

describe('a built-up rate', () => {
  it('takes overheads on the net and profit on both, and is rounded once', () => {
    const built = rateOf({
      materials: [{ resource: 'mix', quantity: '1' }],
      overheadsPercent: '8',
      profitPercent: '5',
    })
    expect(built.net.likely).toBe('100.0000')
    expect(built.overheads.likely).toBe('8.0000')
    expect(built.profit.likely).toBe('5.4000')
    expect(threeOf(built.price)).toEqual(['102.06', '113.40', '124.74']) // 90, 100, 110 × 1.08 × 1.05
  })

  it('costs a gang by its members', () => {
    const built = rateOf({ labour: [{ gang: 'layers', basis: 'hours', value: '0.5' }] })
    expect(threeOf(built.price)).toEqual(['6.50', '8.00', '9.50']) // 2 × 5 + 3 = 13; 16; 19; halved
    expect(built.lines[0]).toMatchObject({ kind: 'labour', code: 'layers', name: 'Two masons, one helper' })
    expect(built.lines[0]!.expression).toBe('(2 × 6 + 1 × 4) × 0.5 h')
  })

  it('rounds to the minor unit of its currency', () => {
    const asked = { labour: [{ gang: 'one fixer', basis: 'output', value: '0.016' }] }
    expect(likelyOf(asked, 'USD')).toBe('437.50')
    expect(likelyOf(asked, 'JPY')).toBe('438')
    expect(likelyOf(asked, 'KWD')).toBe('437.500')
  })

  it('rounds what adds up to half a cent up, though no part can be written out', () => {
    // three lines of 0.005 / 3: 0.001666… each
    const third = { resource: 'cheap', quantity: '1', uses: 3 }
    const prices = { ...PRICES, resources: new Map([['cheap', resource('material', 'kg', '0.005', '0.005', '0.005')]]) }
    const asked = buildUpContract.parse({ materials: [third, third, third], labour: [], plant: [] })
    expect(builtUpRate(asked, prices, 'USD').price.likely).toBe('0.01')
  })

  it('takes the block of a scheme in place of its own where a line says so', () => {
    const asked = buildUpContract.parse({
      materials: [
        { resource: 'block', quantity: '1', isBlock: true },
        { resource: 'wire', quantity: '0.1' },
      ],
      labour: [],
      plant: [],
    })
    expect(builtUpRate(asked, PRICES, 'USD').price.likely).toBe('1.00')
    expect(builtUpRate(withBlockResource(asked, 'block.big'), PRICES, 'USD').price.likely).toBe('1.40')
    expect(asked.materials[0]!.resource).toBe('block')
  })
})

describe('a build-up that makes no rate', () => {
  it('names every line at fault and what was expected there', () => {
    const issues = refusal({
      materials: [
        { resource: 'bar', quantity: '1' },
        { resource: 'gold', quantity: '1' },
        { resource: 'fixer', quantity: '1' },
      ],
      labour: [{ gang: 'fixer', basis: 'hours', value: '1' }],
      plant: [{ resource: 'diesel', fuel: { resource: 'pump', perHour: '1' }, outputPerHour: '1' }],
    })
    expect(issues).toEqual([
      { path: 'materials.1.resource', message: 'expected the code of a material, got "gold": the edition has no such resource' },
      { path: 'materials.2.resource', message: 'expected the code of a material, got "fixer": it is labour' },
      { path: 'labour.0.gang', message: 'expected the code of a gang, got "fixer": the edition has no such gang' },
      { path: 'plant.0.resource', message: 'expected the code of a plant resource, got "diesel": it is a material' },
      { path: 'plant.0.fuel.resource', message: 'expected the code of a material, got "pump": it is plant' },
    ])
  })

  it('is one whose gang has somebody who is no labour resource', () => {
    const gangs = new Map([['odd', { description: 'Odd', members: [{ resource: 'bar', count: '1' }] }]])
    const asked = buildUpContract.parse({
      materials: [],
      labour: [{ gang: 'odd', basis: 'hours', value: '1' }],
      plant: [],
    })
    expect(() => builtUpRate(asked, { ...PRICES, gangs }, 'USD')).toThrow('labour.0.gang: expected the code of a labour resource')
  })

  it('is one too large for a book', () => {
    expect(refusal({ materials: [{ resource: 'bar', quantity: '1000000' }] })).toEqual([
      { path: '', message: 'expected a rate below 1,000,000,000' },
    ])
  })

  it.each([
    ['no line', {}],
    ['an output of nothing', { labour: [{ gang: 'layers', basis: 'output', value: '0' }] }],
    ['no uses', { materials: [{ resource: 'ply', quantity: '1', uses: 0 }] }],
  ])('is refused by its contract: %s', (_what, asked) => {
    expect(buildUpContract.safeParse({ materials: [], labour: [], plant: [], ...asked }).success).toBe(false)
  })
})
