import Big from 'big.js'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { Decimal } from '#shared/pricing/decimal'
import { minorUnit } from '#shared/pricing/minorUnit'
import { printMoney } from '#shared/pricing/money'
import { toQuantity } from '#shared/pricing/toQuantity'

describe('money', () => {
  it.each([
    ['1.005', 'USD', '1.01'],
    ['-1.005', 'USD', '-1.01'],
    ['2.5', 'JPY', '3'],
    ['-2.5', 'JPY', '-3'],
    ['0.0005', 'KWD', '0.001'],
    ['0.004', 'USD', '0.00'],
    ['-0.004', 'USD', '0.00'],
    ['1e21', 'USD', '1000000000000000000000.00'],
  ])('prints %s %s as %s', (amount, currency, printed) => {
    expect(printMoney(new Decimal(amount), currency)).toBe(printed)
  })

  it('knows currencies without a minor unit and those of three decimals', () => {
    expect(['USD', 'EUR', 'UGX', 'XOF', 'TND', 'CLF'].map(minorUnit)).toEqual([2, 2, 0, 0, 3, 4])
  })

  it('rounds as a second decimal library does, halves away from zero', () => {
    fc.assert(
      fc.property(fc.bigInt({ min: -(10n ** 18n), max: 10n ** 18n }), fc.integer({ min: 0, max: 8 }), (digits, places) => {
        const text = new Big(digits.toString()).div(new Big(10).pow(places)).toFixed(places)
        for (const currency of ['JPY', 'USD', 'KWD']) {
          const expected = new Big(text).round(minorUnit(currency), Big.roundHalfUp)
          expect(new Big(printMoney(new Decimal(text), currency)).eq(expected)).toBe(true)
        }
      }),
      { numRuns: 2000 },
    )
  })

  it('does not lose a digit of long products', () => {
    const product = new Decimal('123456789.123456').times('987654321.654321').toFixed()
    expect(product).toBe(new Big('123456789.123456').times('987654321.654321').toFixed())
  })
})

describe('toQuantity', () => {
  it.each([
    [2.675, 2, '2.68'],
    [1.005, 2, '1.01'],
    [33.8999999999999986, 2, '33.90'],
    [-2.675, 2, '-2.68'],
    [0.0004999, 3, '0.000'],
    [1754, 0, '1754'],
    [1234567890123457, 0, '1234567890123457'],
    [0.5, 0, '1'],
    [123456789.125, 2, '123456789.13'],
  ])('prints %d to %d decimals as %s', (value, decimals, printed) => {
    expect(toQuantity(value, decimals)).toBe(printed)
  })

  it('leaves what is already printed as it is', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 1_000_000_000 }), fc.integer({ min: 0, max: 3 }), (steps, decimals) => {
        const printed = toQuantity(steps / 10 ** decimals, decimals)
        expect(toQuantity(Number(printed), decimals)).toBe(printed)
        expect(printed).toBe(new Big(steps).div(new Big(10).pow(decimals)).toFixed(decimals))
      }),
    )
  })
})
