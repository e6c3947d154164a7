import { describe, expect, it } from 'vitest'
import type { Bar } from '#shared/contracts/appraisal'
import { OutOfScopeError } from '#shared/outOfScope'
import { RIB_BAR_SETS } from '#shared/sizing/ribbed/ribBarOrder'
import { sizeScheme } from '#shared/sizing/sizeScheme'
import { BAR_MASS_KG_PER_M } from '#shared/sizing/tables/bars'
import { edge, fileOf, panelOf, rectangle, ribbed, row, schemeOf, solid } from './support/floors'

const one = panelOf('P1', rectangle(0, 0, 4500, 6000), [])

function pathOf(work: () => unknown): string {
  try {
    work()
  } catch (error) {
    if (error instanceof OutOfScopeError) return error.path
    throw error
  }
  throw new Error('nothing was thrown')
}

describe('what lies outside the rules', () => {
  const free = (sides: readonly number[]) => [0, 1, 2, 3].map((i) => edge(sides.includes(i) ? 'free' : 'discontinuous'))

  it('names the cover that takes up the depth', () => {
    const file = fileOf([one], { cover: 90 })
    const thin = { ...ribbed, block: { ...ribbed.block, height: 50 }, topping: 40 }
    expect(pathOf(() => sizeScheme(schemeOf(thin), file))).toBe('brief.cover')
    expect(pathOf(() => sizeScheme(schemeOf({ ...solid, thickness: 100 }), file))).toBe('brief.cover')
    expect(sizeScheme(schemeOf(solid), file).passes).toBe(true)
  })

  it('names the edges of a panel whose ribs end in the air', () => {
    const file = fileOf([one, { ...one, mark: 'P2', outline: rectangle(9000, 0, 4500, 6000), edges: free([1]) }])
    expect(pathOf(() => sizeScheme(schemeOf(ribbed), file))).toBe('levels.0.panels.1.edges')
  })

  it('lets a free edge run along the ribs, and makes a solid panel span one way', () => {
    const file = fileOf([{ ...one, edges: free([0]) }])
    expect(sizeScheme(schemeOf(ribbed), file).panels[0]!.moments.midspan).toBeGreaterThan(0)
    expect(sizeScheme(schemeOf(solid), file).panels[0]!.flags[0]).toBe('one way, simple span')
  })

  it('names the edges of a solid panel without two opposite supports', () => {
    const file = fileOf([{ ...one, edges: free([0, 1]) }])
    expect(pathOf(() => sizeScheme(schemeOf(solid), file))).toBe('levels.0.panels.0.edges')
  })

  it('names the outline of a panel that no row of blocks fits', () => {
    const file = fileOf([panelOf('P1', rectangle(0, 0, 4500, 600), [])])
    expect(pathOf(() => sizeScheme(schemeOf(ribbed), file))).toBe('levels.0.panels.0.outline')
  })
})

describe('a solid panel', () => {
  const methodOf = (width: number, height: number) =>
    sizeScheme(schemeOf(solid), fileOf([panelOf('P1', rectangle(0, 0, width, height), [])])).panels[0]!

  it('spans two ways to an aspect of 2, one way past it', () => {
    // Effective spans are the clear ones and a thickness: 3750 + h and 7500 + 250 + h.
    expect(methodOf(4000, 7500).flags[0]).toContain('two way')
    expect(methodOf(4000, 8600).flags[0]).toBe('one way, simple span')
    expect(methodOf(4000, 8600).moments.midspanLong).toBeUndefined()
  })

  it('has distribution steel of a fifth of the main bars across a one-way span', () => {
    const { checks } = methodOf(4000, 8600)
    const share = checks.find(({ clause }) => clause === 'EN 1992-1-1 9.3.1.1(2)')!
    const main = checks.find(({ name, unit }) => name === 'flexure.midspan' && unit === 'mm²')!
    expect(share.demand).toBeCloseTo(0.2 * main.capacity, 9)
    expect(share.pass).toBe(true)
  })

  it('takes the larger moment of two panels at the support they share', () => {
    const { panels } = sizeScheme(schemeOf({ ...solid, thickness: 200 }), fileOf(row([4000, 7000], 6000)))
    const [small, large] = panels
    const hogging = (panel: typeof small) => Math.max(panel!.moments.support, panel!.moments.supportLong ?? 0)
    expect(hogging(small)).toBeCloseTo(hogging(large), 9)
    const alone = sizeScheme(schemeOf({ ...solid, thickness: 200 }), fileOf([row([4000, 7000], 6000)[0]!]))
    expect(hogging(small)).toBeGreaterThan(hogging(alone.panels[0]))
  })

  it('is checked with the bars it is given, and never made thicker', () => {
    const layer = { diameter: 8, spacing: 300 } as const
    const scheme = schemeOf({ ...solid, thickness: 150, bars: { bottomX: layer, bottomY: layer } })
    const { depth, passes, panels } = sizeScheme(scheme, fileOf([one]))
    expect([depth, passes]).toEqual([150, false])
    expect(panels[0]!.steel.midspanProvided).toBeCloseTo((Math.PI * 16 * 1000) / 300, 9)
    expect(panels[0]!.checks.filter(({ pass }) => !pass).map(({ name }) => name)).toContain('flexure.midspan')
  })

  it('is as thick as fire asks', () => {
    expect(
      sizeScheme(schemeOf(solid), fileOf([panelOf('P1', rectangle(0, 0, 2000, 2000), [])], { fireMinutes: 240 })).depth,
    ).toBe(175)
  })

  it('has one thickness, its worst panel’s', () => {
    const apart = [panelOf('P1', rectangle(0, 0, 3000, 3000), []), panelOf('P2', rectangle(9000, 0, 6000, 6000), [])]
    const { depth, panels } = sizeScheme(schemeOf(solid), fileOf(apart))
    expect(panels.map((panel) => panel.depth)).toEqual([depth, depth])
    expect(depth).toBe(sizeScheme(schemeOf(solid), fileOf([apart[1]!])).depth)
  })
})

