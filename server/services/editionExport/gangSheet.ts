import { BuildUpLookup, type BuildUpPrices } from '#shared/pricing/buildUpPrices'
import { gangHour } from '#shared/pricing/gangHour'
import type { PriceLevel, ThreeDecimals } from '#shared/pricing/threeDecimals'
import type { ExportedEdition } from './exportedEdition'
import { cached, LEVEL_COLUMNS, LEVELS } from './levels'
import { empty, formula, number, text, type ExportedSheet, type SheetCell } from './sheetCell'

/** Rows of a spreadsheet, counted from 1, by code. */
export type RowsByCode = ReadonlyMap<string, number>

/** A sheet with the rows that others refer to. */
export interface ReferredSheet {
  readonly sheet: ExportedSheet
  readonly rowOf: RowsByCode
}

const three = (cost: ThreeDecimals | undefined, at: (level: PriceLevel) => string): SheetCell[] =>
  LEVELS.map((level) => (cost === undefined ? empty : formula(at(level), cached(cost[level]))))

/**
 * Gangs, each in a row with the cost of its hour above the rows of its members, which refer to the sheet of resources; amounts stand in
 * columns E, F and G.
 */
export function gangSheet({ gangs }: ExportedEdition, prices: BuildUpPrices, resourceRows: RowsByCode): ReferredSheet {
  const rows: SheetCell[][] = []
  const rowOf = new Map<string, number>()
  for (const gang of gangs) {
    const at = rows.length + 2
    rowOf.set(gang.code, at)
    const lookup = new BuildUpLookup(prices)
    const hour = gangHour(gang, lookup, gang.code)
    const sum = (level: PriceLevel) => {
      const column = LEVEL_COLUMNS.gangs[level]
      return `SUM(${column}${at + 1}:${column}${at + gang.members.length})`
    }
    rows.push([text(gang.code), text(gang.description), empty, empty, ...three(hour?.cost, sum)])
    for (const [index, { resource, count }] of gang.members.entries()) {
      const cost = gangHour({ description: '', members: [{ resource, count }] }, lookup, gang.code)?.cost
      const from = (level: PriceLevel) =>
        `D${at + 1 + index}*resources!${LEVEL_COLUMNS.resources[level]}${resourceRows.get(resource) ?? 0}`
      rows.push([text(gang.code), empty, text(resource), number(count), ...three(cost, from)])
    }
  }
  return { sheet: { name: 'gangs', heads: ['gang', 'description', 'resource', 'count', ...LEVELS], rows }, rowOf }
}
