import { In, type EntityManager, type EntityTarget, type FindOptionsWhere, type ObjectLiteral } from 'typeorm'
import { QuotationEntity } from '../../../entities/rates/QuotationEntity'
import { RateEntity } from '../../../entities/rates/RateEntity'
import { ResourceEntity } from '../../../entities/rates/ResourceEntity'
import { plainDecimal } from '../../decimalText'
import type { InEdition } from '../../rates/buildUpPricesOf'
import type { QuotedResource } from './checkQuotation'
import type { RowValues, Standing } from './checkedRow'

const AT_ONCE = 1000

/** Rows of an edition by many codes, a thousand at a time. */
export async function findByCodes<T extends ObjectLiteral>(
  db: EntityManager,
  entity: EntityTarget<T>,
  of: InEdition,
  field: 'code' | 'resource' | 'item' | 'id',
  codes: readonly string[],
): Promise<T[]> {
  const found: T[] = []
  for (let at = 0; at < codes.length; at += AT_ONCE) {
    const where = { ...of, [field]: In(codes.slice(at, at + AT_ONCE)) } as unknown as FindOptionsWhere<T>
    for (const row of await db.findBy(entity, where)) found.push(row)
  }
  return found
}

type Priced = Pick<ResourceEntity, 'description' | 'unit' | 'low' | 'likely' | 'high' | 'source' | 'sourceDate'>

const pricedValues = ({ description, unit, low, likely, high, source, sourceDate }: Priced): RowValues => ({
  ...{ description, unit, source, sourceDate: sourceDate ?? '' },
  ...{ low: plainDecimal(low), likely: plainDecimal(likely), high: plainDecimal(high) },
})

/** Resources that stand in an edition, of those codes. */
export async function standingResources(db: EntityManager, of: InEdition, codes: readonly string[]) {
  const rows = await findByCodes(db, ResourceEntity, of, 'code', codes)
  return new Map(
    rows.map((row) => {
      const values = { kind: row.kind as string, ...pricedValues(row) }
      return [row.code, { values, version: row.version, hasChosen: row.quotationId !== null }]
    }),
  )
}

/** Rates that stand in an edition, of those items. */
export async function standingRates(db: EntityManager, of: InEdition, items: readonly string[]) {
  const rows = await findByCodes(db, RateEntity, of, 'item', items)
  return new Map<string, Standing & { isBuiltUp: boolean }>(
    rows.map((row) => [row.item, { values: pricedValues(row), version: row.version, isBuiltUp: row.buildUp !== null }]),
  )
}

/** Resources of those codes with the quotations that stand for them. */
export async function standingQuotations(
  db: EntityManager,
  of: InEdition,
  codes: readonly string[],
): Promise<Map<string, QuotedResource>> {
  const resources = await standingResources(db, of, codes)
  const quotations = new Map<string, (Standing & { quotationId: string })[]>()
  for (const row of await findByCodes(db, QuotationEntity, of, 'resource', [...resources.keys()])) {
    const { supplier, reference, day, validUntil, version, id } = row
    const amounts = { price: plainDecimal(row.price), contains: plainDecimal(row.contains) }
    const values = { supplier, ...amounts, reference, day, validUntil: validUntil ?? '' }
    const others = quotations.get(row.resource)
    if (others) others.push({ values, version, quotationId: id })
    else quotations.set(row.resource, [{ values, version, quotationId: id }])
  }
  return new Map([...resources].map(([code, row]) => [code, { ...row, quotations: quotations.get(code) ?? [] }]))
}
