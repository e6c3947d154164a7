/**
 * Loads, moments and shears of slabs from worked examples to other codes, as far as they are statics, tables both bases share, or flexure by a
 * rectangular block. What those codes say of steel, shear and spacing is not asserted (see casesCovered.test.ts).
 *
 * S-EC-1: FPP Engineering (blog), "Design of continuous one-way spanning RC slab: worked example", undated, three 6 m spans; seen in text.
 *   It counts the whole floor of 72 m² as the bay; the engine counts one row of panels between lines of supports.
 * S-EB-1: "Analysis & Design of Floor Slab", student assignment, Ethiopia, author not named, panel S-1; seen in text. Only its flexure is
 *   sound: a rectangular block of fcd 13.6 and fyd 347.826, lever arm without a cap. Its moments rest on coefficients of EBCS 2.
 * S-IS-1, S-IS-2, S-IS-3, T-IS-1: textbook behind FOSSEE Scilab companion 3683, Examples 19.1, 19.3, 19.5, 19.8; seen in text, values
 *   evaluated from its scripts. IS 456 Table 27 prints the coefficients of BS 8110 Table 3.13.
 * S-IS-7: "Design of Slab", calculation sheet, author not named, undated; seen in text. Its total of 5.15 kN/m² takes a dead load of 3.15 for
 *   3.125.
 * R-ACI-1: "13 One Way Ribbed Slab", university lecture, Lebanon, author not named, undated; seen in text.
 * R-ECP-1: Mohamed Mansour, "Examples on Hollow Block Slab", Zagazig University, undated, first example; seen in text.
 */
import { describe, expect, it } from 'vitest'
import { type FloorLoads, selfWeightKnPerM2, ultimateLoad } from '#shared/sizing/actions'
import { coefficientForces, coefficientsApply } from '#shared/sizing/analysis/coefficientForces'
import { liftedTwoWayForces } from '#shared/sizing/analysis/liftedTwoWayForces'
import { simpleSpanForces } from '#shared/sizing/analysis/spanForces'
import { bs8110Basis } from '#shared/sizing/bs8110/bs8110Basis'
import type { LoadFactors } from '#shared/sizing/codeBasis'
import { en1992Basis } from '#shared/sizing/en1992/en1992Basis'
import { layerAreaMm2 } from '#shared/sizing/solid/bars/slabLayer'
import { layerDepthMm, type SlabContext } from '#shared/sizing/solid/slabContext'
import { flexureByBlock } from '#shared/sizing/stressBlock'
import { ONE_WAY_COEFFICIENTS } from '#shared/sizing/tables/oneWayCoefficients'
import { expectPrinted, HALF_PERCENT, ONE_PERCENT } from './support/expectPrinted'

const loadsOf = (permanent: number, variable: number): FloorLoads => ({
  permanentKnPerM2: permanent,
  variableKnPerM2: variable,
  imposedKnPerM2: variable,
  partitionsKnPerM2: 0,
})
const factorsOf = (permanent: number, variable = permanent): LoadFactors => ({
  permanent,
  variable,
  unloaded: permanent,
  clause: 'of the example',
})
const slabKn = (thicknessMm: number) => selfWeightKnPerM2(1e6, thicknessMm, 0, 0)

