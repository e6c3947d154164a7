import { readFileSync } from 'node:fs'
import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { appraiseInFull } from '../../../shared/appraise'
import { appraisalFile } from '../../../shared/contracts/appraisal'
import { levelOnPaper } from '../../../shared/drawing/paper/levelOnPaper'
import { panelOnPaper } from '../../../shared/drawing/paper/panelOnPaper'
import { paperPlan } from '../../../shared/drawing/paper/paperPlan'
import { PX_PER_PAPER_MM } from '../../../shared/drawing/paper/paperSize'
import { planPanels } from '../../../shared/drawing/planDrawing'
import type { SvgNode } from '../../../shared/drawing/svgNode'

const file = appraisalFile.parse(
  JSON.parse(readFileSync(new URL('../../../shared/examples/tarn-court.json', import.meta.url), 'utf8')),
)
const full = appraiseInFull(file)
const ribbed = full.sized.find(({ kind }) => kind === 'ribbed')!
const level = file.levels[0]!
const panels = planPanels(level, ribbed, 'ribbed')

const nodesOf = (node: SvgNode): SvgNode[] => [
  node,
  ...node.children.flatMap((child) => (typeof child === 'string' ? [] : nodesOf(child))),
]
const blocksIn = (node: SvgNode) =>
  nodesOf(node).filter(({ attributes }) =>
    String(attributes['class'] ?? '')
      .split(' ')
      .includes('block'),
  )
const widthMm = ({ attributes }: SvgNode) => {
  const points = String(attributes['points'])
    .split(' ')
    .map((pair) => pair.split(',').map(Number) as [number, number])
  const [[ax, ay], [bx, by]] = points as [[number, number], [number, number]]
  return Math.hypot(bx - ax, by - ay) / PX_PER_PAPER_MM
}

describe('paperPlan', () => {
  const margins = { left: 60, right: 14, top: 28, bottom: 90 }
  const room = ({ pageMm: [width, height], words }: ReturnType<typeof paperPlan>) =>
    [width - 36 - (words === 'beside' ? 70 : 0), height - 26 - (words === 'below' ? 62 : 0)] as const

  it('fits the paper at the largest standard scale, whichever way the paper is turned', () => {
    const length = fc.double({ min: 500, max: 200_000, noNaN: true })
    fc.assert(
      fc.property(length, length, fc.constantFrom('A4' as const, 'A3' as const), (x, y, paper) => {
        const plan = paperPlan({ lengthsMm: [x, y], margins, footPx: 34 }, paper)
        const [wide, high] = room(plan)
        const drawn = [x * plan.pxPerMm + 74, y * plan.pxPerMm + 118 + 34].map((px) => px / PX_PER_PAPER_MM)
        expect(drawn[0]).toBeLessThanOrEqual(wide + 1e-9)
        expect(drawn[1]).toBeLessThanOrEqual(high + 1e-9)
        expect(plan.pxPerMm).toBeCloseTo(PX_PER_PAPER_MM / plan.reduction, 12)
      }),
    )
  })

  it('takes A3 for a scale at least as large as A4', () => {
    for (const lengthsMm of [[6000, 4500] as const, [20_000, 12_000] as const, [9000, 40_000] as const]) {
      const [small, large] = (['A4', 'A3'] as const).map((paper) => paperPlan({ lengthsMm, margins, footPx: 34 }, paper))
      expect(large!.reduction).toBeLessThanOrEqual(small!.reduction)
    }
  })

  it('lays the paper as asked, at a scale no larger than the best, and takes the best when nothing is asked', () => {
    for (const lengthsMm of [[6000, 4500] as const, [20_000, 12_000] as const, [9000, 40_000] as const]) {
      const subject = { lengthsMm, margins, footPx: 34 }
      const [best, wide, high] = (['either', 'landscape', 'portrait'] as const).map((turn) => paperPlan(subject, 'A4', turn))
      expect([wide!.isLandscape, high!.isLandscape]).toEqual([true, false])
      expect(best!.reduction).toBe(Math.min(wide!.reduction, high!.reduction))
    }
  })

  it('refuses a floor that no scale brings onto the paper', () => {
    expect(() => paperPlan({ lengthsMm: [1e9, 1e9], margins, footPx: 34 }, 'A4')).toThrow(/1 : 50 000/)
  })
})

describe('levelOnPaper and panelOnPaper', () => {
  it('draws every counted block at the stated scale', () => {
    const { node, plan } = levelOnPaper('t', panels, { paper: 'A3' }, 'Level L1')
    const counted = panels.reduce((sum, { layout }) => sum + layout!.blocks.length, 0)
    expect(blocksIn(node)).toHaveLength(counted)
    const { block } = file.schemes.find(({ kind }) => kind === 'ribbed') as { block: { length: number; width: number } }
    const side = widthMm(blocksIn(node)[0]!) * plan.reduction
    expect([block.length, block.width].some((length) => Math.abs(side - length) < 1.5)).toBe(true)
  })

  it('draws one panel larger, with its ribs, sizes and clear lengths', () => {
    const whole = levelOnPaper('t', panels, { paper: 'A4' }, 'Level L1')
    const { node, plan } = panelOnPaper('t', panels[0]!, 100, { paper: 'A4' }, 'Panel P1')
    expect(plan.reduction).toBeLessThan(whole.plan.reduction)
    expect(blocksIn(node)).toHaveLength(panels[0]!.layout!.blocks.length)
    const texts = nodesOf(node).flatMap(({ tag, children }) => (tag === 'text' ? children.map(String) : []))
    const { outline } = panels[0]!.panel
    const across = Math.abs(outline[1]![0] - outline[0]![0])
    expect(texts).toContain(across.toLocaleString('en'))
    const centres = nodesOf(node).find(({ attributes }) => attributes['class'] === 'rib-centres')!
    expect(String(centres.attributes['d']).split('M')).toHaveLength(panels[0]!.layout!.ribLines.length + 1)
  })
})
