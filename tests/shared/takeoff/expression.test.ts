import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { type Expression, figure, inTonnes, less, plus, timesed, times } from '#shared/takeoff/expression'
import { evaluate } from '../support/evaluate'

describe('expressions', () => {
  it('bracket sums where they are multiplied, divided or taken off', () => {
    const sum = plus(figure(1), figure(2))
    expect(times(sum, figure(3)).text).toBe('(1 + 2) * 3')
    expect(less(figure(9), sum).text).toBe('9 - (1 + 2)')
    expect(inTonnes(sum).text).toBe('(1 + 2) / 1000')
    expect(timesed(sum, 1, 4).text).toBe('(1 + 2) * 4')
    expect(timesed(sum, 1, 1).text).toBe('1 + 2')
  })

  it('print figures without noise, signs or exponents', () => {
    expect(figure(0.1 + 0.2).text).toBe('0.3')
    expect(figure(1e-7).text).toBe('0.0000001')
    expect(figure(123456.789).text).toBe('123456.789')
    expect(() => figure(-1)).toThrow(RangeError)
    expect(() => figure(NaN)).toThrow(RangeError)
  })

  it('always evaluate to their value', () => {
    const number = fc.double({ min: 0.001, max: 1e6, noNaN: true }).map(figure)
    const { tree } = fc.letrec<{ tree: Expression }>((tie) => ({
      tree: fc.oneof(
        { maxDepth: 5 },
        number,
        fc.array(tie('tree'), { minLength: 1, maxLength: 3 }).map((factors) => times(...factors)),
        fc.array(tie('tree'), { minLength: 1, maxLength: 3 }).map((terms) => plus(...terms)),
        tie('tree').map(inTonnes),
      ),
    }))
    fc.assert(
      fc.property(tree, ({ text, value }) => {
        expect(Math.abs(evaluate(text) - value)).toBeLessThanOrEqual(1e-9 * value)
      }),
    )
  })
})

describe('the evaluator of the tests', () => {
  it('reckons as arithmetic does', () => {
    expect(evaluate('(6.35 * 5.15 - 2 * (1 + 0.5) / 4) * 3 - 1 - 1')).toBeCloseTo(93.8575, 9)
  })

  it.each(['-1', '1e3', '2 ** 3', '1 +', '(1', '1 2', 'x', ''])('refuses %j', (text) => {
    expect(() => evaluate(text)).toThrow(SyntaxError)
  })
})
