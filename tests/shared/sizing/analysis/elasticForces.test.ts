import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { FloorLoads } from '#shared/sizing/actions'
import { greatestSagging, momentAt, shearAt, type SpanCase } from '#shared/sizing/analysis/continuousBeam'
import { elasticForces } from '#shared/sizing/analysis/elasticForces'
import type { StripSpan } from '#shared/sizing/analysis/strip'
import { analysisRulesOf } from '../support/analysisRulesOf'
import { stiffnessMoments } from '../support/directStiffness'

const rules = analysisRulesOf()
const loadsOf = (permanent: number, variable: number): FloorLoads => ({
  permanentKnPerM2: permanent,
  variableKnPerM2: variable,
  imposedKnPerM2: variable,
  partitionsKnPerM2: 0,
})

const spanOf = (spanMm: number, permanent: number, variable: number, isCantilever = false): StripSpan => ({
  spanMm,
  loads: loadsOf(permanent, variable),
  bayMm2: 0,
  isCantilever,
})

/** Every pattern there is, 2 to the power of the number of spans, solved one by one by the other solver. */
function everyCase(beam: readonly StripSpan[], index: number): SpanCase[] {
  const [first, last] = [beam[0]!.isCantilever ? 1 : 0, beam.at(-1)!.isCantilever ? 1 : 0]
  const inner = <Item>(items: readonly Item[]) => items.slice(first, items.length - last)
  return Array.from({ length: 2 ** beam.length }, (_, bits) => {
    const loads = beam.map(
      ({ loads: { permanentKnPerM2, variableKnPerM2 } }, i) =>
        1.35 * permanentKnPerM2 + ((bits >> i) & 1 ? 1.5 * variableKnPerM2 : 0),
    )
    const overhang = (at: number) => (loads[at]! * beam[at]!.spanMm ** 2) / 2
    const outer: [number, number] = [first ? overhang(0) : 0, last ? overhang(beam.length - 1) : 0]
    const moments = stiffnessMoments(inner(beam.map(({ spanMm }) => spanMm)), inner(loads), outer)
    return { load: loads[index]!, startMoment: moments[index - first]!, endMoment: moments[index - first + 1]! }
  })
}

const spanArbitrary = fc.tuple(
  fc.integer({ min: 2000, max: 9000 }),
  fc.double({ min: 2, max: 8, noNaN: true }),
  fc.double({ min: 0, max: 8, noNaN: true }),
)
const overhangArbitrary = fc.option(
  fc.tuple(
    fc.integer({ min: 500, max: 2500 }),
    fc.double({ min: 2, max: 8, noNaN: true }),
    fc.double({ min: 0, max: 8, noNaN: true }),
  ),
)
/** Up to six spans with their overhangs, and one of the supported ones. */
const beamArbitrary = fc
  .tuple(fc.array(spanArbitrary, { minLength: 1, maxLength: 4 }), overhangArbitrary, overhangArbitrary, fc.nat())
  .map(([spans, start, end, pick]) => ({
    beam: [
      ...(start ? [spanOf(...start, true)] : []),
      ...spans.map((each) => spanOf(...each)),
      ...(end ? [spanOf(...end, true)] : []),
    ],
    index: (start ? 1 : 0) + (pick % spans.length),
  }))
const most = (cases: readonly SpanCase[], effect: (each: SpanCase) => number) => Math.max(0, ...cases.map(effect))
const near = (actual: number, expected: number) => expect(Math.abs(actual - expected)).toBeLessThan(1e-6 * Math.abs(expected) + 1)

