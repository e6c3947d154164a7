import { itemCode } from '#shared/contracts/appraisal'
import type { ImportColumns, ImportField, ImportTarget, ProposedMatching } from '#shared/contracts/rateImport'
import { fieldOfHead } from './headWords'
import { proposedMark } from './proposedMark'
import { cellText, type ReadRow } from './readRow'

/** Rows in which heads are looked for. */
const HEADS_WITHIN = 40
const LOOKED_AT = 500

interface Heads {
  readonly row: number
  readonly columns: ImportColumns
}

/** Fields that the cells of a row name; of two columns for one field the first counts. */
function columnsOf({ cells }: ReadRow): ImportColumns {
  const columns: Partial<Record<ImportField, number>> = {}
  for (const [index, cell] of cells.entries()) {
    const field = typeof cell === 'string' && index < 200 ? fieldOfHead(cell) : null
    if (field !== null) columns[field] ??= index
  }
  return columns
}

/** The row that names most fields, a code and a price among them where any row does. */
function headsOf(rows: readonly ReadRow[]): Heads | null {
  const score = ({ columns }: Heads) =>
    Object.keys(columns).length + (columns.code === undefined ? 0 : 2) + (columns.likely === undefined ? 0 : 2)
  const found = rows
    .filter(({ row }) => row < HEADS_WITHIN)
    .map((row) => ({ row: row.row, columns: columnsOf(row) }))
    .filter(({ columns }) => Object.keys(columns).length >= 2)
    .sort((a, b) => score(b) - score(a) || a.row - b.row)
  return found[0] ?? null
}

function targetOf(columns: ImportColumns, below: readonly ReadRow[]): ImportTarget {
  if (columns.supplier !== undefined || columns.contains !== undefined) return 'quotations'
  const { code } = columns
  const codes = code === undefined ? [] : below.map(({ cells }) => cellText(cells[code])).filter((text) => text !== '')
  const items = codes.filter((text) => itemCode.safeParse(text).success)
  return codes.length > 0 && items.length * 2 > codes.length ? 'rates' : 'resources'
}

/** How a sheet looks as if it were to be read; null where no row of the first forty looks like heads. */
export function proposedMatching(rows: readonly ReadRow[]): ProposedMatching | null {
  const heads = headsOf(rows)
  if (heads === null) return null
  const below = rows.filter(({ row }) => row > heads.row).slice(0, LOOKED_AT)
  const { columns, row: headRow } = heads
  const prices = (['low', 'likely', 'high'] as const).flatMap((field) => columns[field] ?? [])
  const texts = below.flatMap(({ cells }) => prices.flatMap((index) => (typeof cells[index] === 'string' ? cells[index] : [])))
  return { target: targetOf(columns, below), headRow, columns, decimalMark: proposedMark(texts) }
}
