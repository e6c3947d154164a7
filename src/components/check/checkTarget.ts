import type { Check } from '#shared/contracts/appraisalResult'
import type { CheckTarget } from '#shared/sizing/cures/cure'

/** A check's row in its panel's own list, which the engine numbers from 0. @param checks - of the scheme, in the engine's order */
export function checkTarget(checks: readonly Check[], check: Check): CheckTarget {
  const { level, panel } = check
  const index = checks.filter((each) => each.level === level && each.panel === panel).indexOf(check)
  return { level, panel, index }
}
