import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { ledger } from '#shared/comparison/ledger'
import { rates as ratesContract, type Rates } from '#shared/contracts/appraisal'
import { scopeBasis, type ScopeDeclaration, scopeEntry } from '#shared/contracts/sameScope'
import { priceScheme } from '#shared/pricing/priceScheme'
import { scopeLines } from '#shared/pricing/scopeLines'
import { ribbedMeasures, solidMeasures } from '../alsoCompared/sampleMeasures'

const priced = (
  scheme: string,
  entry: ScopeDeclaration['entry'],
  rate: string,
  per: 'grossArea' | 'sum' | 'blocks' | 'steel' | 'concrete',
) => ({ scheme, entry, state: 'priced', rate, per, note: '' }) as const

/** Hundredths of an amount, exactly. */
const cents = (amount: string) => BigInt(amount.replace('.', ''))

describe('lines of declared scope', () => {
  it('are the rate times what is measured, as printed', () => {
    const lines = scopeLines(
      [
        priced('R1', 'ceiling', '7.25', 'grossArea'),
        priced('R1', 'ribbedConcrete', '9.8', 'concrete'),
        priced('R1', 'groutLost', '0.06', 'blocks'),
        priced('R1', 'tiesChairsLinks', '31', 'steel'),
        priced('R1', 'hoisting', '1200', 'sum'),
      ],
      'R1',
      ribbedMeasures(),
      'USD',
    )
    expect(lines.map(({ item, quantity, unit, amount }) => [item, quantity, unit, amount])).toEqual([
      ['scope.ceiling', '125.00', 'm²', '906.25'],
      ['scope.ribbedConcrete', '10.00', 'm³', '98.00'],
      ['scope.groutLost', '500', 'nr', '30.00'],
      ['scope.tiesChairsLinks', '0.822', 't', '25.48'],
      ['scope.hoisting', '1', 'sum', '1200.00'],
    ])
  })

  it('are those of the scheme, and of what it prices', () => {
    const declarations: ScopeDeclaration[] = [
      priced('S1', 'ceiling', '4', 'grossArea'),
      { scheme: 'R1', entry: 'ceiling', state: 'inRates', note: '' },
      { scheme: 'R1', entry: 'deck', state: 'leftOut', note: 'full deck' },
    ]
    expect(scopeLines(declarations, 'R1', ribbedMeasures(), 'USD')).toEqual([])
  })

  const rate = fc.integer({ min: 1, max: 1_000_000 }).map((hundredths) => (hundredths / 100).toFixed(2))
  const declared = (scheme: string) =>
    fc
      .uniqueArray(
        fc.record({ entry: fc.constantFrom(...scopeEntry.options), rate, per: fc.constantFrom(...scopeBasis.options) }),
        {
          selector: ({ entry }) => entry,
          maxLength: 13,
        },
      )
      .map((list) => list.map(({ entry, rate: each, per }) => priced(scheme, entry, each, per)))
  const percent = fc.integer({ min: 0, max: 3000 }).map((hundredths) => (hundredths / 100).toFixed(2))

  it('add up to the cent with their markups, in each bill and in the ledger', () => {
    fc.assert(
      fc.property(declared('R1'), declared('S1'), percent, percent, (ribbed, solid, preliminaries, tax) => {
        const markups = { preliminariesPercent: preliminaries, contingencyPercent: '5', taxPercent: tax }
        const rates: Rates = ratesContract.parse({ currency: 'USD', items: {}, markups })
        const scope = [...ribbed, ...solid]
        const first = priceScheme([], rates, 125, scopeLines(scope, 'R1', ribbedMeasures(), 'USD'))
        const second = priceScheme([], rates, 125, scopeLines(scope, 'S1', solidMeasures(), 'USD'))
        for (const { lines, markups: charged, total } of [first, second]) {
          const sum = [...lines, ...charged].reduce((all, { amount }) => all + cents(amount), 0n)
          expect(cents(total)).toBe(sum)
        }
        const running = ledger(first, second).at(-1)?.running ?? '0.00'
        expect(cents(running)).toBe(cents(first.total) - cents(second.total))
      }),
    )
  })
})
