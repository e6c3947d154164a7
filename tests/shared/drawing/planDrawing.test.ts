import { readFileSync } from 'node:fs'
import { describe, expect, it } from 'vitest'
import { appraiseInFull } from '../../../shared/appraise'
import { appraisalFile } from '../../../shared/contracts/appraisal'
import { planLayers, planPanels, planSvg } from '../../../shared/drawing/planDrawing'
import type { PlanPanel } from '../../../shared/drawing/planPanel'
import { placePlan, toMm, toPx } from '../../../shared/drawing/planScale'
import type { SvgNode } from '../../../shared/drawing/svgNode'
import { signedArea } from '../../../shared/geometry/ring'

const file = appraisalFile.parse(
  JSON.parse(readFileSync(new URL('../../../shared/examples/tarn-court.json', import.meta.url), 'utf8')),
)
const full = appraiseInFull(file)
const level = file.levels[0]!
const ribbed = full.sized.find(({ kind }) => kind === 'ribbed')!
const solid = full.sized.find(({ kind }) => kind === 'solid')!
const drawn = planPanels(level, ribbed, 'ribbed')
const layersOf = (panels: readonly PlanPanel[]) => planLayers({ id: 't', panels, fit: { widthPx: 736, mostHeightPx: 560 } })

function nodesOf(node: SvgNode): SvgNode[] {
  return [node, ...node.children.flatMap((child) => (typeof child === 'string' ? [] : nodesOf(child)))]
}
const withClass = (node: SvgNode, name: string) =>
  nodesOf(node).filter(({ attributes }) =>
    String(attributes['class'] ?? '')
      .split(' ')
      .includes(name),
  )
const pointsOf = (node: SvgNode) =>
  String(node.attributes['points'])
    .split(' ')
    .map((pair) => pair.split(',').map(Number) as [number, number])

describe('planLayers', () => {
  it('draws exactly the blocks that the bill counts, panel by panel', () => {
    const svg = planSvg(layersOf(drawn), level.panels, 'Plan')
    const result = full.appraisal.schemes.find(({ kind }) => kind === 'ribbed')!
    const ofLevel = result.panels.filter((each) => each.level === level.mark)
    for (const { mark, blocksWhole, blocksCut } of ofLevel) {
      const own = withClass(svg, 'block').filter(({ attributes }) => attributes['data-panel'] === mark)
      expect(own.length).toBe(blocksWhole + blocksCut)
    }
    const net = result.quantities.find(({ item }) => item === 'blocks.whole')!
    const inBill = net.parts.filter((part) => part.level === level.mark).reduce((sum, { value }) => sum + value, 0)
    expect(withClass(svg, 'block').length * level.repeat).toBe(inBill)
  })

  it('draws them to scale: each block has the area of a block', () => {
    const layers = layersOf(drawn)
    const whole = nodesOf(layers.panels[0]!).filter(({ attributes }) => attributes['class'] === 'block')
    const { pxPerMm } = layers.scale
    const { length, width } = (file.schemes.find(({ kind }) => kind === 'ribbed') as { block: { length: number; width: number } })
      .block
    for (const block of whole) {
      const areaMm2 = Math.abs(signedArea(pointsOf(block))) / pxPerMm ** 2
      expect(areaMm2 / (length * width)).toBeCloseTo(1, 1)
    }
  })

  it('draws a level of many blocks as one path a panel with one subpath a block', () => {
    const many = Array.from({ length: 40 }, (_, i) => ({
      ...drawn[0]!,
      panel: { ...drawn[0]!.panel, mark: `Q${i}` },
    }))
    const layers = layersOf(many)
    const paths = layers.panels.flatMap((node) => withClass(node, 'blocks'))
    expect(layers.panels.flatMap((node) => withClass(node, 'block'))).toEqual([])
    expect(paths).toHaveLength(40)
    for (const { attributes } of paths) {
      expect(String(attributes['d']).match(/M/g)).toHaveLength(drawn[0]!.layout!.blocks.length)
      expect(attributes['data-blocks']).toBe(drawn[0]!.layout!.blocks.length)
    }
  })

  it('draws a panel that was left out empty and dashed', () => {
    const layers = layersOf([{ ...drawn[0]!, isCounted: false }])
    expect(withClass(layers.panels[0]!, 'block')).toEqual([])
    expect(nodesOf(layers.panels[0]!).some(({ attributes }) => attributes['stroke-dasharray'] !== undefined)).toBe(true)
  })

  it('marks a two-way panel with two pairs of arrows, a ribbed one with one', () => {
    const arrows = (panels: readonly PlanPanel[]) => {
      const [mark] = withClass(layersOf(panels).marks, 'span-mark')
      return nodesOf(mark!).filter(({ tag }) => tag === 'path').length
    }
    const first = planPanels(level, solid, 'solid')[0]!
    expect(first.isBothWays).toBe(true)
    expect(arrows([first])).toBe(4)
    expect(arrows([drawn[0]!])).toBe(2)
  })

  it('names the grid and writes each span once, the whole outermost', () => {
    const svg = planSvg(layersOf(drawn), level.panels, 'Plan')
    const bubbles = withClass(svg, 'grid-bubble').flatMap((node) =>
      nodesOf(node).flatMap(({ tag, children }) => (tag === 'text' ? children : [])),
    )
    expect(bubbles).toEqual(['1', '2', '3', '4', '5', 'a', 'b', 'c'])
    const figures = withClass(svg, 'dimension-chain').map((chain) =>
      nodesOf(chain).flatMap(({ tag, children }) => (tag === 'text' ? children : [])),
    )
    expect(figures).toContainEqual(['6,600', '6,600', '6,600', '6,000'])
    expect(figures).toContainEqual(['25,800'])
    expect(figures).toContainEqual(['4,500', '1,500'])
  })

  it('has ground to draw on for a level without a panel', () => {
    const layers = planLayers({ id: 't', panels: [], fit: { widthPx: 600, mostHeightPx: 400 }, aroundMm: 8000 })
    expect(layers.scale.pxPerMm).toBeGreaterThan(0)
  })
})

describe('planScale', () => {
  it('fits the floor into the width and turns y about', () => {
    const margins = { left: 50, right: 10, top: 20, bottom: 30 }
    const { scale, heightPx } = placePlan({ minX: 0, minY: 0, maxX: 10_000, maxY: 5000 }, margins, {
      widthPx: 260,
      mostHeightPx: 1000,
    })
    expect(scale.pxPerMm).toBeCloseTo(0.02, 12)
    expect(heightPx).toBe(150)
    expect(toPx(scale, [0, 0])).toEqual([50, 120])
    expect(toPx(scale, [10_000, 5000])).toEqual([250, 20])
    expect(toMm(scale, [250, 20])).toEqual([10_000, 5000])
  })
})
