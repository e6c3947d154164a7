import type { MarkupLine, MarkupName } from '#shared/contracts/appraisalResult'
import { formatDecimal } from '../base/formatDecimal'

const NAMES: Readonly<Record<MarkupName, string>> = {
  preliminaries: 'Preliminaries',
  preliminariesFixed: 'Preliminaries',
  preliminariesPerWeek: 'Preliminaries',
  overheadsAndProfit: 'Overheads and profit',
  contingency: 'Contingency',
  tax: 'Tax',
}

/** As 'Preliminaries, 10 %', 'Preliminaries, a sum' or 'Preliminaries, 3.50 weeks at 640'. */
export function markupInWords({ name, percent, perWeek, weeks }: MarkupLine): string {
  if (name === 'preliminariesFixed') return `${NAMES[name]}, a sum`
  if (perWeek !== undefined && weeks !== undefined)
    return `${NAMES[name]}, ${formatDecimal(weeks)} weeks at ${formatDecimal(perWeek)}`
  return `${NAMES[name]}, ${percent} %`
}

/** What it is charged on, for readers of the ledger; several schemes may have weeks of their own. */
export function markupWorking(lines: readonly MarkupLine[]): string {
  const weeks = lines.flatMap((line) => (line.weeks === undefined ? [] : [formatDecimal(line.weeks)]))
  if (weeks.length > 0) return `${[...new Set(weeks)].join(' and ')} weeks of the least gang`
  if (lines[0]?.name === 'preliminariesFixed') return 'the same sum for each scheme'
  return 'on every item, same ones included'
}

/** Its name where schemes may differ in weeks, as 'Preliminaries, by the week'. */
export function markupName(line: MarkupLine): string {
  return line.perWeek === undefined ? markupInWords(line) : `${NAMES[line.name]}, ${formatDecimal(line.perWeek)} a week`
}
