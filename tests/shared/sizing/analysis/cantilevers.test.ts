import { describe, expect, it } from 'vitest'
import { type AppraisalFileInput, appraisalFile, type Scheme } from '#shared/contracts/appraisal'
import { OutOfScopeError } from '#shared/outOfScope'
import type { SizedPanel } from '#shared/sizing/sizedPanel'
import { sizeScheme } from '#shared/sizing/sizeScheme'
import { brief, edge, loads, rectangle, ribbed, schemeOf, solid } from '../support/floors'

type PanelInput = AppraisalFileInput['levels'][number]['panels'][number]
type Continuity = 'continuous' | 'discontinuous' | 'free'
type BriefInput = AppraisalFileInput['brief']

const british: BriefInput = { basis: 'BS8110', ...loads, fcu: 35, fy: 460 }
const BASES = [
  ['EN 1992-1-1', brief, { permanent: 1.35, variable: 1.5 }],
  ['BS 8110-1', british, { permanent: 1.4, variable: 1.6 }],
] as const

function panel(mark: string, outline: [number, number][], edges: readonly Continuity[], ribDirection = 90): PanelInput {
  return { mark, outline, edges: edges.map((each) => edge(each)), ribDirection }
}

/** A panel 12 m wide that spans 5 m upwards, and a balcony below it. */
const back = (edges: readonly Continuity[] = ['continuous', 'discontinuous', 'discontinuous', 'discontinuous']) =>
  panel('P1', rectangle(0, 0, 12_000, 5000), edges)
const balcony = (lengthMm = 1500, edges: readonly Continuity[] = ['free', 'free', 'continuous', 'free']) =>
  panel('B1', rectangle(0, -lengthMm, 12_000, lengthMm), edges)

function sized(panels: readonly PanelInput[], scheme: Scheme, basis: BriefInput = brief): readonly SizedPanel[] {
  const file = appraisalFile.parse({
    format: 'bothways.appraisal/1',
    brief: basis,
    levels: [{ mark: 'L1', panels }],
    schemes: [ribbed, solid],
  })
  return sizeScheme(scheme, file).panels
}

const slab = schemeOf({ ...solid, thickness: 200 })
const ribs = schemeOf({ ...ribbed, solidZone: 0, ribWidth: 125 })
const checksOf = ({ checks }: SizedPanel, name: string) => checks.filter((check) => check.name === name)

describe.each(BASES)('a cantilever by %s', (title, basis, factors) => {
  it('of a slab has w·a²/2 over its support, on both sides, and no midspan moment', () => {
    const [p1, b1] = sized([back(), balcony()], slab, basis)
    // 200 mm: 5 + 1.5 kN/m² permanent, 2 + 0.8 variable; to the axis of the support, or by half the depth past its face (EN).
    const w = factors.permanent * (0.2 * 25 + 1.5) + factors.variable * 2.8
    const length = title === 'BS 8110-1' ? 1.5 : 1.5 - 0.125 + 0.1
    expect(b1!.moments).toEqual({ midspan: 0, support: expect.closeTo((w * length ** 2) / 2, 9) })
    expect(p1!.moments.support).toBeCloseTo(b1!.moments.support, 9)
    expect(checksOf(b1!, 'flexure.midspan')).toEqual([])
    expect(checksOf(b1!, 'flexure.support')).toHaveLength(2)
    expect(b1!.flags[0]).toMatch(/^cantilever/)
    expect(p1!.flags).toContain('analysed in the strip B1 – P1')
  })

  it('of ribs has its moment over the support, by its own load and effective length', () => {
    const [p1, b1] = sized([back(), balcony()], ribs, basis)
    const { clear, blocks } = b1!.areas
    const blocksM3 = (blocks / 1e6) * 0.2
    const own = (((clear / 1e6) * 0.26 - blocksM3) * 25 + (blocksM3 / 0.016) * 12.5 * 0.00981) / (clear / 1e6)
    const w = factors.permanent * (own + 1.5) + factors.variable * 2.8
    expect(b1!.moments.support / ((w * 0.525 * 1.5 ** 2) / 2)).toBeCloseTo(1, 4)
    expect(b1!.moments.midspan).toBe(0)
    expect(p1!.moments.support).toBeCloseTo(b1!.moments.support, 6)
    expect(b1!.layout!.rows.length).toBeGreaterThan(15)
  })

  it('is held to the span to depth of cantilevers by the steel over its support', () => {
    const [, slabOf] = sized([back(), balcony()], slab, basis)
    const [, ribsOf] = sized([back(), balcony()], ribs, basis)
    const [ofSlab] = checksOf(slabOf!, 'deflection')
    const [ofRibs] = checksOf(ribsOf!, 'deflection')
    expect([ofSlab, ofRibs].every((check) => check!.working.startsWith('cantilever'))).toBe(true)
    // EN 1992-1-1 Table 7.4N, K 0.4; BS 8110-1 Table 3.9, 7 and, bw/b = 125/525 below 0.3, 5.6.
    expect(ofSlab!.working).toMatch(title === 'BS 8110-1' ? /= 7·/ : /= 0\.4·/)
    expect(ofRibs!.working).toMatch(title === 'BS 8110-1' ? /= 5\.6·/ : /= 0\.4·/)
  })

  it.each([
    ['a slab', slab],
    ['ribs', ribs],
  ])('of %s has top bars over its whole length and as far behind, or the usual share', (_, scheme) => {
    for (const lengthMm of [900, 1500, 2200]) {
      const panels = sized([back(), balcony(lengthMm)], scheme, basis)
      const tops = panels[1]!.bars.filter(({ position }) => position === 'top, edge 3')
      const least = lengthMm - 125 - 25 + 250 + Math.max(lengthMm - 125, 0.3 * 4750)
      expect(tops.length).toBeGreaterThan(0)
      for (const { lengthMm: bar } of tops) expect(bar).toBeGreaterThanOrEqual(least - 1)
    }
  })

  it('asks for a thicker slab the longer it is', () => {
    const least = schemeOf(solid)
    const depths = [1500, 2500, 3500].map((length) => sized([back(), balcony(length)], least, basis)[1]!.depth)
    expect(depths[1]).toBeGreaterThan(depths[0]!)
    expect(depths[2]).toBeGreaterThan(depths[1]!)
    expect(sized([back(), balcony(2500)], least, basis).every(({ checks }) => checks.every(({ pass }) => pass))).toBe(true)
  })

  it('goes on behind its support in a slab that spans both ways, which takes its moment', () => {
    const square = panel('P1', rectangle(0, 0, 6000, 5000), ['continuous', 'discontinuous', 'discontinuous', 'discontinuous'])
    const small = panel('B1', rectangle(0, -2200, 6000, 2200), ['free', 'free', 'continuous', 'free'])
    const [p1, b1] = sized([square, small], slab, basis)
    expect(p1!.flags[0]).toMatch(/^two way/)
    expect(Math.max(p1!.moments.support, p1!.moments.supportLong!)).toBeCloseTo(b1!.moments.support, 9)
  })
})

