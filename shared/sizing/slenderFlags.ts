import type { CodeBasis } from './codeBasis'
import { figure } from './figure'
import { type Finding, isMet } from './finding'

type TabulatedSpanDepth = Pick<CodeBasis, 'greatestTabulatedSpanDepth'>

/**
 * A warning where a panel passes the span to depth rule only far below the steel ratios for which values are tabulated.
 *
 * Source: project rule, a floor that leans on the end of a formula says so; by the basis, `greatestTabulatedSpanDepth`
 */
export function slenderFlags(findings: readonly Finding[], { greatestTabulatedSpanDepth }: TabulatedSpanDepth): string[] {
  const passing = findings.filter(({ name, demand, capacity }) => name === 'deflection' && isMet(demand, capacity))
  const greatest = Math.max(0, ...passing.map(({ demand }) => demand))
  if (greatest <= greatestTabulatedSpanDepth) return []
  return [
    `span to depth ${figure(greatest)} passes the expression only by its low steel ratio; tabulated values end at ` +
      `${greatestTabulatedSpanDepth}: an engineer should calculate the deflection`,
  ]
}
