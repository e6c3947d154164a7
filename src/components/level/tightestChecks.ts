import type { Check } from '#shared/contracts/appraisalResult'

/** The check of each kind that is used up most, tightest first. */
export function tightestChecks(checks: readonly Check[]): Check[] {
  const byName = new Map<Check['name'], Check>()
  for (const check of checks) {
    const kept = byName.get(check.name)
    if (kept === undefined || check.utilisation > kept.utilisation) byName.set(check.name, check)
  }
  return [...byName.values()].sort((a, b) => b.utilisation - a.utilisation)
}
