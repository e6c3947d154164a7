import type { Check } from '../contracts/appraisalResult'

/** A failing check is tighter than one that passes, whatever their utilisations; of two alike the one that uses more. */
export function isTighter(check: Check, than: Check): boolean {
  if (check.pass !== than.pass) return !check.pass
  return check.utilisation > than.utilisation
}

/**
 * Where the tightest check of a scheme stands: the panel whose calculation says most. The first of equal ones.
 * @throws RangeError when there is no check
 */
export function tightestPanel(checks: readonly Check[]): { readonly level: string; readonly panel: string } {
  const [first, ...others] = checks
  if (!first) throw new RangeError('expected at least one check')
  const { level, panel } = others.reduce((tightest, check) => (isTighter(check, tightest) ? check : tightest), first)
  return { level, panel }
}
