import type { ApiIssue } from '../../contracts/apiError'
import type { Level } from '../../contracts/appraisal'
import { commonArea, isMoreThanSliver } from '../../geometry/overlap'
import { boundsOf, boundsOverlap } from '../../geometry/ring'

/**
 * Panels of a level that lie over each other, by more than a sliver. One issue a pair, on the later panel.
 *
 * @param path - of the level, as `levels.0`
 */
export function checkOverlaps({ panels }: Pick<Level, 'panels'>, path: string): ApiIssue[] {
  const bounds = panels.map(({ outline }) => boundsOf(outline))
  const order = panels.map((_, i) => i).sort((a, b) => bounds[a]!.minX - bounds[b]!.minX)
  const found: { panel: number; other: number; areaMm2: number }[] = []
  order.forEach((first, position) => {
    for (let next = position + 1; next < order.length; next += 1) {
      const second = order[next]!
      if (bounds[second]!.minX >= bounds[first]!.maxX) break
      if (!boundsOverlap(bounds[first]!, bounds[second]!, 0)) continue
      const [a, b] = [panels[first]!.outline, panels[second]!.outline]
      const areaMm2 = commonArea(a, b)
      if (isMoreThanSliver(areaMm2, a, b)) found.push({ panel: Math.max(first, second), other: Math.min(first, second), areaMm2 })
    }
  })
  return found
    .sort((a, b) => a.panel - b.panel || a.other - b.other)
    .map(({ panel, other, areaMm2 }) => ({
      path: `${path}.panels.${panel}.outline`,
      message: `panel ${panels[panel]!.mark} lies over panel ${panels[other]!.mark} by ${(areaMm2 / 1e6).toFixed(3)} m²: expected panels side by side`,
    }))
}
