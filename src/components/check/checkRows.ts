import type { Check, SchemeResult } from '#shared/contracts/appraisal'

/** Checks of a scheme, failing first, then the tightest. */
export function checkRows({ checks }: SchemeResult): Check[] {
  return [...checks].sort((a, b) => Number(a.pass) - Number(b.pass) || b.utilisation - a.utilisation)
}

/** The tightest check of each name, failing first. */
export function tightestOfEach(scheme: SchemeResult): Check[] {
  const seen = new Set<string>()
  return checkRows(scheme).filter(({ name }) => !seen.has(name) && seen.add(name))
}

/** What the checks say together: 'All 56 pass; the tightest is at 0.97.' or '3 of 56 fail.' */
export function checksInWords({ checks }: SchemeResult): string {
  const failing = checks.filter(({ pass }) => !pass).length
  if (checks.length === 0) return 'No check was made.'
  if (failing > 0) return `${failing} of ${checks.length} ${failing === 1 ? 'fails' : 'fail'}.`
  return `All ${checks.length} pass; the tightest is used to ${Math.max(...checks.map(({ utilisation }) => utilisation)).toFixed(2)}.`
}
