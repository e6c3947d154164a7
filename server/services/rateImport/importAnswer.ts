import type { RateImport } from '#shared/contracts/rateImport'
import { In, type EntityManager } from 'typeorm'
import { PersonEntity } from '../../entities/firm/PersonEntity'
import type { RateImportEntity } from '../../entities/rates/RateImportEntity'
import type { ImportDesk } from './importDesk'

/** Imports of one firm as the contract has them. */
export async function importAnswers(
  db: EntityManager,
  desk: ImportDesk,
  rows: readonly RateImportEntity[],
): Promise<RateImport[]> {
  const [first] = rows
  if (first === undefined) return []
  const ids = [...new Set(rows.map(({ personId }) => personId))]
  const people = await db.findBy(PersonEntity, { firmId: first.firmId, id: In(ids) })
  const names = new Map(people.map(({ id, name }) => [id, name]))
  return rows.map((row) => {
    const { id, editionId, fileName, state, failure, sheets, matching, counts, moves } = row
    const progress = desk.progressOf(id) ?? row.progress
    const made = { createdAt: row.createdAt.toISOString(), createdBy: names.get(row.personId) ?? '' }
    return { id, editionId, fileName, state, progress, failure, sheets, matching, counts, moves, ...made }
  })
}