describe('S-EC-1, three spans of 6 m, 200 thick', () => {
  const { loadFactors } = en1992Basis({ fck: 20, fyk: 500, nationalValues: {} })
  const loads = loadsOf(slabKn(200) + 1, 2.5)
  const spans = [1, 2, 3].map(() => ({ spanMm: 6000, loads, bayMm2: 72e6 }))
  const forces = coefficientForces(spans, 0, loadFactors)

  it('carries 6.0 permanent and 11.85 kN/m² at the ultimate', () => {
    expectPrinted(loads.permanentKnPerM2, 6, HALF_PERCENT)
    expectPrinted(ultimateLoad(loads, loadFactors), 11.85, HALF_PERCENT)
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

describe('S-EB-1, flexure at d 174 with fcd 13.6 and fyd 347.826', () => {
  const block = { strengthMpa: 13.6, strengthSymbol: 'fcd', stressShare: 1, depthShare: 0.8, clause: '' } as const
  const steel = { steelShare: 1, steelMpa: 347.826, steelSymbol: 'fyd', greatestLeverArm: 1, greatestK: 0.3 } as const
  const required = (momentKnm: number) =>
    flexureByBlock({ widthMm: 1000, depthMm: 174, flange: null }, momentKnm * 1e6, { ...block, ...steel }).requiredMm2

  it('carries 15.57 kN/m² at the ultimate', () => {
    expectPrinted(ultimateLoad(loadsOf(8.2, 3), factorsOf(1.35, 1.5)), 15.57, ONE_PERCENT)
  })

  it.each([
    [46.2, 811.1],
    [40.0, 695.7],
    [34.6, 598.4],
    [30.2, 518.5],
  ])('needs for %d kNm/m %d mm²/m', (momentKnm, requiredMm2) => {
    expectPrinted(required(momentKnm), requiredMm2, ONE_PERCENT)
  })

  it('gets them from bars of 12 at 139.4', () => {
    expectPrinted(layerAreaMm2({ diameter: 12, spacing: 139.4 }), 811.1, ONE_PERCENT)
  })
})

describe('S-IS-1 and S-IS-2, one-way simple slabs', () => {
  it.each([
    ['S-IS-1', 125, 1, 2, 4125, 6.125, 9.1875, 19.5414, 18.949],
    ['S-IS-2', 160, 2, 4, 4660, 10, 15, 40.7168, 34.95],
  ])('%s, %d thick: loads, moment and shear', (_id, thickness, added, live, spanMm, total, ultimate, momentKnm, shearKn) => {
    const loads = loadsOf(slabKn(thickness) + added, live)
    const load = ultimateLoad(loads, factorsOf(1.5))
    const forces = simpleSpanForces(load, spanMm)
    expectPrinted(loads.permanentKnPerM2 + loads.variableKnPerM2, total, ONE_PERCENT)
    expectPrinted(load, ultimate, ONE_PERCENT)
    expectPrinted(forces.saggingNmm / 1e6, momentKnm, ONE_PERCENT)
    expectPrinted(forces.shearN('start', 0) / 1e3, shearKn, ONE_PERCENT)
  })
})

describe('S-IS-3, two-way simple slab 3.5 × 4.0 m whose corners may lift, 100 thick', () => {
  const load = ultimateLoad(loadsOf(slabKn(100), 1.5), factorsOf(1.5))
  const { short, long } = liftedTwoWayForces({ load, shortMm: 3500, longMm: 4000 })

  it('carries 6.0 kN/m² at the ultimate and bends with 5.733 and 4.4247 kNm/m', () => {
    expectPrinted(load, 6, ONE_PERCENT)
    expectPrinted(short.saggingNmm / 1e6, 5.733, ONE_PERCENT)
    expectPrinted(long.saggingNmm / 1e6, 4.4247, ONE_PERCENT)
  })
})

describe('S-IS-7, slab 125 thick, 2.875 × 4.0 m clear on supports of 250', () => {
  const slab = { heightMm: 125, brief: { cover: 20 } } as SlabContext
  const depthMm = layerDepthMm(slab, 8, null)
  const basis = bs8110Basis({ fcu: 25, fy: 460, cover: 20, nationalValues: {} })
  const end = { supportMm: 250, isContinuous: false }
  const [shortMm, longMm] = [2875, 4000].map((clearMm) => basis.effectiveSpanMm(clearMm, 125, depthMm, [end, end]))

  it('has d 101 and 93, spans of 2.976 and 4.101 m (clear and d) and an aspect of 1.378', () => {
    expect([depthMm, layerDepthMm(slab, 8, 8)]).toEqual([101, 93])
    expectPrinted(shortMm! / 1000, 2.976, HALF_PERCENT)
    expectPrinted(longMm! / 1000, 4.101, HALF_PERCENT)
    expectPrinted(longMm! / shortMm!, 1.378, HALF_PERCENT)
  })

  it('carries 5.15 and 7.725 kN/m²', () => {
    const loads = loadsOf(slabKn(125) + 0.5, 1.5)
    expectPrinted(loads.permanentKnPerM2 + loads.variableKnPerM2, 5.15, HALF_PERCENT)
    expectPrinted(ultimateLoad(loads, factorsOf(1.5)), 7.725, HALF_PERCENT)
  })
})

describe('T-IS-1, T-beam 600 deep at 2.5 m over 10 m', () => {
  // Flange 2500 × 100 and web 300 × 500 below it: per metre of beam, as a floor of one metre.
  const selfWeight = 2.5 * slabKn(100) + 0.3 * slabKn(500)
  const load = ultimateLoad(loadsOf(selfWeight, 2.5 * 5), factorsOf(1.5))
  const forces = simpleSpanForces(load, 10_000)

  it('carries 22.5 and 33.75 kN/m, bends with 421.875 kNm and shears with 168.75 kN', () => {
    expectPrinted(selfWeight + 12.5, 22.5, ONE_PERCENT)
    expectPrinted(load, 33.75, ONE_PERCENT)
    expectPrinted(forces.saggingNmm / 1e6, 421.875, ONE_PERCENT)
    expectPrinted(forces.shearN('start', 0) / 1e3, 168.75, ONE_PERCENT)
  })
})

describe('R-ACI-1, joists at 570, ultimate load', () => {
  it('carries 14.88 kN/m² and 8.48 kN/m of rib at the ultimate', () => {
    const load = ultimateLoad(loadsOf(4.068 + 5, 2.5), factorsOf(1.2, 1.6))
    expectPrinted(load, 14.88, HALF_PERCENT)
    expectPrinted(load * 0.57, 8.48, HALF_PERCENT)
  })
})

describe('R-ECP-1, hollow blocks 400 × 200 × 250, loads', () => {
  it.each([
    ['one way, 10 blocks to the square metre', 10, 4.1, 5.6, 12.15],
    ['two ways, 8 blocks to the square metre', 8, 4.78, 6.28, 13.17],
  ])('%s', (_name, blocks, selfWeight, dead, ultimate) => {
    const own = selfWeightKnPerM2(1e6, 300, blocks * 400 * 200 * 250, (blocks * 160) / 9.81)
    expectPrinted(own, selfWeight, HALF_PERCENT)
    expectPrinted(own + 1.5, dead, HALF_PERCENT)
    expectPrinted(ultimateLoad(loadsOf(own + 1.5, 2.5), factorsOf(1.5)), ultimate, HALF_PERCENT)
  })

  it('brings 6.08 kN/m to a rib that spans one way', () => {
    expectPrinted(0.5 * ultimateLoad(loadsOf(5.6, 2.5), factorsOf(1.5)), 6.08, HALF_PERCENT)
  })
})
