/**
 * Worked examples by BS 8110-1:1997 and BS 8110 coefficients.
 *
 * R-BS-1: "Hollow pot design", author not named (engineering blog post on a document host, two copies agree), undated, whole sheet; seen in
 *   text. Left out: the loads of topping, rib and screed, which it takes at 24 kN/m³ where the engine has 25. Steel at 0.95 fy; As is cut off
 *   in the copy seen, so that its bars (2 no. 12 mm), its shear (no links) and its deflection (span over 5000 allowed) are asserted.
 * R-BS-4M: MacGinley, T. J. and Choo, B. S., Reinforced Concrete: Design Theory and Examples, 2nd edition, 1990, Example 8.2; from memory.
 * S-BS-1: "Basic Structural Element Design to BS 8110-1:1997: Two Way Design Slab", course calculation sheet, author not named, undated, panel
 *   A/B-1/2; seen in text. Its load of 9.26 kN/m² is inferred, it reads the 1.34 sagging coefficient as 0.053 and cuts K to three decimals.
 *   Left out: its self-weight of 3.9 kN/m², at 24 kN/m³. Steel at 0.95 fy, z ≤ 0.95d.
 */
import { describe, expect, it } from 'vitest'
import { type FloorLoads, ultimateLoad } from '#shared/sizing/actions'
import { coefficientForces } from '#shared/sizing/analysis/coefficientForces'
import { simpleSpanForces } from '#shared/sizing/analysis/spanForces'
import { twoWayForces } from '#shared/sizing/analysis/twoWayForces'
import { bs8110Basis } from '#shared/sizing/bs8110/bs8110Basis'
import { areaOf } from '#shared/sizing/bars/barSet'
import { effectiveDepthMm } from '#shared/sizing/ribbed/ribSection'
import { layerAreaMm2 } from '#shared/sizing/solid/bars/slabLayer'
import { layerDepthMm, type SlabContext } from '#shared/sizing/solid/slabContext'
import { slabZone } from '#shared/sizing/solid/slabLimits'
import { flexureByBlock } from '#shared/sizing/stressBlock'
import { expectPrinted, HALF_PERCENT, TWO_AND_A_HALF_PERCENT, TWO_PERCENT } from './support/expectPrinted'

const basis = bs8110Basis({ fcu: 25, fy: 460, cover: 25, nationalValues: {} })
const loadsOf = (permanent: number, variable: number): FloorLoads => ({
  permanentKnPerM2: permanent,
  variableKnPerM2: variable,
  imposedKnPerM2: variable,
  partitionsKnPerM2: 0,
})

describe('R-BS-1, hollow pots 380 × 230 × 300, ribs 120 at 500, topping 70, simple span of 5 m', () => {
  const rib = {
    clearMm: 380,
    ribMm: 120,
    blockHeightMm: 230,
    toppingMm: 70,
    spacingMm: 500,
    heightMm: 300,
    coverMm: 25,
    linkMm: 0,
  }
  const bars = [{ diameter: 12, count: 2 }] as const
  const load = ultimateLoad(loadsOf(3.04, 1.25), basis.loadFactors)
  const forces = simpleSpanForces(load, 5000)
  const depthMm = effectiveDepthMm(rib, bars)
  const flange = basis.flangeWidthMm('simple', 5000, 120, 380).value
  const section = { widthMm: flange, depthMm, flange: { webMm: 120, thicknessMm: 70 } }
  const bending = basis.flexure(section, forces.saggingNmm, 0)

  it('carries 6.26 kN/m and bends with 19.56 kNm a rib at d 269', () => {
    expectPrinted(load, 6.26, TWO_PERCENT)
    expectPrinted(forces.saggingNmm / 1e6, 19.56, TWO_PERCENT)
    expect(depthMm).toBe(269)
  })

  it('has K 0.022 on a flange of 500, z 262 before the cap and 256 with it', () => {
    expect(flange).toBe(500)
    expectPrinted(bending.k, 0.022, TWO_PERCENT)
    expectPrinted(bending.leverArmMm, 256, TWO_PERCENT)
    // The same block without the cap on the lever arm.
    const block = { strengthMpa: 25, strengthSymbol: 'fcu', stressShare: 0.45, depthShare: 0.9 } as const
    const steel = { steelShare: 0.95, steelMpa: 460, steelSymbol: 'fy', greatestK: 0.156, clause: '' } as const
    const uncapped = flexureByBlock({ ...section, flange: null }, forces.saggingNmm, { ...block, ...steel, greatestLeverArm: 1 })
    expectPrinted(uncapped.leverArmMm, 262, TWO_PERCENT)
  })

  it('is enough with two bars of 12, without links, and within its span to depth', () => {
    const providedMm2 = areaOf(bars)
    expect(bending.requiredMm2).toBeLessThanOrEqual(providedMm2)
    const resistanceN = basis.shearResistanceN({ widthMm: 120, depthMm, steelMm2: providedMm2 }).value
    expect(forces.shearN('start', 0)).toBeLessThanOrEqual(resistanceN)
    const limit = basis.spanDepthLimit({
      position: 'simple',
      spanMm: 5000,
      section,
      momentNmm: forces.saggingNmm,
      requiredMm2: bending.requiredMm2,
      providedMm2,
      carriesPartitions: true,
    })
    expect(limit.value * depthMm).toBeGreaterThan(5000)
  })
})

