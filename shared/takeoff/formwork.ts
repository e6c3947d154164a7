import { offsetRing } from '../geometry/offsetRing'
import { distance } from '../geometry/ring'
import { panelEdges } from '../layout/panelEdges'
import { toM } from '../units'
import { type Expression, figure, plus, times } from './expression'
import type { MeasuredPanel } from './measuredPanel'
import type { MeasurementRules } from './measurementRules'
import { soffitAreaOf } from './planAreas'
import { perimeterOf } from './ringExpressions'

/** Soffit formwork of one panel, m²: a full deck between supports, large voids deducted. Propping is measured alike. */
export function soffitOf(measured: MeasuredPanel, rules: MeasurementRules): Expression {
  return soffitAreaOf(measured, rules.deductVoidsOver.soffitM2)
}

/**
 * Edges of one panel that are formed, m: its free edges as far as the floor's own concrete goes (to the faces of beams, over walls to
 * the centre-line, or to the outer face where no other panel shares the wall), and round every void. None: null.
 */
export function edgesOf({ panel, sharedEdges }: MeasuredPanel): Expression | null {
  const edges = panelEdges(panel)
  const inwardsMm = edges.map(({ kind, supportWidth }, index) => {
    if (kind === 'beam') return supportWidth / 2
    return sharedEdges[index] ? 0 : -supportWidth / 2
  })
  const { moved } = offsetRing(panel.outline, inwardsMm)
  const freeEdges = moved.filter((_, index) => edges[index]!.continuity === 'free')
  const lengths = [...freeEdges.map(({ start, end }) => figure(toM(distance(start, end)))), ...panel.voids.map(perimeterOf)]
  return lengths.length === 0 ? null : plus(...lengths)
}

/** The same edges by their area, m²: length × depth of the floor. None: null. */
export function deepEdgesOf(measured: MeasuredPanel): Expression | null {
  const length = edgesOf(measured)
  return length && times(length, figure(toM(measured.sized.depth)))
}
