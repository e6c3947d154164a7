import type { EntityManager } from 'typeorm'

const ROWS_AT_ONCE = 1000
/** Bytes of one statement stay far below what the server takes. */
const BYTES_AT_ONCE = 2_000_000

/** A value as the driver writes it into a statement of many rows. */
export type SqlValue = string | number | null | Date

/**
 * Many rows by few statements of many rows each.
 * @param statement - up to `VALUES`; @param after - what follows the rows
 * @param onRows - told how many rows are in
 */
export async function bulkInsert(
  db: EntityManager,
  statement: string,
  rows: readonly (readonly SqlValue[])[],
  after = '',
  onRows: (count: number) => Promise<void> | void = () => undefined,
): Promise<void> {
  let batch: (readonly SqlValue[])[] = []
  let bytes = 0
  let count = 0
  const flush = async () => {
    if (batch.length === 0) return
    await db.query(`${statement} VALUES ? ${after}`, [batch])
    count += batch.length
    batch = []
    bytes = 0
    await onRows(count)
  }
  for (const row of rows) {
    batch.push(row)
    for (const value of row) bytes += typeof value === 'string' ? value.length : 8
    if (batch.length >= ROWS_AT_ONCE || bytes >= BYTES_AT_ONCE) await flush()
  }
  await flush()
}
