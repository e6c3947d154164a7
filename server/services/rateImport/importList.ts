import { ROWS_A_PAGE, type ImportRowPage, type ImportRowQuery, type RateImport } from '#shared/contracts/rateImport'
import type { EntityManager } from 'typeorm'
import { RateImportEntity } from '../../entities/rates/RateImportEntity'
import { RateImportRowEntity } from '../../entities/rates/RateImportRowEntity'
import { AppError } from '../../errors'
import { readableEdition } from '../rates/readableEdition'
import { requireRole, type SignedIn } from '../session/signedIn'
import { importAnswers } from './importAnswer'
import type { ImportDesk } from './importDesk'
import { findImport } from './importStep'

const MOST_IMPORTS = 50

/** Imports of an edition, newest first. @throws AppError `forbidden`, `not_found` */
export async function listImports(db: EntityManager, desk: ImportDesk, who: SignedIn, editionId: string): Promise<RateImport[]> {
  requireRole(who, 'estimator')
  await readableEdition(db, who, editionId)
  const where = { firmId: who.firmId, editionId }
  const rows = await db.find(RateImportEntity, { where, order: { createdAt: 'DESC', id: 'DESC' }, take: MOST_IMPORTS })
  return await importAnswers(db, desk, rows)
}

/** An import as it stands, with how far the step under way has come. @throws AppError `forbidden`, `not_found` */
export async function readImport(db: EntityManager, desk: ImportDesk, who: SignedIn, id: string): Promise<RateImport> {
  return (await importAnswers(db, desk, [await findImport(db, who, id)]))[0]!
}

/** A page of an import's preview in the order of the sheet. @throws AppError `forbidden`, `not_found`, `conflict` before there is one */
export async function listImportRows(
  db: EntityManager,
  who: SignedIn,
  id: string,
  { state, page }: ImportRowQuery,
): Promise<ImportRowPage> {
  const { counts } = await findImport(db, who, id)
  if (counts === null) throw new AppError('conflict', 'The rows of this import are not checked yet.')
  const [rows, total] = await db.findAndCount(RateImportRowEntity, {
    where: { firmId: who.firmId, importId: id, ...(state === undefined ? {} : { state }) },
    order: { row: 'ASC' },
    skip: (page - 1) * ROWS_A_PAGE,
    take: ROWS_A_PAGE,
  })
  const answers = rows.map(({ row, state: is, code, before, after, reason, note }) => ({
    ...{ row, state: is, code, before, after, reason, note },
  }))
  return { rows: answers, total }
}