describe('a panel that is no cantilever', () => {
  const refusal = (panels: readonly PanelInput[], scheme: Scheme) => {
    try {
      sized(panels, scheme)
      return null
    } catch (error) {
      if (!(error instanceof OutOfScopeError)) throw error
      return [error.path, error.expected]
    }
  }
  const path = 'levels.0.panels.1.edges'
  const turned = panel('P1', rectangle(0, 0, 4000, 12_000), ['continuous', 'discontinuous', 'discontinuous', 'discontinuous'], 0)
  const narrow = panel('B1', rectangle(0, -1500, 4000, 1500), ['free', 'free', 'continuous', 'free'])

  it.each<[string, PanelInput[]]>([
    ['its edge is simply supported', [back(), balcony(1500, ['free', 'free', 'discontinuous', 'free'])]],
    [
      'the panel behind is not continuous there',
      [back(['discontinuous', 'discontinuous', 'discontinuous', 'discontinuous']), balcony()],
    ],
    ['the panel behind spans the other way', [turned, narrow]],
    ['nothing stands behind it', [panel('P0', rectangle(0, 9000, 4000, 5000), ['discontinuous']), narrow]],
  ])('is refused where %s, slab and ribs', (_, panels) => {
    expect(refusal(panels, slab)).toEqual([path, expect.stringContaining('expected two opposite supported edges')])
    expect(refusal(panels, ribs)).toEqual([path, expect.stringContaining('ribs end on free edge 1')])
  })

  it('is refused as a slab where a side is supported too', () => {
    expect(refusal([back(), balcony(1500, ['free', 'discontinuous', 'continuous', 'free'])], slab)?.[0]).toBe(path)
  })

  it('is refused as ribs where it has a void between them', () => {
    const cut = { ...balcony(2500), voids: [rectangle(3000, -1500, 1200, 700)] }
    expect(refusal([back(), cut], ribs)?.[0]).toBe('levels.0.panels.1.voids')
  })
})

describe('load on an overhang', () => {
  it('that lifts the panel behind off its far support is said', () => {
    const flags = sized([back(), balcony(4500)], schemeOf({ ...solid, thickness: 400 }))[0]!.flags.join()
    expect(flags).toContain('load on other spans may lift it off edge 3')
    expect(sized([back(), balcony(1500)], slab)[0]!.flags.join()).not.toContain('lift it off')
  })
})

describe('two-way panels of unequal span side by side', () => {
  it('both take the larger moment at the support they share, and say so', () => {
    const edges = (continuous: number) => [0, 1, 2, 3].map((i): Continuity => (i === continuous ? 'continuous' : 'discontinuous'))
    const pair = [panel('P1', rectangle(0, 0, 4000, 6000), edges(1)), panel('P2', rectangle(4000, 0, 6000, 6000), edges(3))]
    const [first, second] = sized(pair, slab)
    const aloneEach = [0, 1].map((i) => sized([pair[i]!], slab)[0]!.moments)
    // P1 spans 4 m first, across the support; P2, square, spans there too: its own moment is the larger by far.
    expect(aloneEach[0]!.support).toBeLessThan(aloneEach[1]!.support)
    expect(first!.moments.support).toBeCloseTo(second!.moments.support, 9)
    expect(first!.moments.support).toBeCloseTo(aloneEach[1]!.support, 9)
    expect(first!.moments.midspan).toBeCloseTo(aloneEach[0]!.midspan, 9)
    expect(first!.flags[0]).toContain('of unequal support moments the larger counts on both sides')
  })
})
