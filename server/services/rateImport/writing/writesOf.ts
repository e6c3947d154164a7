import type { ItemCode } from '#shared/contracts/appraisal'
import type { ImportTarget } from '#shared/contracts/rateImport'
import type { ResourceKind } from '#shared/contracts/resource'
import type { EntityManager } from 'typeorm'
import { RateEntity } from '../../../entities/rates/RateEntity'
import { ResourceEntity } from '../../../entities/rates/ResourceEntity'
import type { InEdition } from '../../rates/buildUpPricesOf'
import { findByCodes } from '../checking/standingRows'
import type { DraftWrite, DraftWrites, WrittenRow } from './draftWrite'
import { quotationWrites } from './quotationWrites'

/** Columns that resources and rates have in common. */
export function pricedColumns(after: WrittenRow['after']) {
  const { description = '', unit = '', low = '', likely = '', high = '', source = '', sourceDate = '' } = after ?? {}
  return { description, unit, low, likely, high, source, sourceDate: sourceDate === '' ? null : sourceDate }
}

async function resourceWrites(db: EntityManager, of: InEdition, rows: readonly WrittenRow[]): Promise<DraftWrite<'resource'>[]> {
  const found = await findByCodes(db, ResourceEntity, of, 'code', rows.map(({ code }) => code)) // prettier-ignore
  const standing = new Map(found.map((row) => [row.code, row]))
  return rows.map(({ code, after }) => {
    const before = standing.get(code) ?? null
    const version = (before?.version ?? 0) + 1
    const kind = (after?.['kind'] ?? 'material') as ResourceKind
    const columns = { ...of, code, kind, ...pricedColumns(after), quotationId: before?.quotationId ?? null, version }
    return { kind: 'resource', target: code, before, after: columns }
  })
}

async function rateWrites(db: EntityManager, of: InEdition, rows: readonly WrittenRow[]): Promise<DraftWrite<'rate'>[]> {
  const found = await findByCodes(db, RateEntity, of, 'item', rows.map(({ code }) => code)) // prettier-ignore
  const standing = new Map<string, RateEntity>(found.map((row) => [row.item, row]))
  return rows.map(({ code, after }) => {
    const before = standing.get(code) ?? null
    const version = (before?.version ?? 0) + 1
    const columns = { ...of, item: code as ItemCode, ...pricedColumns(after), buildUp: before?.buildUp ?? null, version }
    return { kind: 'rate', target: code, before, after: columns }
  })
}

/**
 * What rows change in a draft, against what stands in it at this moment.
 * @param rows - new and changed ones only
 */
export async function writesOf(
  db: EntityManager,
  of: InEdition,
  target: ImportTarget,
  rows: readonly WrittenRow[],
): Promise<DraftWrites> {
  const none: DraftWrites = { resources: [], quotations: [], rates: [] }
  if (target === 'quotations') return { ...none, ...(await quotationWrites(db, of, rows)) }
  if (target === 'rates') return { ...none, rates: await rateWrites(db, of, rows) }
  return { ...none, resources: await resourceWrites(db, of, rows) }
}
