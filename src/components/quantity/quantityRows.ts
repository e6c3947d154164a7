import type { ItemCode, Quantity, SchemeResult } from '#shared/contracts/appraisal'
import { itemCode } from '#shared/contracts/appraisal'
import { netRules, unitOf } from '#shared/takeoff/measurementRules'
import { formatQuantity } from '../base/formatQuantity'
import type { Pair } from '../compare/phrase'
import type { WorkSection } from './itemInWords'
import { byWorkSection, itemInWords } from './itemInWords'

/** One item as both schemes have it; null where a scheme has none. */
export interface QuantityRow {
  readonly item: ItemCode
  readonly name: string
  readonly unit: string
  readonly quantities: Pair<Quantity | null>
  readonly difference: string
}

/** Decimals that a quantity is printed with. */
export function printedDecimals(item: ItemCode): number {
  return netRules.decimals[unitOf(item)]
}

/** Items that either scheme has, by work section. */
export function quantityRows({
  ribbed,
  solid,
}: Pair<SchemeResult>): { readonly section: WorkSection; readonly rows: readonly QuantityRow[] }[] {
  const find = (scheme: SchemeResult, item: ItemCode) => scheme.quantities.find((quantity) => quantity.item === item) ?? null
  const rows = itemCode.options.flatMap((item) => {
    const quantities = { ribbed: find(ribbed, item), solid: find(solid, item) }
    if (quantities.ribbed === null && quantities.solid === null) return []
    const difference = (quantities.ribbed?.net ?? 0) - (quantities.solid?.net ?? 0)
    const printed = formatQuantity(difference, { decimals: printedDecimals(item), isSigned: true })
    return [{ item, name: itemInWords(item), unit: unitOf(item), quantities, difference: printed }]
  })
  return byWorkSection(rows)
}
