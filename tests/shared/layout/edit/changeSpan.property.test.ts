import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { signedArea } from '../../../../shared/geometry/ring'
import { changeSpan } from '../../../../shared/layout/edit/changeSpan'
import { floorFault } from '../../../../shared/layout/edit/floorFault'
import { boxLengths } from '../../../../shared/layout/edit/rectangle'
import { findNeighbours } from '../../../../shared/layout/neighbours'
import { gridPanels } from './support/gridPanels'

const span = fc.integer({ min: 1000, max: 12_000 })
const spans = fc.array(span, { minLength: 1, maxLength: 4 })

describe('changeSpan on a grid', () => {
  it('changes the typed span on its whole grid line, no other, and leaves every joint joined', () => {
    fc.assert(
      fc.property(spans, spans, fc.nat(), fc.constantFrom('x' as const, 'y' as const), span, (xs, ys, pick, axis, length) => {
        const panels = gridPanels(xs, ys)
        const index = pick % panels.length
        const outcome = changeSpan(panels, index, axis, length)
        if ('refused' in outcome) throw new Error(outcome.refused)
        const at = axis === 'x' ? index % xs.length : Math.floor(index / xs.length)
        const expected = gridPanels(axis === 'x' ? xs.with(at, length) : xs, axis === 'y' ? ys.with(at, length) : ys)
        expect(outcome.panels).toEqual(expected)
        expect(floorFault(outcome.panels)).toBeNull()
        expect(findNeighbours({ panels: outcome.panels }).length).toBe(findNeighbours({ panels }).length)
      }),
    )
  })

  it('is taken back by typing the old length', () => {
    fc.assert(
      fc.property(spans, spans, fc.nat(), span, (xs, ys, pick, length) => {
        const panels = gridPanels(xs, ys)
        const index = pick % panels.length
        const there = changeSpan(panels, index, 'x', length)
        if ('refused' in there) throw new Error(there.refused)
        expect(changeSpan(there.panels, index, 'x', boxLengths(panels[index]!.outline)[0])).toEqual({ panels })
      }),
    )
  })
})

describe('changeSpan where two rows have grids of their own', () => {
  it('either refuses, changing nothing, or makes a floor without overlaps in which the typed panel has its length', () => {
    let refused = 0
    let taken = 0
    fc.assert(
      fc.property(spans, spans, span, span, fc.nat(), span, (below, above, depth, height, pick, length) => {
        const lower = gridPanels(below, [depth])
        const upper = gridPanels(above, [height]).map((panel) => ({
          ...panel,
          mark: `U${panel.mark}`,
          outline: panel.outline.map(([x, y]): [number, number] => [x, y + depth]),
        }))
        const panels = [...lower, ...upper]
        const index = pick % lower.length
        const outcome = changeSpan(panels, index, 'x', length)
        if ('refused' in outcome) {
          refused += 1
          expect(outcome.refused).toContain('would move this support line')
          return
        }
        taken += 1
        expect(floorFault(outcome.panels)).toBeNull()
        expect(boxLengths(outcome.panels[index]!.outline)[0]).toBe(length)
        expect(outcome.panels.every(({ outline }) => signedArea(outline) > 0)).toBe(true)
        for (let i = 0; i < index; i += 1) expect(outcome.panels[i]!.outline).toEqual(panels[i]!.outline)
      }),
      { numRuns: 300 },
    )
    expect(refused).toBeGreaterThan(0)
    expect(taken).toBeGreaterThan(refused)
  })
})
