import { describe, expect, it } from 'vitest'
import { codeBasisOf } from '#shared/sizing/codeBases'
import type { SizedPanel } from '#shared/sizing/sizedPanel'
import { sizeScheme } from '#shared/sizing/sizeScheme'
import { fileOf, panelOf, rectangle, ribbed, schemeOf, solid } from '../support/floors'

type Outline = ReturnType<typeof rectangle>

const bars = {
  bottomX: { diameter: 10, spacing: 200 },
  bottomY: { diameter: 8, spacing: 250 },
} as const
const fixed = schemeOf({ ...solid, thickness: 150, bars })
const basis = codeBasisOf(fileOf([panelOf('P1', rectangle(0, 0, 6000, 4500), [])]).brief)
const bond = { isTop: false, sectionMm: 150, isCorner: false }
const upTo25 = (mm: number) => Math.ceil(mm / 25) * 25

function sized(voids: readonly Outline[], scheme = fixed, continuous: readonly number[] = []): SizedPanel {
  const panel = { ...panelOf('P1', rectangle(0, 0, 6000, 4500), continuous), voids: [...voids] }
  return sizeScheme(scheme, fileOf([panel])).panels[0]!
}
const runs = (panel: SizedPanel, position: string) =>
  panel.bars
    .filter((run) => run.position.startsWith(position))
    .map(({ diameter, count, lengthMm }) => [diameter, count, lengthMm])

describe('bars beside a void in a solid slab', () => {
  it('are as many as it cuts, half on each side, anchored past it both ways', () => {
    // 1000 × 800 in the middle; bars along y at 5750/29 across x, bars along x at 4250/17 across y
    const panel = sized([rectangle(2500, 1850, 1000, 800)])
    const whole = sized([])
    const across = (cut: SizedPanel) => runs(cut, 'bottom, short span').reduce((sum, [, count]) => sum + count!, 0)
    // every cut line is two bars: so many more bars than without the void
    const cutShort = across(panel) - across(whole)
    const anchorage = (diameter: 8 | 10) => basis.anchorageMm(diameter, bond, 1).value
    expect(cutShort).toBe(5)
    expect(runs(panel, 'trimmers, short span')).toEqual([[10, 6, upTo25(800 + 2 * anchorage(10))]])
    expect(runs(panel, 'trimmers, long span')).toEqual([[8, 4, upTo25(1000 + 2 * anchorage(8))]])
    expect(runs(whole, 'trimmers')).toEqual([])
  })

  it('stand on the one side that has room, and end in the support where that is nearer than their anchorage', () => {
    // against the right support, 125 to 2125 from its face to the left: x 4875 is not cut
    const panel = sized([rectangle(3875, 1850, 2000, 800)])
    const [[, count, lengthMm]] = runs(panel, 'trimmers, short span') as [number[]]
    const cut = Number(
      /for (\d+) cut/.exec(panel.bars.find(({ position }) => position.startsWith('trimmers, short'))!.countWorking)?.[1],
    )
    expect(count).toBe(cut)
    expect(lengthMm).toBe(upTo25(800 + 2 * basis.anchorageMm(10, bond, 1).value))
    const [[, , long]] = runs(panel, 'trimmers, long span') as [number[]]
    // 2000 of the void, 125 into the support, an anchorage on the other side
    expect(long).toBe(upTo25(2000 + 125 + basis.anchorageMm(8, bond, 1).value))
  })

  it('make up top bars that it cuts within their reach over a continuous support', () => {
    const computed = schemeOf({ ...solid, thickness: 150 })
    const near = sized([rectangle(4600, 1850, 800, 800)], computed, [1])
    const far = sized([rectangle(1000, 1850, 800, 800)], computed, [1])
    expect(runs(near, 'trimmers, top, edge 2')).not.toEqual([])
    expect(runs(far, 'trimmers, top, edge 2')).toEqual([])
    // a bar that is cut stops short of the void: from its edge at 4600 + 800 to the face at 5875, less the cover of 25
    const short = near.bars.filter(({ position }) => position.startsWith('top, edge 2'))
    expect(short.some(({ lengthWorking }) => lengthWorking.startsWith('450 + 250 + '))).toBe(true)
  })

  it('follow from the floor, not from how it lies', () => {
    const turned = (points: Outline): Outline => points.map(([x, y]) => [0.6 * x - 0.8 * y, 0.8 * x + 0.6 * y])
    const panel = { ...panelOf('P1', rectangle(0, 0, 6000, 4500), []), voids: [rectangle(2500, 1850, 1000, 800)] }
    const other = { ...panel, outline: turned(panel.outline), voids: panel.voids.map(turned) }
    const [here, there] = [panel, other].map((each) => sizeScheme(fixed, fileOf([each])).panels[0]!)
    expect(runs(there!, 'trimmers')).toEqual(runs(here!, 'trimmers'))
  })
})

describe('bars around a void in a ribbed floor', () => {
  const scheme = schemeOf({
    ...ribbed,
    ribBars: [{ diameter: 12, count: 2 }],
    topBars: [{ diameter: 10, count: 1 }],
    solidZone: 200,
  })
  const panel = sized([rectangle(2500, 1800, 1200, 900)], scheme)
  const layout = panel.layout!

  it('are those of the ribs cut, in whole ribs beside, and those of one rib in each strip across', () => {
    const ys = [...new Set(layout.ribLines.map(({ start }) => Math.round(start[1])))]
    const cut = layout.ribLines.length - ys.length
    expect(cut).toBe(3)
    expect(runs(panel, 'trimmers, along ribs')).toEqual([[12, 8, 6000]])
    const [[, across, lengthMm]] = runs(panel, 'trimmers, across ribs') as [number[]]
    expect(across).toBe(4)
    const beside = [Math.max(...ys.filter((y) => y < 1700)), Math.min(...ys.filter((y) => y > 2800))]
    const anchorage = basis.anchorageMm(12, { isTop: false, sectionMm: 260, isCorner: true }, 1).value
    expect(Math.abs(lengthMm! - (beside[1]! - beside[0]! + 2 * anchorage))).toBeLessThan(26)
  })

  it('are none where it cuts no rib', () => {
    const rib = layout.ribLines[0]!.start[1]
    expect(runs(sized([rectangle(2500, rib + 180, 300, 100)], scheme), 'trimmers')).toEqual([])
  })
})
