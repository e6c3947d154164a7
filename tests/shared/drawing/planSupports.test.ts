import { describe, expect, it } from 'vitest'
import { panel } from '../../../shared/contracts/appraisal'
import { labelPlace } from '../../../shared/drawing/labelPlace'
import { panelDrawing } from '../../../shared/drawing/panelDrawing'
import { planSupports } from '../../../shared/drawing/planSupports'
import type { Ring } from '../../../shared/contracts/appraisal'
import { rectangleRing } from '../../../shared/layout/edit/rectangle'

const scale = { pxPerMm: 1, originPx: [0, 0], originMm: [0, 0] } as const
const aPanel = (mark: string, outline: Ring) =>
  panel.parse({ mark, outline, edges: [{ supportWidth: 200, continuity: 'discontinuous' }], ribDirection: 0 })
const segmentsOf = (d: unknown) => String(d).split('M').filter(Boolean)

describe('planSupports', () => {
  it('draws a shared support line once and no face along it', () => {
    const node = planSupports(
      [aPanel('P1', rectangleRing([0, 0], 1000, 1000)), aPanel('P2', rectangleRing([1000, 0], 1000, 1000))],
      scale,
    )
    const [lines, faces] = node.children.map((child) => (typeof child === 'string' ? [] : segmentsOf(child.attributes['d'])))
    expect(lines).toHaveLength(7)
    expect(faces).toHaveLength(6)
    expect(faces).not.toContain('1000 0L1000 -1000')
  })

  it('draws the face of the part of an edge that no neighbour shares', () => {
    const node = planSupports(
      [aPanel('P1', rectangleRing([0, 0], 1000, 3000)), aPanel('P2', rectangleRing([1000, 0], 1000, 1000))],
      scale,
    )
    const faces = typeof node.children[1] === 'object' ? segmentsOf(node.children[1].attributes['d']) : []
    expect(faces).toContain('1100 -1000L1100 -3100')
  })
})

describe('labelPlace', () => {
  it('stands in the middle of a plain panel and outside a void', () => {
    const outline = rectangleRing([0, 0], 6000, 6000)
    expect(labelPlace(outline, []).place).toEqual([3000, 3000])
    const ring = rectangleRing([2000, 2000], 2000, 2000)
    const { place, roomMm } = labelPlace(outline, [ring])
    expect(place[0] > 2000 && place[0] < 4000 && place[1] > 2000 && place[1] < 4000).toBe(false)
    expect(roomMm).toBeGreaterThan(500)
  })

  it('stands inside an L whose middle is outside', () => {
    const outline: Ring = [
      [0, 0],
      [6000, 0],
      [6000, 1500],
      [1500, 1500],
      [1500, 6000],
      [0, 6000],
    ]
    expect(labelPlace(outline, []).roomMm).toBeGreaterThan(0)
  })
})

describe('panelDrawing', () => {
  it('gives the place of every edge’s fields, pointing away from the panel', () => {
    const given = {
      panel: aPanel('P1', rectangleRing([0, 0], 4000, 3000)),
      kind: 'solid',
      layout: null,
      isCounted: true,
      isBothWays: false,
    } as const
    const margins = { left: 100, right: 100, top: 50, bottom: 50 }
    const { edges } = panelDrawing({ id: 't', panel: given, fit: { widthPx: 600, mostHeightPx: 600 }, margins, trimmerMm: 0 })
    expect(edges.map(({ outward }) => outward.map((each) => Math.round(each) + 0))).toEqual([
      [0, 1],
      [1, 0],
      [0, -1],
      [-1, 0],
    ])
    expect(edges[0]!.middlePx).toEqual([300, 350])
  })
})
