import { v7 } from 'uuid'
import { RateImportEntity } from '../../server/entities/rates/RateImportEntity'
import type { ImportMatching } from '../../shared/contracts/rateImport'
import type { TestServer } from './testServer'

/** Code in A, price in B, heads in row 1. */
export const importMatching = (): ImportMatching => ({
  target: 'resources',
  sheet: 0,
  headRow: 0,
  columns: { code: 0, likely: 1 },
  decimalMark: '.',
  defaults: { kind: 'material', unit: 'kg', supplier: '', day: '2026-10-01' },
})

/** An import that is put in, and wrote nothing. */
export async function makeCommittedImport(
  server: TestServer,
  firmId: string,
  editionId: string,
  personId: string,
): Promise<string> {
  const id = v7()
  const now = new Date()
  const sheets = [{ name: 'List', rowCount: 1, hiddenRowCount: 0, sample: [['code', 'price']], proposed: null }]
  const counts = { new: 0, changed: 0, unchanged: 0, refused: 0, leftOut: 0 }
  const found = { sheets, matching: importMatching(), counts, moves: [], failure: null }
  const stamps = { personId, createdAt: now, touchedAt: now }
  const own = { firmId, id, editionId, fileName: 'list.csv', state: 'committed' as const, progress: 1 }
  await server.db.manager.insert(RateImportEntity, { ...own, ...found, ...stamps })
  return id
}
