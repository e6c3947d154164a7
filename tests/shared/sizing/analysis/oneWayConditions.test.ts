import { describe, expect, it } from 'vitest'
import { coefficientsApply } from '#shared/sizing/analysis/coefficientForces'
import type { StripSpan } from '#shared/sizing/analysis/strip'

/** Conditions for the coefficients of one-way slabs. Source: BS 8110-1:1997, 3.5.2.3. */
const usual = { spanMm: 5000, bayM2: 30, permanent: 5, imposed: 3, partitions: 1 }

function spanOf(changes: Partial<typeof usual> = {}): StripSpan {
  const { spanMm, bayM2, permanent, imposed, partitions } = { ...usual, ...changes }
  return {
    spanMm,
    bayMm2: bayM2 * 1e6,
    loads: {
      permanentKnPerM2: permanent,
      variableKnPerM2: imposed + partitions,
      imposedKnPerM2: imposed,
      partitionsKnPerM2: partitions,
    },
  }
}

const three = (changes: Partial<typeof usual>) => [spanOf(), spanOf(changes), spanOf()]

describe('coefficientsApply', () => {
  it('needs three spans', () => {
    expect(coefficientsApply([spanOf(), spanOf(), spanOf()])).toBe(true)
    expect(coefficientsApply([spanOf(), spanOf()])).toBe(false)
  })

  it.each<[string, Partial<typeof usual>, Partial<typeof usual>]>([
    ['a bay of at least 30 m²', { bayM2: 30 }, { bayM2: 29.999 }],
    ['a variable load of at most 1.25 of the permanent', { permanent: 4, imposed: 4 }, { permanent: 4, imposed: 4.001 }],
    ['an imposed load of at most 5 kN/m², partitions apart', { imposed: 5, partitions: 1.25 }, { imposed: 5.001, partitions: 1 }],
    ['spans of at least 0.85 of the longest', { spanMm: 4250 }, { spanMm: 4249 }],
  ])('needs %s, in every span', (_, within, beyond) => {
    expect(coefficientsApply(three(within))).toBe(true)
    expect(coefficientsApply(three(beyond))).toBe(false)
  })

  it('is not for strips with an overhang', () => {
    expect(coefficientsApply([spanOf(), spanOf(), spanOf(), { ...spanOf(), isCantilever: true }])).toBe(false)
  })
})
