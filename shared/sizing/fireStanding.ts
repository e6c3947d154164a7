import { fireFlags } from './fireFlags'
import { type Finding, isMet } from './finding'

/** What the fire tables say of a panel as it is sized. */
export interface FireStanding {
  /** Longest standard period at which every fire check passes, minutes; 0 where the shortest fails. */
  readonly minutes: number
  /** What stops the next longer period and what would change it; empty at the longest. */
  readonly limits: readonly string[]
}

/** Standard periods that the tables of all bases have, minutes. */
const PERIODS = [30, 60, 90, 120, 180, 240] as const

/**
 * The longest standard period for which a panel passes its fire checks as it is, whatever its brief asks, and what stops the next.
 *
 * Source: by the basis, `slabFire` and `ribFire`; project rule, the table's answer and what would change it (engine design section 4)
 * @param findingsAt - every fire check of the panel for a period in minutes
 */
export function fireStanding(findingsAt: (minutes: number) => readonly Finding[]): FireStanding {
  let minutes = 0
  for (const period of PERIODS) {
    const findings = findingsAt(period)
    if (!findings.every(({ demand, capacity }) => isMet(demand, capacity))) return { minutes, limits: fireFlags(findings) }
    minutes = period
  }
  return { minutes, limits: [] }
}