describe('elasticForces', () => {
  it('gives two equal spans under pattern loading the moments worked by hand', () => {
    const span = spanOf(5000, 4, 3)
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

  it('gives a span with an overhang the moments worked by hand', () => {
    const forces = elasticForces([spanOf(6000, 4, 3), spanOf(2000, 4, 3, true)], 0, rules)
    // Overhang loaded: 9.9·2²/2 = 19.8 kNm. Overhang unloaded: 5.4·2²/2 = 10.8; R = 9.9·3 − 10.8/6 = 27.9; sagging R²/(2·9.9) = 39.31.
    expect(forces.hoggingNmm('end', 0) / 1e6).toBeCloseTo(19.8, 6)
    expect(forces.saggingNmm / 1e6).toBeCloseTo(27.9 ** 2 / (2 * 9.9), 6)
    // Shear beside the overhang, all loaded: 9.9·3 + 19.8/6 = 33.0 kN.
    expect(forces.shearN('end', 0) / 1e3).toBeCloseTo(33, 6)
  })

  it('never counts the weight of an overhang along a part of the support as relief', () => {
    const [span, overhang] = [spanOf(6000, 4, 3), spanOf(2000, 4, 3, true)]
    const forces = elasticForces([span, { ...overhang, isPartOfWidth: true }], 0, rules)
    expect(forces.saggingNmm).toBeCloseTo((9.9 * 6000 ** 2) / 8, 3)
  })

  it('is the envelope of every pattern there is, by another solver', () => {
    fc.assert(
      fc.property(beamArbitrary, ({ beam, index }) => {
        const forces = elasticForces(beam, index, rules)
        const length = beam[index]!.spanMm
        const cases = everyCase(beam, index)
        near(
          forces.saggingNmm,
          most(cases, (each) => greatestSagging(each, length)),
        )
        near(
          forces.hoggingNmm('start', 0),
          most(cases, ({ startMoment }) => startMoment),
        )
        near(
          forces.hoggingNmm('end', 0.1 * length),
          most(cases, (each) => -momentAt(each, length, 0.9 * length)),
        )
        near(
          forces.shearN('start', 0),
          most(cases, (each) => shearAt(each, length, 0)),
        )
        near(
          forces.shearN('end', 0),
          most(cases, (each) => -shearAt(each, length, length)),
        )
      }),
      { numRuns: 100 },
    )
  })
})

describe('redistribution', () => {
  const shareArbitrary = fc.integer({ min: 1, max: 30 }).map((percent) => percent / 100)
  const freely = { greatestShare: 0.3, greatestSpanRatio: null, leastElasticShare: 0, clause: '' }

  it('takes 20 % off the support of two equal spans and gives the spans what they lose', () => {
    const span = spanOf(5000, 4, 3)
    const forces = elasticForces([span, span], 0, analysisRulesOf({ redistributedShare: 0.2 }))
    // Both loaded: 0.8·30.94 = 24.75 kNm; R = 9.9·2.5 − 24.75/5 = 19.8; sagging 19.8²/(2·9.9) = 19.8. One loaded: 23.91 is under 24.75 and stays.
    expect(forces.hoggingNmm('end', 0) / 1e6).toBeCloseTo(24.75, 6)
    expect(forces.saggingNmm / 1e6).toBeCloseTo(19.96875 ** 2 / (2 * 9.9), 4)
    expect(forces.redistributedShare).toBe(0.2)
  })

  it('keeps every case in equilibrium, within the share of its own elastic moments, and the sagging no less than elastic', () => {
    fc.assert(
      fc.property(beamArbitrary, shareArbitrary, ({ beam, index }, share) => {
        const moved = analysisRulesOf({ redistributedShare: share, redistribution: freely })
        const [after, before] = [elasticForces(beam, index, moved), elasticForces(beam, index, rules)]
        const length = beam[index]!.spanMm
        const at = (end: 'start' | 'end', from: number) => after.casesAt(end, from)
        before.casesAt('start', 0).forEach((elastic, i) => {
          const [start, middle, end] = [at('start', 0)[i]!, at('start', length / 2)[i]!, at('end', 0)[i]!]
          const load = (start.shearN + end.shearN) / length
          near(load * length, elastic.shearN + before.casesAt('end', 0)[i]!.shearN)
          near(-middle.hoggingNmm + (start.hoggingNmm + end.hoggingNmm) / 2, (load * length ** 2) / 8)
          near(start.shearN, (load * length) / 2 + (start.hoggingNmm - end.hoggingNmm) / length)
          expect(start.hoggingNmm).toBeGreaterThanOrEqual(Math.min(elastic.hoggingNmm, (1 - share) * elastic.hoggingNmm) - 1)
        })
        expect(after.saggingNmm).toBeGreaterThanOrEqual(before.saggingNmm - 1)
      }),
      { numRuns: 100 },
    )
  })

  it('sags as the worst of every pattern held to the reduced support moments, by another solver', () => {
    fc.assert(
      fc.property(fc.array(spanArbitrary, { minLength: 2, maxLength: 6 }), fc.nat(), shareArbitrary, (spans, pick, share) => {
        const beam = spans.map((each) => spanOf(...each))
        const index = pick % beam.length
        const cases = everyCase(beam, index)
        const limit = (moment: (each: SpanCase) => number) => (1 - share) * most(cases, moment)
        const [start, end] = [limit(({ startMoment }) => startMoment), limit(({ endMoment }) => endMoment)]
        const held = cases.map(({ load, startMoment, endMoment }) => ({
          load,
          startMoment: Math.min(startMoment, start),
          endMoment: Math.min(endMoment, end),
        }))
        const forces = elasticForces(beam, index, analysisRulesOf({ redistributedShare: share, redistribution: freely }))
        near(
          forces.saggingNmm,
          most(held, (each) => greatestSagging(each, beam[index]!.spanMm)),
        )
        near(forces.hoggingNmm('start', 0), start)
        near(forces.hoggingNmm('end', 0), end)
      }),
      { numRuns: 60 },
    )
  })

  it('leaves the moment of an overhang alone, and a single span with overhangs altogether', () => {
    const [span, overhang] = [spanOf(6000, 4, 3), spanOf(2000, 4, 3, true)]
    const moved = analysisRulesOf({ redistributedShare: 0.3, redistribution: freely })
    expect(elasticForces([span, overhang], 0, moved).redistributedShare).toBe(0)
    const forces = elasticForces([overhang, span, span], 1, moved)
    expect(forces.hoggingNmm('start', 0) / 1e6).toBeCloseTo(19.8, 6)
    expect(forces.redistributedShare).toBe(0.3)
  })

  it('needs neighbouring spans within 2 to 1 by EN 1992-1-1 5.5(4): at the limit it is done, beyond it is not', () => {
    const shareOf = (spanMm: number) =>
      elasticForces([spanOf(6000, 4, 3), spanOf(spanMm, 4, 3)], 0, analysisRulesOf({ redistributedShare: 0.1 }))
        .redistributedShare
    expect(shareOf(3000)).toBe(0.1)
    expect(shareOf(2990)).toBe(0)
    expect(shareOf(12_000)).toBe(0.1)
    expect(shareOf(12_010)).toBe(0)
  })

  it('leaves every section 70 % of its greatest elastic moment by BS 8110-1 3.2.2.1', () => {
    const span = spanOf(5000, 4, 3)
    const redistribution = { ...freely, leastElasticShare: 0.7 }
    const [after, before] = [analysisRulesOf({ redistributedShare: 0.3, redistribution }), rules].map((each) =>
      elasticForces([span, span], 0, each),
    )
    for (const from of [0, 200, 500, 1000, 1500, 1800])
      expect(after!.hoggingNmm('end', from)).toBeGreaterThanOrEqual(0.7 * before!.hoggingNmm('end', from) - 1e-6)
    // The other span loaded, at 1.5 m: 23.91 − (5.4·2.5 + 23.91/5)·1.5 + 5.4·1.5²/2 = 2.56 kNm; from 21.66 at the support only 0.98.
    expect(before!.hoggingNmm('end', 1500) / 1e6).toBeCloseTo(2.559375, 6)
    expect(after!.hoggingNmm('end', 1500) / 1e6).toBeCloseTo(0.7 * 2.559375, 6)
  })
})
