import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { FloorLoads } from '#shared/sizing/actions'
import { elasticForces } from '#shared/sizing/analysis/elasticForces'
import { greatestSagging, momentAt, shearAt } from '#shared/sizing/analysis/continuousBeam'
import { analysisRulesOf } from '../support/analysisRulesOf'
import { stiffnessMoments } from '../support/directStiffness'

const rules = analysisRulesOf()
const loadsOf = (permanent: number, variable: number): FloorLoads => ({
  permanentKnPerM2: permanent,
  variableKnPerM2: variable,
  imposedKnPerM2: variable,
  partitionsKnPerM2: 0,
})

describe('elasticForces', () => {
  it('gives two equal spans under pattern loading the moments worked by hand', () => {
    const span = { spanMm: 5000, loads: loadsOf(4, 3), bayMm2: 0 }
    const forces = elasticForces([span, span], 0, rules)
    // Both loaded: w = 1.35·4 + 1.5·3 = 9.9; support w·l²/8 = 9.9·25/8 = 30.94 kNm.
    expect(forces.hoggingNmm('end', 0) / 1e6).toBeCloseTo(30.9375, 4)
    // This span loaded, the other at 5.4: support (9.9 + 5.4)·25/16 = 23.91; R = 9.9·2.5 − 23.91/5 = 19.97; sagging R²/(2·9.9) = 20.14.
    expect(forces.saggingNmm / 1e6).toBeCloseTo(19.96875 ** 2 / (2 * 9.9), 4)
    // Shear at the inner support, both loaded: 5/8·9.9·5 = 30.94 kN.
    expect(forces.shearN('end', 0) / 1e3).toBeCloseTo(30.9375, 4)
    // Shear at the outer support, this span loaded alone.
    expect(forces.shearN('start', 0) / 1e3).toBeCloseTo(19.96875, 4)
  })

  it('is the envelope of every pattern there is, by another solver', () => {
    const span = fc.tuple(
      fc.integer({ min: 2000, max: 9000 }),
      fc.double({ min: 2, max: 8, noNaN: true }),
      fc.double({ min: 0, max: 8, noNaN: true }),
    )
    fc.assert(
      fc.property(fc.array(span, { minLength: 2, maxLength: 5 }), fc.nat(), (spans, pick) => {
        const index = pick % spans.length
        const beam = spans.map(([spanMm, permanent, variable]) => ({ spanMm, loads: loadsOf(permanent, variable), bayMm2: 0 }))
        const forces = elasticForces(beam, index, rules)
        const length = spans[index]![0]
        const cases = Array.from({ length: 2 ** spans.length }, (_, bits) => {
          const loads = spans.map(([, permanent, variable], i) => 1.35 * permanent + ((bits >> i) & 1 ? 1.5 * variable : 0))
          const moments = stiffnessMoments(
            spans.map(([each]) => each),
            loads,
          )
          return { load: loads[index]!, startMoment: moments[index]!, endMoment: moments[index + 1]! }
        })
        const most = (effect: (each: (typeof cases)[number]) => number) => Math.max(0, ...cases.map(effect))
        const near = (actual: number, expected: number) => expect(Math.abs(actual - expected)).toBeLessThan(1e-6 * expected + 1)
        near(
          forces.saggingNmm,
          most((each) => greatestSagging(each, length)),
        )
        near(
          forces.hoggingNmm('start', 0),
          most(({ startMoment }) => startMoment),
        )
        near(
          forces.hoggingNmm('end', 0.1 * length),
          most((each) => -momentAt(each, length, 0.9 * length)),
        )
        near(
          forces.shearN('start', 0),
          most((each) => shearAt(each, length, 0)),
        )
        near(
          forces.shearN('end', 0),
          most((each) => -shearAt(each, length, length)),
        )
      }),
      { numRuns: 60 },
    )
  })
})
