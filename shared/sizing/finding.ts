import type { Check } from '../contracts/appraisalResult'

/** A check of one panel before it is stamped with level and panel; its working is written only when it is shown. */
export interface Finding {
  readonly name: Check['name']
  /** Where in the panel, as 'midspan' or 'edge 2, rib'; with the name, and the order among equals, it tells a check from all others. */
  readonly place: () => string
  readonly clause: string
  readonly demand: number
  readonly capacity: number
  readonly unit: string
  readonly working: () => string
}

/** Where a check is made, and the bars it is made for; asked only when shown. */
export interface Where {
  readonly place: () => string
  readonly bars: () => string
}

/** Utilisation shown where something is demanded and nothing is there; JSON has no infinity. */
const NOTHING_PROVIDED = 999

/** A utilisation this little over 1 is rounding of floating point. */
const ROUNDING = 1e-9

/**
 * Demand over capacity; for minima, what is required over what is provided.
 *
 * Source: project rule, engine design section 9 (pass means utilisation ≤ 1)
 * @returns 999 where the capacity is 0 and the demand is not
 */
export function utilisationOf(demand: number, capacity: number): number {
  if (demand <= 0) return 0
  return capacity > 0 ? Math.min(demand / capacity, NOTHING_PROVIDED) : NOTHING_PROVIDED
}

/**
 * Whether a demand is met.
 *
 * Source: project rule, engine design section 9
 */
export function isMet(demand: number, capacity: number): boolean {
  return utilisationOf(demand, capacity) <= 1 + ROUNDING
}

/**
 * The check row of the appraisal that a finding makes.
 *
 * Source: project rule, engine design section 9, contract `check`
 */
export function checkRow(finding: Finding, level: string, panel: string): Check {
  const { name, clause, demand, capacity, unit } = finding
  const utilisation = utilisationOf(demand, capacity)
  const pass = isMet(demand, capacity)
  return { level, panel, name, clause, demand, capacity, unit, utilisation, pass, working: finding.working() }
}
