import type { ImportRowState } from '#shared/contracts/rateImport'
import type { QuotationEntity } from '../../../entities/rates/QuotationEntity'
import type { RateEntity } from '../../../entities/rates/RateEntity'
import type { ResourceEntity } from '../../../entities/rates/ResourceEntity'
import type { RowValues } from '../checking/checkedRow'

/** Tables that an import writes into, by what a row of them is. */
export interface DraftTables {
  readonly resource: ResourceEntity
  readonly quotation: QuotationEntity
  readonly rate: RateEntity
}
export type DraftKind = keyof DraftTables

/** One row that changes in a draft, whole as it stood and as it will stand. */
export interface DraftWrite<K extends DraftKind> {
  readonly kind: K
  /** Code of a resource or a rate, id of a quotation. */
  readonly target: string
  /** Null: it was not there. */
  readonly before: DraftTables[K] | null
  readonly after: DraftTables[K]
}

/** What rows of a list change in a draft. */
export interface DraftWrites {
  readonly resources: readonly DraftWrite<'resource'>[]
  readonly quotations: readonly DraftWrite<'quotation'>[]
  readonly rates: readonly DraftWrite<'rate'>[]
}

/** A checked row, before it is kept and after. */
export interface WrittenRow {
  readonly state: ImportRowState
  readonly code: string
  readonly after: RowValues | null
  readonly quotationId: string | null
  /** Null: it was not there. */
  readonly seenVersion: number | null
}
