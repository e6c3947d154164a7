import { Decimal } from '#shared/pricing/decimal'
import { refusedRow, takenRow, type CheckedRow, type RowValues, type Standing } from './checkedRow'
import { resourceFacts, type FromFile, type TakenFields } from './checkResource'

/** Quotations that a resource may have. */
const MOST_QUOTATIONS = 50
const TOO_LARGE = new Decimal(1_000_000_000)

/** A resource of the draft with the quotations that stand for it. */
export interface QuotedResource extends Standing {
  readonly quotations: readonly (Standing & { readonly quotationId: string })[]
}

/** What makes a quotation the same one: resource, supplier, reference and day. */
export const quotationKey = (code: string, { supplier, reference, day }: RowValues): string =>
  JSON.stringify([code, supplier?.toLowerCase(), reference, day])

function valuesOf({ fields }: TakenFields, { defaults }: FromFile): RowValues {
  return {
    supplier: fields.supplier ?? defaults.supplier,
    price: fields.likely ?? '',
    contains: fields.contains ?? '1',
    reference: fields.reference ?? '',
    day: fields.day ?? defaults.day,
    validUntil: fields.validUntil ?? '',
  }
}

function reasonOf({ supplier, price = '', contains = '', day = '', validUntil = '' }: RowValues): string | null {
  if (supplier === '') return 'missing supplier'
  if (Number(contains) === 0) return 'content: expected a number above zero'
  if (new Decimal(price).div(contains).gte(TOO_LARGE)) return 'expected a price of one unit below 1,000,000,000'
  return validUntil !== '' && validUntil < day ? `holds until ${validUntil}, which is before the day it was quoted, ${day}` : null
}

/**
 * A row as a supplier's quotation. A code that the draft does not have becomes a resource with it.
 * @param standing - the resource of that code
 * @param newOfCode - quotations of the code that rows before this one bring
 */
export function checkQuotation(
  row: TakenFields,
  standing: QuotedResource | undefined,
  file: FromFile,
  newOfCode: number,
): CheckedRow {
  const refuse = (reason: string) => refusedRow(row.row, row.code, reason)
  const facts = resourceFacts(row, standing, file)
  if ('reason' in facts) return refuse(facts.reason)
  const values = valuesOf(row, file)
  const reason = reasonOf(values)
  if (reason !== null) return refuse(reason)
  if (standing === undefined) return takenRow(row, { ...values, ...facts }, undefined)
  const key = quotationKey(row.code, values)
  const known = standing.quotations.find((quotation) => quotationKey(row.code, quotation.values) === key)
  if (known === undefined && standing.quotations.length + newOfCode >= MOST_QUOTATIONS) {
    return refuse(`the resource has ${MOST_QUOTATIONS} quotations already`)
  }
  return takenRow(row, values, known)
}