describe('R-BS-4M, four spans of 6 m, ribs at 450, from memory', () => {
  const span = { spanMm: 6000, loads: loadsOf(4.5, 2.5), bayMm2: 36e6 }
  const forces = coefficientForces([span, span, span, span], 0, basis.loadFactors)

  it('has 27.81 kN on a span, 14.35 kNm in the end span and 16.69 kN at the first support', () => {
    expectPrinted(ultimateLoad(span.loads, basis.loadFactors) * 0.45 * 6, 27.81, HALF_PERCENT)
    expectPrinted((forces.saggingNmm * 0.45) / 1e6, 14.35, HALF_PERCENT)
    expectPrinted((forces.shearN('end', 0) * 0.45) / 1e3, 16.69, HALF_PERCENT)
  })
})

describe('S-BS-1, two adjacent edges discontinuous, 5.57 × 7.47 m, 162.5 thick', () => {
  const { panelCase, aspect, short, long } = twoWayForces({
    load: ultimateLoad(loadsOf(4.9, 1.5), basis.loadFactors),
    shortMm: 5570,
    longMm: 7470,
    shortEnds: [true, false],
    longEnds: [false, true],
  })
  const slab = { heightMm: 162.5, brief: { cover: 25 } } as SlabContext
  const [shortDepthMm, longDepthMm] = [layerDepthMm(slab, 10, null), layerDepthMm(slab, 10, 10)]
  const at = (momentKnm: number, depthMm: number) => basis.flexure({ widthMm: 1000, depthMm, flange: null }, momentKnm * 1e6, 0)

  it('is panel 4 at 1.34', () => {
    expect(panelCase).toBe(4)
    expectPrinted(aspect, 1.34, TWO_AND_A_HALF_PERCENT)
  })

  it('has moments of 20.43, 15.23, 12.93 and 9.77 kNm/m, and none over its discontinuous edges', () => {
    expectPrinted(short.hoggingNmm[0] / 1e6, 20.43, TWO_AND_A_HALF_PERCENT)
    expectPrinted(short.saggingNmm / 1e6, 15.23, TWO_AND_A_HALF_PERCENT)
    expectPrinted(long.hoggingNmm[1] / 1e6, 12.93, TWO_AND_A_HALF_PERCENT)
    expectPrinted(long.saggingNmm / 1e6, 9.77, TWO_AND_A_HALF_PERCENT)
    expect([short.hoggingNmm[1], long.hoggingNmm[0]]).toEqual([0, 0])
  })

  it('has d 132.5 and 122.5 with bars of 10', () => {
    expect([shortDepthMm, longDepthMm]).toEqual([132.5, 122.5])
  })

  it.each([
    [20.43, 132.5, 0.046, 371],
    [15.23, 132.5, 0.034, 277],
    [12.93, 122.5, 0.034, 254],
  ])('needs for %d kNm/m at d %d, with K %d, %d mm²/m', (momentKnm, depthMm, k, requiredMm2) => {
    const bending = at(momentKnm, depthMm)
    expectPrinted(bending.k, k, TWO_AND_A_HALF_PERCENT)
    expectPrinted(bending.requiredMm2, requiredMm2, TWO_AND_A_HALF_PERCENT)
  })

  it('has K 0.026 at midspan of the long span', () => {
    expectPrinted(at(9.77, longDepthMm).k, 0.026, TWO_AND_A_HALF_PERCENT)
  })

  it('provides 449 and 392 mm²/m, 0.28 and 0.24 % of the section, where 0.13 % is the least', () => {
    const provided = [layerAreaMm2({ diameter: 10, spacing: 175 }), layerAreaMm2({ diameter: 10, spacing: 200 })]
    const least = basis.leastSteelMm2(slabZone(162.5, shortDepthMm)).value
    expectPrinted(provided[0]!, 449, TWO_AND_A_HALF_PERCENT)
    expectPrinted(provided[1]!, 392, TWO_AND_A_HALF_PERCENT)
    expectPrinted((0.13 * provided[0]!) / least, 0.28, TWO_AND_A_HALF_PERCENT)
    expectPrinted((0.13 * provided[1]!) / least, 0.24, TWO_AND_A_HALF_PERCENT)
  })

  it('may space its bars 397.5 mm, three depths', () => {
    const bars = { place: 'greatestMoment', heightMm: 162.5, diameterMm: 10, redistributedShare: 0 } as const
    const clearMm = basis.greatestSpacingMm({ ...bars, depthMm: shortDepthMm }).value - bars.diameterMm
    expectPrinted(clearMm, 397.5, TWO_AND_A_HALF_PERCENT)
  })
})
