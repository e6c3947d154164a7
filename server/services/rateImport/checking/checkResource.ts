import { resourceCode } from '#shared/contracts/buildUp'
import type { ImportMatching } from '#shared/contracts/rateImport'
import { refusedRow, takenRow, type CheckedRow, type Standing } from './checkedRow'
import type { ListFields } from './listRow'
import { isSameUnit, orderReason, sourceOf, threeOf } from './priceFields'
import { readKind } from './readKind'

/** A row of a list with fields. */
export interface TakenFields {
  readonly row: number
  readonly code: string
  readonly fields: ListFields
  readonly notes: readonly string[]
}

/** The file that rows come from, for those that say less than they must. */
export interface FromFile {
  readonly name: string
  readonly defaults: ImportMatching['defaults']
}

/** What a resource is, or why it cannot be: kind, description, unit. */
export function resourceFacts(
  { code, fields }: TakenFields,
  standing: Standing | undefined,
  { defaults }: FromFile,
): { kind: string; description: string; unit: string } | { reason: string } {
  if (!resourceCode.safeParse(code).success) return { reason: `code “${code}”: expected letters, digits, spaces and . _ / -` }
  const before = standing?.values
  const kind = fields.kind === undefined ? (before?.['kind'] ?? defaults.kind) : readKind(fields.kind)
  if (kind === null) return { reason: `kind “${fields.kind ?? ''}”: expected material, labour or plant` }
  if (before !== undefined && kind !== before['kind'])
    return { reason: `kind differs: the edition has ${before['kind']}, the list ${kind}` }
  const unit = fields.unit ?? defaults.unit
  if (unit === '') return { reason: 'missing unit' }
  if (before !== undefined && !isSameUnit(unit, before['unit'] ?? '')) {
    return { reason: `unit differs: the edition has ${before['unit']}, the list ${unit}` }
  }
  if (kind !== 'material' && !isSameUnit(unit, 'h')) return { reason: `unit ${unit}: ${kind} is priced by the hour, h` }
  const description = fields.description ?? before?.['description'] ?? ''
  if (description === '') return { reason: 'missing description' }
  return { kind, description, unit: before?.['unit'] ?? (kind === 'material' ? unit : 'h') }
}

/**
 * A row as a resource of the draft.
 * @param standing - the resource of that code
 */
export function checkResource(
  row: TakenFields,
  standing: (Standing & { hasChosen: boolean }) | undefined,
  file: FromFile,
): CheckedRow {
  const facts = resourceFacts(row, standing, file)
  if ('reason' in facts) return refusedRow(row.row, row.code, facts.reason)
  const prices = threeOf(row.fields)
  const reason = orderReason(prices)
  if (reason !== null) return refusedRow(row.row, row.code, reason)
  const before = standing?.values
  const isMoved = (['low', 'likely', 'high'] as const).some((level) => prices[level] !== before?.[level])
  if (standing?.hasChosen === true && isMoved) {
    return refusedRow(
      row.row,
      row.code,
      'its price is that of the quotation chosen for it; choose none first, or import quotations',
    )
  }
  return takenRow(row, { ...facts, ...prices, ...sourceOf(row.fields, prices, before, file) }, standing)
}
