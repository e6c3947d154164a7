import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { greatestSagging, momentAt, shearAt, supportMoments } from '#shared/sizing/analysis/continuousBeam'
import { stiffnessMoments } from '../support/directStiffness'

const w = 10
const l = 6

describe('supportMoments', () => {
  it('gives two equal spans w·l²/8', () => {
    expect(supportMoments([l, l], [w, w])[1]).toBeCloseTo((w * l ** 2) / 8, 10)
  })

  it('gives three equal spans w·l²/10 twice', () => {
    const [, first, second] = supportMoments([l, l, l], [w, w, w])
    expect(first).toBeCloseTo((w * l ** 2) / 10, 10)
    expect(second).toBeCloseTo((w * l ** 2) / 10, 10)
  })

  it('gives four equal spans 3/28, 2/28, 3/28 of w·l²', () => {
    const moments = supportMoments([l, l, l, l], [w, w, w, w])
    const expected = [0, 3, 2, 3, 0].map((share) => (share * w * l ** 2) / 28)
    moments.forEach((moment, i) => expect(moment).toBeCloseTo(expected[i]!, 10))
  })

  it('gives two equal spans with one loaded w·l²/16', () => {
    expect(supportMoments([l, l], [w, 0])[1]).toBeCloseTo((w * l ** 2) / 16, 10)
  })

  it.each([
    // Printed in tables of continuous beams to three decimals (from memory): five equal spans 0.105 and 0.079.
    [5, [0.105, 0.079, 0.079, 0.105]],
    [4, [0.107, 0.071, 0.107]],
    [3, [0.1, 0.1]],
  ])('rounds to the printed coefficients of %i equal spans', (count, printed) => {
    const moments = supportMoments(new Array<number>(count).fill(l), new Array<number>(count).fill(w)).slice(1, -1)
    expect(moments.map((moment) => Math.round((1000 * moment) / (w * l ** 2)) / 1000)).toEqual(printed)
  })

  it('takes the moment of an overhang, w·a²/2, on into the spans: −1/4 of it over the next support of two', () => {
    const moment = (w * 2 ** 2) / 2
    const [first, second, last] = supportMoments([l, l], [0, 0], [moment, 0])
    expect(first).toBe(moment)
    expect(second).toBeCloseTo(-moment / 4, 10)
    expect(last).toBe(0)
  })

  it('comes to the propped cantilever, w·l²/8, beside a span of no length', () => {
    expect(supportMoments([l, 1e-9], [w, 0])[1]).toBeCloseTo((w * l ** 2) / 8, 6)
  })

  it('agrees with a direct stiffness solution for any spans and loads', () => {
    const span = fc.double({ min: 1, max: 12, noNaN: true })
    const load = fc.double({ min: 0, max: 50, noNaN: true })
    fc.assert(
      fc.property(fc.array(fc.tuple(span, load), { minLength: 1, maxLength: 9 }), (beam) => {
        const [spans, loads] = [beam.map(([length]) => length), beam.map(([, each]) => each)]
        const expected = stiffnessMoments(spans, loads)
        supportMoments(spans, loads).forEach((moment, i) => expect(moment).toBeCloseTo(expected[i]!, 6))
      }),
    )
  })

  it('agrees with it under moments at the outer supports', () => {
    const span = fc.double({ min: 1, max: 12, noNaN: true })
    const load = fc.double({ min: 0, max: 50, noNaN: true })
    fc.assert(
      fc.property(fc.array(fc.tuple(span, load), { minLength: 1, maxLength: 7 }), load, load, (beam, first, last) => {
        const [spans, loads] = [beam.map(([length]) => length), beam.map(([, each]) => each)]
        const expected = stiffnessMoments(spans, loads, [first, last])
        supportMoments(spans, loads, [first, last]).forEach((moment, i) => expect(moment).toBeCloseTo(expected[i]!, 6))
      }),
    )
  })
})

describe('forces within a span', () => {
  it('are exactly w·l²/8 and w·l/2 between simple ends', () => {
    const simple = { load: w, startMoment: 0, endMoment: 0 }
    expect(greatestSagging(simple, l)).toBe((w * l * l) / 8)
    expect(shearAt(simple, l, 0)).toBe((w * l) / 2)
  })

  it('are 9·w·l²/128 at 3/8 of the span and 5/8·w·l in the propped cantilever', () => {
    const propped = { load: w, startMoment: 0, endMoment: (w * l ** 2) / 8 }
    expect(greatestSagging(propped, l)).toBeCloseTo((9 * w * l ** 2) / 128, 10)
    expect(momentAt(propped, l, (3 / 8) * l)).toBeCloseTo((9 * w * l ** 2) / 128, 10)
    expect(-shearAt(propped, l, l)).toBeCloseTo((5 / 8) * w * l, 10)
  })
})
