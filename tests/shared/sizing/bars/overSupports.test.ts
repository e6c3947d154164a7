import { describe, expect, it } from 'vitest'
import { sizeScheme } from '#shared/sizing/sizeScheme'
import { edge, fileOf, panelOf, rectangle, ribbed, row, schemeOf, solid } from '../support/floors'

const countOf = (panel: { bars: readonly { position: string; count: number }[] }, position: string) =>
  panel.bars.filter((run) => run.position.startsWith(position)).reduce((sum, { count }) => sum + count, 0)

describe('top bars over a support that two panels share', () => {
  it('are counted once: as many as the ribs have, half with either panel', () => {
    const { panels } = sizeScheme(
      schemeOf({ ...ribbed, ribWidth: 140, topBars: [{ diameter: 12, count: 1 }] }),
      fileOf(row([5000, 5000], 5900)),
    )
    const ribs = panels[0]!.layout!.ribLines.length
    expect(ribs % 2).toBe(1)
    expect([countOf(panels[0]!, 'top, edge 2'), countOf(panels[1]!, 'top, edge 4')]).toEqual([(ribs + 1) / 2, (ribs - 1) / 2])
  })

  it('reach 0.3 of the clear span into either panel', () => {
    const { panels } = sizeScheme(schemeOf({ ...solid, thickness: 170 }), fileOf(row([4000, 6000], 9000)))
    // 0.3 · 3750 + 250 + 0.3 · 5750 = 3100
    const over = panels.map(({ bars }, i) => bars.find(({ position }) => position.startsWith(`top, edge ${i === 0 ? 2 : 4}`))!)
    expect(over.map(({ lengthMm }) => lengthMm)).toEqual([3100, 3100])
  })

  it('are of the heavier set on both sides', () => {
    const given = (diameter: 12 | 16) => ({
      level: 'L1',
      panel: diameter === 12 ? 'P1' : 'P2',
      topBars: [{ diameter, count: 1 }],
    })
    const scheme = schemeOf({ ...ribbed, ribWidth: 140, givenPanels: [given(12), given(16)] })
    const { panels } = sizeScheme(scheme, fileOf(row([5000, 5000], 5000)))
    const over = panels.map(({ bars }, i) => bars.filter(({ position }) => position === `top, edge ${i === 0 ? 2 : 4}`))
    expect(over.flat().map(({ diameter }) => diameter)).toEqual([16, 16])
  })

  it('are half counted, and reach as far behind, where no panel meets them', () => {
    const scheme = schemeOf({ ...ribbed, topBars: [{ diameter: 12, count: 1 }] })
    const { panels } = sizeScheme(scheme, fileOf([panelOf('P1', rectangle(0, 0, 5000, 5000), [1])]))
    const ribs = panels[0]!.layout!.ribLines.length
    const [run] = panels[0]!.bars.filter(({ position }) => position === 'top, edge 2')
    // 2 · 0.3 · 4750 + 250 = 3100
    expect([run?.count, run?.lengthMm]).toEqual([Math.ceil(ribs / 2), 3100])
  })
})

describe('top bars of a cantilever', () => {
  const cantilever = {
    ...panelOf('P2', rectangle(5000, 0, 1500, 5000), []),
    edges: [edge('free'), edge('free'), edge('free'), edge('continuous')],
  }
  const behind = panelOf('P1', rectangle(0, 0, 5000, 5000), [1])

  it.each([
    ['ribbed', schemeOf({ ...ribbed, ribWidth: 140, topping: 100 }), 3100],
    ['solid', schemeOf({ ...solid, thickness: 200 }), 3075],
  ])('of a %s floor run from its end to as far behind its support', (_, scheme, lengthMm) => {
    const { panels } = sizeScheme(scheme, fileOf([behind, cantilever]))
    const over = panels.map(({ bars }, i) => bars.filter(({ position }) => position.startsWith(`top, edge ${i === 0 ? 2 : 4}`)))
    // clear 1375 less the cover of 25, the support of 250, and behind it the span of the cantilever: 1375 + min(h/2, t/2) = 1500 or 1475
    for (const run of over.flat()) expect([run.lengthMm, run.shape.code]).toEqual([lengthMm, '00'])
    expect(over.every((runs) => runs.length > 0)).toBe(true)
  })
})