describe('the bars of ribs', () => {
  const scheme = (ribBars: readonly Bar[] | 'computed') =>
    schemeOf({ ...ribbed, ribWidth: 120, solidZone: 400, ribBars: ribBars === 'computed' ? ribBars : [...ribBars] })
  const isBottom = ({ name, working }: { name: string; working: string }) =>
    name !== 'shear' && (working.startsWith('midspan') || name === 'bars.fit' || name === 'fire.cover')

  it.each([[4200], [4800], [5400]])('are the lightest of all sets that pass, spanning %d', (span) => {
    const file = fileOf([panelOf('P1', rectangle(0, 0, span, 5000), [])])
    const trials = RIB_BAR_SETS.map((set) => sizeScheme(scheme(set), file).panels[0]!)
    const massOf = ({ bars }: (typeof trials)[number]) =>
      bars
        .filter(({ position }) => position.startsWith('bottom'))
        .reduce((sum, { diameter, count, lengthMm }) => sum + count * lengthMm * BAR_MASS_KG_PER_M[diameter], 0)
    const passing = trials.filter(({ checks }) => checks.filter(isBottom).every(({ pass }) => pass))
    expect(passing.length).toBeGreaterThan(0)
    expect(passing.length).toBeLessThan(trials.length)
    const chosen = sizeScheme(scheme('computed'), file).panels[0]!
    expect(massOf(chosen)).toBeCloseTo(Math.min(...passing.map(massOf)), 6)
  })

  it('are checked as given, and a failing panel is shown as failing', () => {
    const { passes, panels } = sizeScheme(
      scheme([{ diameter: 8, count: 1 }]),
      fileOf([panelOf('P1', rectangle(0, 0, 6000, 5000), [])]),
    )
    expect(passes).toBe(false)
    const bending = panels[0]!.checks.find(({ name, unit }) => name === 'flexure.midspan' && unit === 'mm²')!
    expect([bending.pass, bending.utilisation > 1]).toEqual([false, true])
  })

  it('fail to fit where the rib is too narrow for them', () => {
    const { panels } = sizeScheme(scheme([{ diameter: 16, count: 3 }]), fileOf([panelOf('P1', rectangle(0, 0, 5000, 5000), [])]))
    const fit = panels[0]!.checks.find(({ name }) => name === 'bars.fit')!
    expect([fit.demand, fit.capacity, fit.pass]).toEqual([2 * 25 + 3 * 16 + 2 * 20, 120, false])
  })

  it('run over a shared support to 0.3 of either clear span past its faces, each panel counting every second one', () => {
    const { panels } = sizeScheme(schemeOf({ ...ribbed, solidZone: 400 }), fileOf(row([5000, 4000], 5000)))
    const tops = panels.map(({ bars }) => bars.find(({ clause }) => clause === 'common practice')!)
    expect(tops.map(({ lengthMm }) => lengthMm)).toEqual([250 + 0.3 * 4750 + 0.3 * 3750, 250 + 0.3 * 4750 + 0.3 * 3750])
    expect(tops.map(({ position }) => position)).toEqual(['top, edge 2', 'top, edge 4'])
  })

  it('are lapped only beyond the stock length of 12 m', () => {
    const bottomOf = (width: number) =>
      sizeScheme(
        schemeOf({ ...ribbed, ribWidth: 300, solidZone: 0 }),
        fileOf([panelOf('P1', rectangle(0, 0, width, 5000), [])]),
      ).panels[0]!.bars.filter(({ position }) => position.startsWith('bottom'))
    for (const { lengthMm, lengthWorking } of bottomOf(11_000)) {
      expect(lengthMm).toBeLessThanOrEqual(12_000)
      expect(lengthWorking).not.toContain('lapped')
    }
    const long = bottomOf(12_500)
    expect(Math.max(...long.map(({ lengthMm }) => lengthMm))).toBeLessThanOrEqual(12_000)
    for (const { lengthWorking } of long) expect(lengthWorking).toContain('lapped')
  })
})

describe('fire', () => {
  const names = (fireMinutes: 0 | 60) =>
    sizeScheme(schemeOf(ribbed), fileOf([one], { fireMinutes }))
      .panels[0]!.checks.map(({ name }) => name)
      .filter((name) => name.startsWith('fire'))

  it('is not asked for at 0 minutes', () => {
    expect(names(0)).toEqual([])
    expect(names(60)).toContain('fire.cover')
  })

  it('says what would change a failing size', () => {
    const { panels } = sizeScheme(schemeOf(ribbed), fileOf([one], { fireMinutes: 60 }))
    expect(panels[0]!.flags.some((flag) => flag.includes('test evidence for blocks'))).toBe(true)
  })
})
