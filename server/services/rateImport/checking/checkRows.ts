import { setImmediate as pause } from 'node:timers/promises'
import type { ImportMatching } from '#shared/contracts/rateImport'
import type { EntityManager } from 'typeorm'
import type { InEdition } from '../../rates/buildUpPricesOf'
import { cellText } from '../reading/readRow'
import { checkQuotation, quotationKey } from './checkQuotation'
import { checkRate } from './checkRate'
import { checkResource, type FromFile, type TakenFields } from './checkResource'
import { refusedRow, type CheckedRow } from './checkedRow'
import { listRow } from './listRow'
import { readRows } from './readRows'
import { standingQuotations, standingRates, standingResources } from './standingRows'

/** Rows of a list, checked against what stands; those left out are only counted. */
export interface CheckedList {
  readonly rows: CheckedRow[]
  readonly leftOut: number
}

/** Rows checked before others get their turn. */
const CHECKED_AT_ONCE = 500

type Check = (row: TakenFields) => CheckedRow

/** Reads all rows below the heads; refused ones are checked already. */
async function readList(rowsPath: string, matching: ImportMatching) {
  const taken: TakenFields[] = []
  const refused: CheckedRow[] = []
  let heads: string[] = []
  let leftOut = 0
  for await (const read of readRows(rowsPath, matching.sheet)) {
    if (read.row === matching.headRow) heads = read.cells.map(cellText)
    if (read.row <= matching.headRow) continue
    const row = listRow(read, matching, heads)
    if (row.kind === 'leftOut') leftOut += 1
    else if (row.kind === 'refused') refused.push(refusedRow(row.row, row.code, row.reason))
    else taken.push(row)
  }
  return { taken, refused, leftOut }
}

/** Refuses the second row of the same key, and names the first. */
function onceEach(check: Check, keyOf: (row: TakenFields, checked: CheckedRow) => string, what: string): Check {
  const first = new Map<string, number>()
  return (row) => {
    const checked = check(row)
    if (checked.state === 'refused') return checked
    const key = keyOf(row, checked)
    const earlier = first.get(key)
    if (earlier !== undefined) return refusedRow(row.row, row.code, `duplicate ${what} in the file: row ${earlier} has it too`)
    first.set(key, row.row)
    return checked
  }
}

async function quotationCheck(db: EntityManager, of: InEdition, codes: readonly string[], file: FromFile): Promise<Check> {
  const standing = await standingQuotations(db, of, codes)
  const added = new Map<string, number>()
  return (row) => {
    const known = standing.get(row.code)
    const checked = checkQuotation(row, known, file, added.get(row.code) ?? 0)
    if (checked.state === 'new') added.set(row.code, (added.get(row.code) ?? 0) + 1)
    return checked
  }
}

async function checkOf(
  db: EntityManager,
  of: InEdition,
  { target }: ImportMatching,
  codes: string[],
  file: FromFile,
): Promise<Check> {
  if (target === 'quotations') {
    const check = await quotationCheck(db, of, codes, file)
    return onceEach(check, ({ code }, { after }) => quotationKey(code, after ?? {}), 'quotation')
  }
  if (target === 'rates') {
    const standing = await standingRates(db, of, codes)
    return onceEach((row) => checkRate(row, standing.get(row.code), file), ({ code }) => code, 'item') // prettier-ignore
  }
  const standing = await standingResources(db, of, codes)
  return onceEach((row) => checkResource(row, standing.get(row.code), file), ({ code }) => code, 'code') // prettier-ignore
}

/**
 * Every row of a list against the draft: new, changed, unchanged, or refused with the reason.
 * @param rowsPath - rows as the reading process wrote them
 */
export async function checkRows(
  db: EntityManager,
  of: InEdition,
  rowsPath: string,
  matching: ImportMatching,
  fileName: string,
): Promise<CheckedList> {
  const { taken, refused, leftOut } = await readList(rowsPath, matching)
  const codes = [...new Set(taken.map(({ code }) => code))]
  const check = await checkOf(db, of, matching, codes, { name: fileName, defaults: matching.defaults })
  const rows = [...refused]
  for (const [index, row] of taken.entries()) {
    if (index % CHECKED_AT_ONCE === 0) await pause()
    rows.push(check(row))
  }
  rows.sort((a, b) => a.row - b.row)
  return { rows, leftOut }
}
