import { chordsAt } from '../../../geometry/region'
import { boundsOf } from '../../../geometry/ring'
import { FIT_TOLERANCE_MM } from '../../../geometry/tolerance'
import type { PanelField } from '../../../layout/panelField'
import { type LineEndOnEdge, lineEndAt } from '../../bars/lineEndAt'
import type { SlabAxis, SlabPlan } from '../slabPlan'

/** A line of bars inside the clear outline, voids left out. */
export interface SlabLine {
  readonly clearMm: number
  /** From support to support, voids passed over, mm. */
  readonly fullMm: number
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
    const line: SlabLine = { clearMm: axis.clearMm, fullMm: axis.clearMm, start: at('start'), end: at('end') }
    return new Array<SlabLine>(count).fill(line)
  }
  const field = plan.fieldAlong(axis)
  return lineLevels(field, from, to, count).flatMap((y) => linesAt(plan, axis, field, y).map(({ line }) => line))
}

/**
 * Levels of the lines that lie across a strip, mm in the field's frame.
 *
 * Source: project rule, each line in the middle of its share of the strip
 */
export function lineLevels({ outlineRing }: PanelField, from: number, to: number, count: number): number[] {
  const { minY, maxY } = boundsOf(outlineRing)
  return Array.from({ length: count }, (_, i) => minY + (maxY - minY) * (from + ((to - from) * (i + 0.5)) / count))
}

/** A line of bars with where it lies in the field's frame, mm. */
export interface PlacedLine {
  readonly line: SlabLine
  readonly from: number
  readonly to: number
}

/**
 * The lines of bars at one level, voids left out.
 *
 * Source: geometry
 */
export function linesAt({ site }: SlabPlan, axis: SlabAxis, field: PanelField, y: number): PlacedLine[] {
  const full = chordsAt(field.clear, y)
  return chordsAt(field.free, y)
    .filter(({ start, end }) => end - start > FIT_TOLERANCE_MM)
    .map(({ start, end }) => {
      const around = full.find((chord) => chord.start <= end && chord.end >= start)
      const line = {
        clearMm: end - start,
        fullMm: around ? around.end - around.start : end - start,
        start: lineEndAt(site, field.frame.toLevel([start, y]), axis.direction),
        end: lineEndAt(site, field.frame.toLevel([end, y]), axis.direction),
      }
      return { line, from: start, to: end }
    })
}
