import { chordsAt } from '../../../geometry/region'
import { boundsOf } from '../../../geometry/ring'
import { FIT_TOLERANCE_MM } from '../../../geometry/tolerance'
import { panelField } from '../../../layout/panelField'
import { type LineEndOnEdge, lineEndAt } from '../../bars/lineEndAt'
import type { SlabAxis, SlabPlan } from '../slabPlan'

/** A line of bars inside the clear outline, voids left out. */
export interface SlabLine {
  readonly clearMm: number
  readonly start: LineEndOnEdge
  readonly end: LineEndOnEdge
}

/**
 * Lines of bars along an axis, across a strip of the panel.
 *
 * Source: project rule, bars stop at voids and at the real outline
 * @param from - where the strip starts across the axis, as a share of the panel's clear width, 0 to 1
 * @param to - where it ends
 * @param count - of lines, each in the middle of its share of the strip
 */
export function slabLines(plan: SlabPlan, axis: SlabAxis, from: number, to: number, count: number): SlabLine[] {
  const { site, isRectangle } = plan
  if (isRectangle && site.panel.voids.length === 0) {
    const at = (end: 'start' | 'end') => ({ edge: axis.ends[end].edges[0]!, supportMm: axis.ends[end].supportMm })
    const line: SlabLine = { clearMm: axis.clearMm, start: at('start'), end: at('end') }
    return new Array<SlabLine>(count).fill(line)
  }
  const field = panelField({ ...site.panel, ribDirection: axis.angle }, site.clear, 0)
  const { minY, maxY } = boundsOf(field.outlineRing)
  const height = maxY - minY
  return Array.from({ length: count }, (_, i) => minY + height * (from + ((to - from) * (i + 0.5)) / count)).flatMap((y) =>
    chordsAt(field.free, y)
      .filter(({ start, end }) => end - start > FIT_TOLERANCE_MM)
      .map(({ start, end }) => ({
        clearMm: end - start,
        start: lineEndAt(site, field.frame.toLevel([start, y]), axis.direction),
        end: lineEndAt(site, field.frame.toLevel([end, y]), axis.direction),
      })),
  )
}
