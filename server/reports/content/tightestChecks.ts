import { isTighter } from '#shared/calculation/tightestPanel'
import type { Check } from '#shared/contracts/appraisalResult'
import { CHECK_NAMES } from './checkNames'

/** Failing checks listed at most; the report says how many there are in all. */
const MOST_FAILING = 200

/** The tightest check of each kind, in the order of the kinds, then the other failing ones, worst first. */
export function tightestChecks(checks: readonly Check[]): Check[] {
  const byKind = new Map<Check['name'], Check>()
  for (const check of checks) {
    const tightest = byKind.get(check.name)
    if (!tightest || isTighter(check, tightest)) byKind.set(check.name, check)
  }
  const order = Object.keys(CHECK_NAMES)
  const tightest = [...byKind.values()].sort((a, b) => order.indexOf(a.name) - order.indexOf(b.name))
  const failing = checks
    .filter((check) => !check.pass && !tightest.includes(check))
    .sort((a, b) => b.utilisation - a.utilisation)
    .slice(0, MOST_FAILING)
  return [...tightest, ...failing]
}
