import type { ImportRow } from '#shared/contracts/rateImport'

/** A value of a row and what stood there; `before` null: nothing is replaced. */
export interface RowChange {
  readonly name: string
  readonly before: string | null
  readonly after: string
}

const NAMES: Readonly<Record<string, string>> = {
  kind: 'kind',
  description: 'description',
  unit: 'unit',
  low: 'low',
  likely: 'likely',
  high: 'high',
  supplier: 'supplier',
  price: 'price',
  contains: 'units in it',
  reference: 'reference',
  day: 'quoted',
  validUntil: 'holds until',
  source: 'source',
  sourceDate: 'of',
}
const ORDER = Object.keys(NAMES)

/** What a row changes, or, where it is new or as it stands, what it says; empty values of new rows are left out. */
export function changesOf({ state, before, after }: ImportRow): RowChange[] {
  if (after === null) return []
  const names = Object.keys(after).sort((a, b) => ORDER.indexOf(a) - ORDER.indexOf(b))
  const isChange = state === 'changed' && before !== null
  return names
    .filter((name) => (isChange ? before[name] !== after[name] : after[name] !== ''))
    .map((name) => ({
      name: NAMES[name] ?? name,
      before: isChange ? (before[name] ?? '') : null,
      after: after[name] ?? '',
    }))
}
