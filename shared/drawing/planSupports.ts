import type { Panel } from '../contracts/appraisal'
import type { Point } from '../geometry/point'
import { edgeOfRing } from '../geometry/ring'
import { offsetRing } from '../geometry/offsetRing'
import { edgeRecords } from '../layout/edit/edgeRecords'
import { meetingEdges } from '../layout/edit/meetingEdges'
import type { PlanScale } from './planScale'
import { toPx } from './planScale'
import type { SvgNode } from './svgNode'
import { svgNode } from './svgNode'

/**
 * Lines of a level's supports: dash-dot on every support line, full where an edge is free, and the floor's outer face, half
 * a support outside the line, wherever no neighbour stands.
 */
export function planSupports(panels: readonly Panel[], scale: PlanScale): SvgNode {
  const lines: string[] = []
  const faces: string[] = []
  panels.forEach((panel, p) => {
    const records = edgeRecords(panel)
    const outer = offsetRing(
      panel.outline,
      records.map(({ supportWidth }) => -supportWidth / 2),
    ).moved
    records.forEach(({ supportWidth }, e) => {
      const met = meetingEdges(panels, p, e)
      if (met.length > 0) {
        if (met.every(({ panel: other }) => other > p)) lines.push(segment(scale, edgeOfRing(panel.outline, e)))
        return
      }
      if (supportWidth > 0) lines.push(segment(scale, edgeOfRing(panel.outline, e)))
      faces.push(segment(scale, [outer[e]!.start, outer[e]!.end]))
    })
  })
  return svgNode('g', { class: 'plan-supports' }, [
    svgNode('path', {
      d: lines.join(''),
      fill: 'none',
      stroke: 'var(--ink)',
      'stroke-width': 0.75,
      'stroke-dasharray': '10 3 2 3',
    }),
    svgNode('path', { d: faces.join(''), fill: 'none', stroke: 'var(--ink)', 'stroke-width': 1.5, 'stroke-linecap': 'square' }),
  ])
}

function segment(scale: PlanScale, [a, b]: readonly [Point, Point]): string {
  return `M${toPx(scale, a).join(' ')}L${toPx(scale, b).join(' ')}`
}
