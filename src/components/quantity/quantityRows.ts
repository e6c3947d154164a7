import type { Quantity, SchemeResult, Unit } from '#shared/contracts/appraisalResult'
import { itemCode } from '#shared/contracts/appraisal'
import { type Band, compositeItem } from '#shared/contracts/measurement'
import type { MeasurementRules } from '#shared/takeoff/measurementRules'
import { formatQuantity } from '../base/formatQuantity'
import type { Pair } from '../compare/phrase'
import { withBands } from './bandInWords'
import type { WorkSection } from './itemInWords'
import { byWorkSection, itemInWords } from './itemInWords'

/** One item, in one of its stages, as both schemes have it; null where a scheme has none. */
export interface QuantityRow {
  readonly item: Quantity['item']
  /** The item with its stages. */
  readonly key: string
  readonly name: string
  readonly unit: string
  readonly quantities: Pair<Quantity | null>
  readonly difference: string
}

/** Decimals that a quantity is printed with. */
export function printedDecimals({ unit }: { readonly unit: Unit }, { decimals }: Pick<MeasurementRules, 'decimals'>): number {
  return decimals[unit]
}

/** What tells a quantity, or a line of the bill, from all others of its scheme. */
export function quantityKey({ item, bands = [] }: { readonly item: string; readonly bands?: Quantity['bands'] }): string {
  return [item, ...bands.map((band) => JSON.stringify(band))].join(' ')
}

/** Items that either scheme has, by work section; stages of one item in the order in which they are billed. */
export function quantityRows(
  { ribbed, solid }: Pair<SchemeResult>,
  rules: MeasurementRules,
): { readonly section: WorkSection; readonly rows: readonly QuantityRow[] }[] {
  const all = [...ribbed.quantities, ...solid.quantities]
  const rows = [...compositeItem.options, ...itemCode.options].flatMap((item) => {
    const ofItem = new Map(all.filter((quantity) => quantity.item === item).map((quantity) => [quantityKey(quantity), quantity]))
    return [...ofItem]
      .sort(([, a], [, b]) => byBands(a, b))
      .map(([key, quantity]) => rowOf(key, quantity, { ribbed, solid }, rules))
  })
  return byWorkSection(rows)
}

/** The lower stage or depth first. */
function byBands({ bands: first = [] }: Quantity, { bands: second = [] }: Quantity): number {
  const startOf = (band: Band) => (band.of === 'overallDepth' ? band.mm : band.over)
  const at = first.findIndex((band, index) => startOf(band) !== startOf(second[index]!))
  return at < 0 ? 0 : startOf(first[at]!) - startOf(second[at]!)
}

function rowOf(key: string, one: Quantity, { ribbed, solid }: Pair<SchemeResult>, rules: MeasurementRules): QuantityRow {
  const find = (scheme: SchemeResult) => scheme.quantities.find((quantity) => quantityKey(quantity) === key) ?? null
  const quantities = { ribbed: find(ribbed), solid: find(solid) }
  const difference = (quantities.ribbed?.net ?? 0) - (quantities.solid?.net ?? 0)
  const { item, unit, bands } = one
  const name = withBands(itemInWords(item), bands)
  return {
    item,
    key,
    name,
    unit,
    quantities,
    difference: formatQuantity(difference, { decimals: printedDecimals(one, rules), isSigned: true }),
  }
}
