import type { EntityManager } from 'typeorm'
import type { QuotationEntity } from '../../../entities/rates/QuotationEntity'
import type { RateEntity } from '../../../entities/rates/RateEntity'
import type { ResourceEntity } from '../../../entities/rates/ResourceEntity'
import { bulkInsert, type SqlValue } from './bulkInsert'
import type { DraftKind, DraftTables } from './draftWrite'

interface Table<Row> {
  readonly name: string
  readonly columns: readonly string[]
  /** Columns that a row keeps where it stands already. */
  readonly kept: readonly string[]
  readonly valuesOf: (row: Row) => SqlValue[]
}

const PRICED = ['description', 'unit', 'low', 'likely', 'high', 'source', 'source_date', 'version']
const pricedValues = (row: ResourceEntity | RateEntity): SqlValue[] => [
  ...[row.description, row.unit, row.low, row.likely, row.high, row.source, row.sourceDate, row.version],
]

const TABLES: { readonly [K in DraftKind]: Table<DraftTables[K]> } = {
  resource: {
    name: 'resource',
    columns: ['firm_id', 'edition_id', 'code', 'kind', 'quotation_id', ...PRICED],
    kept: ['firm_id', 'edition_id', 'code'],
    valuesOf: (row) => [row.firmId, row.editionId, row.code, row.kind, row.quotationId, ...pricedValues(row)],
  },
  quotation: {
    name: 'quotation',
    columns: [
      ...['firm_id', 'id', 'edition_id', 'resource', 'supplier', 'price', 'contains', 'reference', 'day', 'valid_until'],
      'version',
    ],
    kept: ['firm_id', 'id', 'edition_id', 'resource'],
    valuesOf: (row: QuotationEntity) => [
      ...[row.firmId, row.id, row.editionId, row.resource, row.supplier, row.price, row.contains, row.reference],
      ...[row.day, row.validUntil, row.version],
    ],
  },
  rate: {
    name: 'rate',
    columns: ['firm_id', 'edition_id', 'item', ...PRICED],
    kept: ['firm_id', 'edition_id', 'item'],
    valuesOf: (row) => [row.firmId, row.editionId, row.item, ...pricedValues(row)],
  },
}

/**
 * Puts rows into a draft as they are given, with their versions; one that stands is changed. The build-up of a rate stays as it is.
 * @param onRows - told how many are in
 */
export async function putRows<K extends DraftKind>(
  tx: EntityManager,
  kind: K,
  rows: readonly DraftTables[K][],
  onRows?: (count: number) => void,
): Promise<void> {
  const { name, columns, kept, valuesOf } = TABLES[kind]
  const changed = columns.filter((column) => !kept.includes(column))
  const after = `ON DUPLICATE KEY UPDATE ${changed.map((column) => `\`${column}\` = VALUES(\`${column}\`)`).join(', ')}`
  const into = `INSERT INTO \`${name}\` (${columns.map((column) => `\`${column}\``).join(', ')})`
  await bulkInsert(tx, into, rows.map(valuesOf), after, onRows)
}
