import { describe, expect, it } from 'vitest'
import { formatDecimal } from '../../../src/components/base/formatDecimal'
import { formatQuantity } from '../../../src/components/base/formatQuantity'

describe('formatDecimal', () => {
  it.each([
    ['80030.08', {}, '80,030.08'],
    ['-4104.59', {}, '−4,104.59'],
    ['149.625', { decimals: 2 }, '149.63'],
    ['-0.005', { decimals: 2 }, '−0.01'],
    ['-0.004', { decimals: 2 }, '0.00'],
    ['999.995', { decimals: 2 }, '1,000.00'],
    ['12', { decimals: 2, isSigned: true }, '+12.00'],
    ['0', { isSigned: true }, '0'],
    ['9007199254740993.01', { decimals: 1 }, '9,007,199,254,740,993.0'],
    ['0.5', { decimals: 0 }, '1'],
  ])('writes %s with %o as %s', (text, format, expected) => {
    expect(formatDecimal(text, format)).toBe(expected)
  })
})

describe('formatQuantity', () => {
  it('writes a dash where there is no figure', () => {
    expect([formatQuantity(null), formatQuantity(undefined), formatQuantity(Number.NaN)]).toEqual(['–', '–', '–'])
  })

  it('groups thousands and keeps what a length has', () => {
    expect(formatQuantity(25800)).toBe('25,800')
    expect(formatQuantity(0.1 + 0.2)).toBe('0.3')
  })
})
