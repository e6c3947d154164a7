import type { BuildUpPrices } from '#shared/pricing/buildUpPrices'
import { buildUpRows } from './buildUpRows'
import type { ExportedEdition } from './exportedEdition'
import { gangSheet, type RowsByCode } from './gangSheet'
import { LEVEL_COLUMNS, LEVELS } from './levels'
import { editionSheet, quotationSheet, resourceSheet } from './plainSheets'
import { day, formula, number, text, type ExportedSheet, type SheetCell } from './sheetCell'

const BUILD_UP_HEADS = [
  ...[
    'item',
    'part',
    'code',
    'name',
    'quantity',
    'waste or addition %',
    'uses',
    'hours',
    'output an hour',
    'fuel',
    'fuel an hour',
  ],
  ...[...LEVELS, 'source'],
]

/** All build-ups, one below the other, and in which row each rate stands. */
function buildUpSheet({ edition }: ExportedEdition, prices: BuildUpPrices, resourceRows: RowsByCode, gangRows: RowsByCode) {
  const rows: SheetCell[][] = []
  const rowOf = new Map<string, number>()
  for (const { item, buildUp } of edition.rates) {
    if (buildUp === null) continue
    const referred = { prices, resourceRows, gangRows, currency: edition.currency }
    for (const row of buildUpRows(item, buildUp, referred, rows.length + 2)) rows.push(row)
    rowOf.set(item, rows.length + 1)
  }
  return { sheet: { name: 'build-ups', heads: BUILD_UP_HEADS, rows }, rowOf }
}

function rateSheet({ edition }: ExportedEdition, buildUpRowOf: RowsByCode): ExportedSheet {
  return {
    name: 'rates',
    heads: ['item', 'description', 'unit', ...LEVELS, 'source', 'source date'],
    rows: edition.rates.map((rate) => {
      const row = buildUpRowOf.get(rate.item)
      const prices = LEVELS.map((level) =>
        row === undefined ? number(rate[level]) : formula(`'build-ups'!${LEVEL_COLUMNS.buildUps[level]}${row}`, rate[level]),
      )
      return [text(rate.item), text(rate.description), text(rate.unit), ...prices, text(rate.source), day(rate.sourceDate)]
    }),
  }
}

/** Sheets of an edition in the order of a workbook: edition, rates, resources, gangs, build-ups, quotations. */
export function editionSheets(exported: ExportedEdition): ExportedSheet[] {
  const prices: BuildUpPrices = {
    resources: new Map(exported.resources.map((row) => [row.code, row])),
    gangs: new Map(exported.gangs.map((row) => [row.code, row])),
  }
  const resourceRows = new Map(exported.resources.map(({ code }, index) => [code, index + 2]))
  const gangs = gangSheet(exported, prices, resourceRows)
  const buildUps = buildUpSheet(exported, prices, resourceRows, gangs.rowOf)
  const rates = rateSheet(exported, buildUps.rowOf)
  const [edition, resources, quotations] = [editionSheet(exported), resourceSheet(exported), quotationSheet(exported)]
  return [edition, rates, resources, gangs.sheet, buildUps.sheet, quotations]
}
