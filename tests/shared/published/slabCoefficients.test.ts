/**
 * Moments and shears of slabs by the coefficients of BS 8110-1:1997, Tables 3.12 and 3.14.
 *
 * S-EC-1: "Design of continuous one-way spanning RC slab: worked example", author and date not given, three 6 m spans (seen in text).
 *   It counts the whole floor of 72 m² as the bay; the engine counts one row of panels between lines of supports.
 * S-BS-1: "Basic Structural Element Design to BS 8110-1:1997: Two Way Design Slab", undated, panel A/B-1/2 (seen in text). Its load of
 *   9.26 kN/m² is inferred, and it reads the 1.34 sagging coefficient as 0.053.
 * R-BS-1: "Hollow pot design", undated, whole sheet (seen in text).
 * R-BS-4M: "Reinforced Concrete: Design Theory and Examples", 2nd edition, 1990, Example 8.2: from memory.
 * R-ECP-1: Mohamed Mansour, "Examples on Hollow Block Slab", Zagazig University, undated, first example (seen in text).
 */
import { describe, expect, it } from 'vitest'
import { type FloorLoads, selfWeightKnPerM2, ultimateLoad } from '#shared/sizing/actions'
import { coefficientForces, coefficientsApply } from '#shared/sizing/analysis/coefficientForces'
import { simpleSpanForces } from '#shared/sizing/analysis/spanForces'
import { twoWayForces } from '#shared/sizing/analysis/twoWayForces'
import { ONE_WAY_COEFFICIENTS } from '#shared/sizing/tables/oneWayCoefficients'

/** The tolerances of the case sheet. */
const HALF_PERCENT = 0.005
const TWO_PERCENT = 0.02
const TWO_AND_A_HALF_PERCENT = 0.025

function expectPrinted(actual: number, printed: number, relative: number) {
  expect(Math.abs(actual - printed), `${actual} against ${printed} as printed`).toBeLessThanOrEqual(relative * printed)
}

const loadsOf = (permanent: number, variable: number): FloorLoads => ({
  permanentKnPerM2: permanent,
  variableKnPerM2: variable,
  imposedKnPerM2: variable,
  partitionsKnPerM2: 0,
})
const european = { permanent: 1.35, variable: 1.5, unloaded: 1.35, clause: 'EN 1990 6.10' }
const british = { permanent: 1.4, variable: 1.6, unloaded: 1, clause: 'BS 8110-1 2.4.3' }

describe('S-EC-1, three spans of 6 m, 200 thick', () => {
  const loads = loadsOf(selfWeightKnPerM2(1e6, 200, 0, 0) + 1, 2.5)
  const spans = [1, 2, 3].map(() => ({ spanMm: 6000, loads, bayMm2: 72e6 }))
  const forces = coefficientForces(spans, 0, european)

  it('carries 6.0 permanent and 11.85 kN/m² at the ultimate', () => {
    expectPrinted(loads.permanentKnPerM2, 6, HALF_PERCENT)
    expectPrinted(ultimateLoad(loads, european), 11.85, HALF_PERCENT)
    expect(coefficientsApply(spans)).toBe(true)
  })

  it('has 36.7 kNm/m and 42.7 kN/m at the first interior support', () => {
    expectPrinted(forces.hoggingNmm('end', 0) / 1e6, 36.7, HALF_PERCENT)
    expectPrinted(forces.shearN('end', 0) / 1e3, 42.7, HALF_PERCENT)
  })

  it('has 17.06 kNm/m and 32.7 kN/m at a continuous outer support', () => {
    const load = 11.85 * 6
    expectPrinted(ONE_WAY_COEFFICIENTS.continuousOuter.outerSupportMoment * load * 6, 17.06, HALF_PERCENT)
    expectPrinted(ONE_WAY_COEFFICIENTS.continuousOuter.outerSupportShear * load, 32.7, HALF_PERCENT)
  })
})

describe('S-BS-1, two adjacent edges discontinuous, 5.57 × 7.47 m', () => {
  const { panelCase, aspect, short, long } = twoWayForces({
    load: 1.4 * 4.9 + 1.6 * 1.5,
    shortMm: 5570,
    longMm: 7470,
    shortEnds: [true, false],
    longEnds: [false, true],
  })

  it('is panel 4 at 1.34', () => {
    expect(panelCase).toBe(4)
    expectPrinted(aspect, 1.34, TWO_AND_A_HALF_PERCENT)
  })

  it('has moments of 20.43, 15.23, 12.93 and 9.77 kNm/m', () => {
    expectPrinted(short.hoggingNmm[0] / 1e6, 20.43, TWO_AND_A_HALF_PERCENT)
    expectPrinted(short.saggingNmm / 1e6, 15.23, TWO_AND_A_HALF_PERCENT)
    expectPrinted(long.hoggingNmm[1] / 1e6, 12.93, TWO_AND_A_HALF_PERCENT)
    expectPrinted(long.saggingNmm / 1e6, 9.77, TWO_AND_A_HALF_PERCENT)
  })

  it('has none over its discontinuous edges', () => {
    expect([short.hoggingNmm[1], long.hoggingNmm[0]]).toEqual([0, 0])
  })
})

describe('R-BS-1, simple span of 5 m under 6.26 kN/m', () => {
  it('has a moment of 19.56 kNm a rib', () => {
    expectPrinted(simpleSpanForces(1.4 * 3.04 + 1.6 * 1.25, 5000).saggingNmm / 1e6, 19.56, TWO_PERCENT)
  })
})

describe('R-BS-4M, four spans of 6 m, ribs at 450, from memory', () => {
  const span = { spanMm: 6000, loads: loadsOf(4.5, 2.5), bayMm2: 36e6 }
  const forces = coefficientForces([span, span, span, span], 0, british)

  it('has 27.81 kN on a span, 14.35 kNm in the end span and 16.69 kN at the first support', () => {
    expectPrinted(ultimateLoad(span.loads, british) * 0.45 * 6, 27.81, HALF_PERCENT)
    expectPrinted((forces.saggingNmm * 0.45) / 1e6, 14.35, HALF_PERCENT)
    expectPrinted((forces.shearN('end', 0) * 0.45) / 1e3, 16.69, HALF_PERCENT)
  })
})

describe('R-ECP-1, blocks 400 × 200 × 250 of 0.16 kN, ribs 100 at 500, topping 50', () => {
  it('weighs 4.10 kN/m² one way, 10 blocks to the square metre', () => {
    const blocksKg = (10 * 160) / 9.81
    expectPrinted(selfWeightKnPerM2(1e6, 300, 10 * 400 * 200 * 250, blocksKg), 4.1, HALF_PERCENT)
  })
})
