import type { Gang, Quotation, Resource } from '#shared/contracts/resource'
import type { GangEntity } from '../../entities/rates/GangEntity'
import type { QuotationEntity } from '../../entities/rates/QuotationEntity'
import type { ResourceEntity } from '../../entities/rates/ResourceEntity'
import { plainDecimal } from '../decimalText'

/** A stored resource as the contract has it. */
export function toResource(row: ResourceEntity): Resource {
  const { code, kind, description, unit, source, sourceDate, quotationId, version } = row
  const price = { low: plainDecimal(row.low), likely: plainDecimal(row.likely), high: plainDecimal(row.high) }
  return { code, kind, description, unit, price, source, sourceDate, hasChosenQuotation: quotationId !== null, version }
}

/** A stored gang as the contract has it. */
export const toGang = ({ code, description, members, version }: GangEntity): Gang => ({ code, description, members, version })

/** A stored quotation as the contract has it. */
export function toQuotation(row: QuotationEntity, chosenId: string | null): Quotation {
  const { id, resource, supplier, reference, day, validUntil, version } = row
  const amounts = { price: plainDecimal(row.price), contains: plainDecimal(row.contains) }
  return { id, resource, supplier, ...amounts, reference, day, validUntil, isChosen: id === chosenId, version }
}
