import type { ApiIssue } from '../../contracts/apiError'
import type { Panel } from '../../contracts/appraisal'
import { areaOutside, commonArea, isMoreThanSliver } from '../../geometry/overlap'
import { signedArea } from '../../geometry/ring'
import { OutOfScopeError } from '../../outOfScope'
import type { ClearOutline } from '../clearOutline'
import { clearOutline } from '../clearOutline'
import { ringIssue } from './ringIssue'

/**
 * Geometric rules of one panel: outline, edges, clear outline, voids.
 *
 * @param path - of the panel, as `levels.0.panels.2`
 */
export function checkPanel(panel: Panel, path: string): ApiIssue[] {
  const outline = ringIssue(panel.outline, `${path}.outline`)
  const edges = edgeIssues(panel, path)
  const rings = panel.voids.map((ring, i) => ringIssue(ring, `${path}.voids.${i}`))
  const own = [outline, ...edges, ...rings].filter((issue) => issue !== null)
  if (own.length > 0) return own
  try {
    return voidIssues(panel, clearOutline(panel), path)
  } catch (error) {
    if (!(error instanceof OutOfScopeError)) throw error
    return [{ path: `${path}.${error.path}`, message: error.expected }]
  }
}

function edgeIssues({ edges, outline }: Panel, path: string): ApiIssue[] {
  const free = edges.flatMap(({ continuity, supportWidth }, i) =>
    continuity === 'free' && supportWidth !== 0
      ? [
          {
            path: `${path}.edges.${i}.supportWidth`,
            message: `a free edge has no support: expected 0 instead of ${supportWidth}`,
          },
        ]
      : [],
  )
  if (edges.length === 1 || edges.length === outline.length) return free
  const message = `${edges.length} edges for ${outline.length} sides: expected 1 edge that serves all sides, or ${outline.length}`
  return [{ path: `${path}.edges`, message }, ...free]
}

/** Voids lie inside the clear outline and apart, and leave some floor. */
function voidIssues({ voids }: Panel, clear: ClearOutline, path: string): ApiIssue[] {
  const issues = voids.flatMap((ring, i): ApiIssue[] => {
    if (isMoreThanSliver(areaOutside(ring, clear.ring), ring, ring))
      return [
        { path: `${path}.voids.${i}`, message: 'the void reaches past the support faces: expected it inside the clear outline' },
      ]
    const other = voids.findIndex((each, j) => j < i && isMoreThanSliver(commonArea(each, ring), each, ring))
    if (other < 0) return []
    return [{ path: `${path}.voids.${i}`, message: `the void lies over void ${other} of the panel: expected voids apart` }]
  })
  if (issues.length > 0 || voids.length === 0) return issues
  const left = signedArea(clear.ring) - voids.reduce((sum, ring) => sum + signedArea(ring), 0)
  if (isMoreThanSliver(left, clear.ring, clear.ring)) return []
  return [{ path: `${path}.voids`, message: 'the voids take the whole panel: expected some floor to be left' }]
}
