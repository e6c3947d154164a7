import { figure } from './figure'
import { type Finding, isMet } from './finding'

/**
 * Span over depth that no tabulated value reaches: 30 for a lightly stressed interior span, times the greatest steel factor 1.5.
 *
 * Source: EN 1992-1-1:2004, Table 7.4N (30 seen in several encodings); factor 1.5 as in 7.4.2(2) with the cap used here
 */
const TABULATED_SPAN_DEPTH = 30 * 1.5

/**
 * A warning where a panel passes the span to depth rule only far below the steel ratios for which values are tabulated.
 *
 * Source: project rule, a floor that leans on the end of a formula says so
 */
export function slenderFlags(findings: readonly Finding[]): string[] {
  const passing = findings.filter(({ name, demand, capacity }) => name === 'deflection' && isMet(demand, capacity))
  const greatest = Math.max(0, ...passing.map(({ demand }) => demand))
  if (greatest <= TABULATED_SPAN_DEPTH) return []
  return [
    `span to depth ${figure(greatest)} passes the expression only by its low steel ratio; tabulated values end at ` +
      `${TABULATED_SPAN_DEPTH}: an engineer should calculate the deflection`,
  ]
}
