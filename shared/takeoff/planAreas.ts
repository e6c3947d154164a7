import { clearOutline } from '../layout/clearOutline'
import { toM2 } from '../units'
import { type Expression, figure, less, plus } from './expression'
import type { MeasuredPanel } from './measuredPanel'
import { areaOf } from './ringExpressions'
import { deductedVoids } from './voidsOf'

/** Plan area between the faces of supports, voids in, m². */
export function clearAreaOf({ panel, sized }: MeasuredPanel): Expression {
  return areaOf(clearOutline(panel).ring, sized.areas.clear)
}

/** Plan area between the faces of supports less voids, m²: what is formed and propped. */
export function soffitAreaOf(measured: MeasuredPanel, voidsOverM2: number): Expression {
  return less(clearAreaOf(measured), ...deductedVoids(measured, voidsOverM2))
}

/** Plan area of the floor's own concrete, m²: between supports and over walls, less voids. */
export function floorAreaOf(measured: MeasuredPanel, voidsOverM2: number): Expression {
  const { wallStrips } = measured.sized.areas
  const whole = wallStrips > 0 ? plus(clearAreaOf(measured), figure(toM2(wallStrips))) : clearAreaOf(measured)
  return less(whole, ...deductedVoids(measured, voidsOverM2))
}
