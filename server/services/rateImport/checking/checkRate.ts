import { itemCode } from '#shared/contracts/appraisal'
import { unitOf } from '#shared/takeoff/measurementRules'
import { refusedRow, takenRow, type CheckedRow, type Standing } from './checkedRow'
import type { FromFile, TakenFields } from './checkResource'
import { isSameUnit, orderReason, sourceOf, threeOf } from './priceFields'

/**
 * A row as a rate of the draft, by its item.
 * @param standing - the rate of that item
 */
export function checkRate(
  row: TakenFields,
  standing: (Standing & { isBuiltUp: boolean }) | undefined,
  file: FromFile,
): CheckedRow {
  const refuse = (reason: string) => refusedRow(row.row, row.code, reason)
  const item = itemCode.safeParse(row.code)
  if (!item.success) return refuse(`“${row.code}” is no item that floors are measured by`)
  const unit = row.fields.unit ?? file.defaults.unit
  if (unit === '') return refuse('missing unit')
  const measured = unitOf(item.data)
  if (!isSameUnit(unit, measured)) return refuse(`unit differs: ${item.data} is measured in ${measured}, the list has ${unit}`)
  const before = standing?.values
  const description = row.fields.description ?? before?.['description'] ?? ''
  if (description === '') return refuse('missing description')
  const prices = threeOf(row.fields)
  const reason = orderReason(prices)
  if (reason !== null) return refuse(reason)
  const isMoved = (['low', 'likely', 'high'] as const).some((level) => prices[level] !== before?.[level])
  if (standing?.isBuiltUp === true && isMoved) return refuse('the rate is built up; change its build-up or its resources')
  return takenRow(row, { description, unit: measured, ...prices, ...sourceOf(row.fields, prices, before, file) }, standing)
}
