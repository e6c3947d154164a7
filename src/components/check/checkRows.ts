import type { Check, SchemeResult } from '#shared/contracts/appraisalResult'
import type { SizedPanel } from '#shared/sizing/sizedPanel'

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

/** The panel that fails most, or of those that pass the one used most. */
export function tightestPanel(panels: readonly SizedPanel[]): SizedPanel | null {
  const worst = ({ checks }: SizedPanel) => Math.max(0, ...checks.map(({ utilisation }) => utilisation))
  return panels.reduce<SizedPanel | null>((most, each) => (most === null || worst(each) > worst(most) ? each : most), null)
}

/** What the checks of a panel say: '2 of 24 checks fail' or 'all 24 checks pass, used to 0.93'. */
export function panelChecksInWords({ checks }: Pick<SizedPanel, 'checks'>): string {
  const failing = checks.filter(({ pass }) => !pass).length
  if (failing > 0) return `${failing} of ${checks.length} checks ${failing === 1 ? 'fails' : 'fail'}`
  return `all ${checks.length} checks pass, used to ${Math.max(0, ...checks.map(({ utilisation }) => utilisation)).toFixed(2)}`
}
