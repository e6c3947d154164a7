import type { SolidScheme } from '../../contracts/appraisal'
import { figure } from '../figure'
import { type Finding, isMet, utilisationOf } from '../finding'
import { isForThickness, THICKNESS } from './leastThickness'
import type { SlabContext } from './slabContext'

/**
 * Why a panel whose thickness was left to the engine fails: no thickness passes, and which one is shown.
 *
 * Source: project rule, a size that cannot pass says why
 */
export function hopelessThicknessFlags(
  { heightMm, given }: SlabContext,
  { thickness }: SolidScheme,
  findings: readonly Finding[],
): string[] {
  if (thickness !== 'least') return []
  const failing = findings.filter((finding) => isForThickness(finding) && !isMet(finding.demand, finding.capacity))
  if (failing.length === 0) return []
  const { least, most } = THICKNESS
  const worst = failing.reduce((a, b) => (utilisationOf(b.demand, b.capacity) > utilisationOf(a.demand, a.capacity) ? b : a))
  const shown = given ? `shown at ${figure(heightMm)} mm, where the given bars come nearest` : `shown at ${figure(heightMm)} mm`
  return [
    `no thickness from ${least} to ${most} mm passes every check of every panel: ${worst.place()} governs here ` +
      `(${worst.clause}, used to ${figure(utilisationOf(worst.demand, worst.capacity), 2)}); ${shown}`,
  ]
}
