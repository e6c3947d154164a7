import type { ResourceKind } from '#shared/contracts/resource'
import type { EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { QuotationEntity } from '../../../entities/rates/QuotationEntity'
import { ResourceEntity } from '../../../entities/rates/ResourceEntity'
import type { InEdition } from '../../rates/buildUpPricesOf'
import { quotedPrice, todayUtc } from '../../rates/quotedPrice'
import { findByCodes } from '../checking/standingRows'
import type { DraftWrite, WrittenRow } from './draftWrite'

function quotationOf(of: InEdition, { code, after }: WrittenRow, before: QuotationEntity | null): QuotationEntity {
  const { supplier = '', price = '', contains = '', reference = '', day = '', validUntil = '' } = after ?? {}
  const own = { supplier, price, contains, reference, day, validUntil: validUntil === '' ? null : validUntil }
  return { ...of, id: before?.id ?? v7(), resource: code, ...own, version: (before?.version ?? 0) + 1 }
}

/** What a resource takes over from the quotation chosen for it. */
function takenOver(chosen: QuotationEntity, all: readonly QuotationEntity[]) {
  const { supplier, reference, day } = chosen
  const source = reference === '' ? supplier : `${supplier}, ${reference}`
  return { ...quotedPrice(chosen, all, todayUtc()), source, sourceDate: day, quotationId: chosen.id }
}

/** The resource as its quotations leave it; null where it does not take its price from one. */
function resourceWrite(
  of: InEdition,
  first: WrittenRow,
  standing: ResourceEntity | undefined,
  all: readonly QuotationEntity[],
): DraftWrite<'resource'> | null {
  const { code, after } = first
  const chosen = standing === undefined ? all[0] : all.find(({ id }) => id === standing.quotationId)
  if (chosen === undefined) return null
  const { kind = 'material', description = '', unit = '' } = after ?? {}
  const facts = standing ?? { ...of, code, kind: kind as ResourceKind, description, unit }
  const version = (standing?.version ?? 0) + 1
  return { kind: 'resource', target: code, before: standing ?? null, after: { ...facts, ...takenOver(chosen, all), version } }
}

const isMoved = ({ before, after }: DraftWrite<'resource'>): boolean =>
  before === null ||
  (['low', 'likely', 'high'] as const).some((level) => Number(before[level]) !== Number(after[level])) ||
  before.source !== after.source ||
  before.sourceDate !== after.sourceDate

function grouped<T>(rows: readonly T[], keyOf: (row: T) => string): Map<string, T[]> {
  const groups = new Map<string, T[]>()
  for (const row of rows) {
    const group = groups.get(keyOf(row))
    if (group) group.push(row)
    else groups.set(keyOf(row), [row])
  }
  return groups
}

/**
 * What a supplier's quotations change: themselves, and the resources that follow them. A code that is not there becomes a resource with
 * its first quotation chosen; a resource with a chosen quotation takes its price, low and high anew.
 */
export async function quotationWrites(db: EntityManager, of: InEdition, rows: readonly WrittenRow[]) {
  const byCode = grouped(rows, ({ code }) => code)
  const codes = [...byCode.keys()]
  const resources = new Map((await findByCodes(db, ResourceEntity, of, 'code', codes)).map((row) => [row.code, row]))
  const standing = grouped(await findByCodes(db, QuotationEntity, of, 'resource', codes), ({ resource }) => resource)
  const quotations: DraftWrite<'quotation'>[] = []
  const followed: DraftWrite<'resource'>[] = []
  for (const [code, own] of byCode) {
    const earlier = standing.get(code) ?? []
    const written = own.map((row) => {
      const before = earlier.find(({ id }) => id === row.quotationId) ?? null
      return { kind: 'quotation' as const, target: '', before, after: quotationOf(of, row, before) }
    })
    for (const write of written) quotations.push({ ...write, target: write.after.id })
    const untouched = earlier.filter(({ id }) => written.every(({ before }) => before?.id !== id))
    const all = [...written.map(({ after }) => after), ...untouched]
    const write = resourceWrite(of, own[0]!, resources.get(code), all)
    if (write !== null && isMoved(write)) followed.push(write)
  }
  return { quotations, resources: followed }
}
