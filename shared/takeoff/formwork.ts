import { distance } from '../geometry/ring'
import { clearOutline } from '../layout/clearOutline'
import { panelEdges } from '../layout/panelEdges'
import { toM } from '../units'
import { type Expression, figure, plus } from './expression'
import type { MeasuredPanel } from './measuredPanel'
import type { MeasurementRules } from './measurementRules'
import { soffitAreaOf } from './planAreas'
import { perimeterOf } from './ringExpressions'

/** Soffit formwork of one panel, m²: a full deck between supports, large voids deducted. Propping is measured alike. */
export function soffitOf(measured: MeasuredPanel, rules: MeasurementRules): Expression {
  return soffitAreaOf(measured, rules.deductVoidsOver.soffitM2)
}

/** Edges of one panel that are formed, m: its free edges between the faces of supports, and round every void. None: null. */
export function edgesOf({ panel }: MeasuredPanel): Expression | null {
  const { faces } = clearOutline(panel)
  const freeEdges = panelEdges(panel).flatMap(({ continuity }, index) => {
    const { start, end } = faces[index]!
    return continuity === 'free' ? [figure(toM(distance(start, end)))] : []
  })
  const lengths = [...freeEdges, ...panel.voids.map(perimeterOf)]
  return lengths.length === 0 ? null : plus(...lengths)
}
