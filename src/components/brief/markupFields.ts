import type { Markups } from '#shared/contracts/appraisal'
import type { Edition } from '#shared/contracts/rateBook'

/** A field of the markups of a project, as the brief asks for it. */
export interface MarkupField {
  readonly key: keyof Markups
  readonly label: string
  readonly unit: string
  readonly hint: string
  readonly pattern: RegExp
  readonly expected: string
}

const PERCENT = { unit: '%', pattern: /^\d{1,3}(\.\d{1,4})?$/, expected: 'expected a percentage, as 7.5' }
const AMOUNT = { pattern: /^\d{1,9}(\.\d{1,6})?$/, expected: 'expected an amount, as 2500' }

/** Markups in the order they are charged. Overheads and profit are asked for where the rates of the edition do not hold them. */
export function markupFields(edition: Edition | null, markups: Markups): MarkupField[] {
  const unit = edition?.currency ?? 'sum'
  const hasTwice = edition?.holdsOverheads === true && /[1-9]/.test(markups.overheadsAndProfitPercent)
  const overheads: MarkupField = {
    key: 'overheadsAndProfitPercent',
    label: 'Overheads and profit',
    ...PERCENT,
    hint: hasTwice ? 'The rates of this edition hold them: set this to 0.' : 'On the bill with preliminaries.',
  }
  return [
    { key: 'preliminariesPercent', label: 'Preliminaries', ...PERCENT, hint: 'On the sum of the bill.' },
    { key: 'preliminariesFixed', label: 'Preliminaries, a sum', ...AMOUNT, unit, hint: 'The same for each scheme.' },
    {
      key: 'preliminariesPerWeek',
      label: 'Preliminaries by the week',
      ...AMOUNT,
      unit,
      hint: 'For the weeks that each scheme takes its least gang, as Compare has them.',
    },
    ...(edition?.holdsOverheads === true && !hasTwice ? [] : [overheads]),
    { key: 'contingencyPercent', label: 'Contingency', ...PERCENT, hint: 'On all of this.' },
    { key: 'taxPercent', label: 'Tax', ...PERCENT, hint: 'Last, on everything above.' },
  ]
}
