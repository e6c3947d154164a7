import { describe, expect, it } from 'vitest'
import type { Panel } from '../../../../shared/contracts/appraisal'
import { changedWith, changeSpan } from '../../../../shared/layout/edit/changeSpan'
import { rectangleRing } from '../../../../shared/layout/edit/rectangle'
import { gridPanels } from './support/gridPanels'

function panelsAfter(outcome: ReturnType<typeof changeSpan>): Panel[] {
  if ('refused' in outcome) throw new Error(outcome.refused)
  return outcome.panels
}

describe('changeSpan', () => {
  it('moves a void whole when it lies beyond the line, and leaves one before it', () => {
    const panels = gridPanels([6000, 6000], [5000])
    panels[0]!.voids = [rectangleRing([1000, 1000], 1500, 2000)]
    panels[1]!.voids = [rectangleRing([8000, 1000], 1500, 2000)]
    const after = panelsAfter(changeSpan(panels, 0, 'x', 6600))
    expect(after[0]!.voids).toEqual(panels[0]!.voids)
    expect(after[1]!.voids).toEqual([rectangleRing([8600, 1000], 1500, 2000)])
  })

  it('refuses a length that leaves a void outside the clear outline, and says which', () => {
    const panels = gridPanels([6000, 6000], [5000])
    panels[0]!.voids = [rectangleRing([3500, 1000], 1500, 2000)]
    const outcome = changeSpan(panels, 0, 'x', 4800)
    expect(outcome).toMatchObject({ refused: expect.stringMatching(/4,800 would move this support line by 1,200: P1: the void/) })
  })

  it('refuses a length that brings the line past a corner of an L-shaped panel', () => {
    const [panel] = gridPanels([6000], [5000])
    panel!.outline = [
      [0, 0],
      [6000, 0],
      [6000, 2000],
      [3000, 2000],
      [3000, 5000],
      [0, 5000],
    ]
    panel!.edges = [panel!.edges[0]!]
    expect(changeSpan([panel!], 0, 'x', 2500)).toHaveProperty('refused')
    expect(panelsAfter(changeSpan([panel!], 0, 'x', 4000))[0]!.outline[3]).toEqual([3000, 2000])
  })

  it('names the panels on the same support line, which change too', () => {
    const panels = gridPanels([6000, 6000], [5000, 4000])
    const after = panelsAfter(changeSpan(panels, 0, 'x', 6600))
    expect(changedWith(panels, after, 0, 'x')).toEqual(['P3'])
    expect(changedWith(panels, after, 0, 'y')).toEqual([])
  })
})
