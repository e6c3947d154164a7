import type { ImportMatching } from '#shared/contracts/rateImport'
import type { ListFields } from './listRow'
import type { RowValues } from './checkedRow'

/** Low, likely and high of a row: what it leaves open is its price. */
export function threeOf({ low, likely = '', high }: ListFields): { low: string; likely: string; high: string } {
  return { low: low ?? likely, likely, high: high ?? likely }
}

/** Why three prices cannot stand together; null where they can. */
export function orderReason({ low, likely, high }: { low: string; likely: string; high: string }): string | null {
  if (Number(low) > Number(likely)) return `low price ${low} is above the price ${likely}`
  return Number(likely) > Number(high) ? `high price ${high} is below the price ${likely}` : null
}

const SAME_UNITS: readonly (readonly string[])[] = [
  ['nr', 'no', 'pc', 'pcs', 'each', 'ea', 'stk', 'st', 'stck', 'piece', 'pieces', 'unit', 'u'],
  ['m²', 'm2', 'sqm', 'qm', 'sq m'],
  ['m³', 'm3', 'cum', 'cbm', 'cu m'],
  ['h', 'hr', 'hrs', 'hour', 'hours', 'std'],
  ['t', 'tonne', 'tonnes', 'to'],
  ['l', 'ltr', 'litre', 'liter'],
  ['m', 'lm', 'rm', 'lfm'],
]

/** True of two ways to write the same unit. */
export function isSameUnit(a: string, b: string): boolean {
  const plain = (text: string) => text.toLowerCase().replace(/\./g, '').trim()
  const [first, second] = [plain(a), plain(b)]
  return first === second || SAME_UNITS.some((names) => names.includes(first) && names.includes(second))
}

/** Where a price comes from: what the row says; for a price that moves, the file; else what stands. */
export function sourceOf(
  fields: ListFields,
  prices: { low: string; likely: string; high: string },
  before: RowValues | undefined,
  file: { readonly name: string; readonly defaults: ImportMatching['defaults'] },
): { source: string; sourceDate: string } {
  const isMoved = (['low', 'likely', 'high'] as const).some((level) => prices[level] !== before?.[level])
  const standing = isMoved ? { source: file.name, sourceDate: file.defaults.day } : { source: before?.['source'] ?? '', sourceDate: before?.['sourceDate'] ?? '' } // prettier-ignore
  return {
    source: fields.source ?? standing.source,
    sourceDate: fields.sourceDate ?? (fields.source !== undefined && isMoved ? '' : standing.sourceDate),
  }
}
