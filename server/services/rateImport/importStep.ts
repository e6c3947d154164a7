import type { ImportState } from '#shared/contracts/rateImport'
import { In, type EntityManager } from 'typeorm'
import type { QueryDeepPartialEntity } from 'typeorm/query-builder/QueryPartialEntity.js'
import { RateImportEntity } from '../../entities/rates/RateImportEntity'
import { AppError } from '../../errors'
import { hasRole, requireRole, type SignedIn } from '../session/signedIn'

/** An import of a firm. */
export interface ImportPlace {
  readonly firmId: string
  readonly id: string
}

/** An import, for the estimators of its firm. @throws AppError `forbidden`, `not_found` */
export async function findImport(db: EntityManager, who: SignedIn, id: string): Promise<RateImportEntity> {
  requireRole(who, 'estimator')
  const row = hasRole(who, 'estimator') ? await db.findOneBy(RateImportEntity, { firmId: who.firmId, id }) : null
  if (row === null) throw new AppError('not_found')
  return row
}

const WORDS: Readonly<Record<ImportState, string>> = {
  reading: 'its file is being read',
  matching: 'its columns are not matched yet',
  checking: 'its rows are being checked',
  previewed: 'its rows are checked and not put in yet',
  committing: 'its rows are being put in',
  committed: 'its rows are put in',
  undone: 'it was undone',
  failed: 'its file could not be read',
}

/**
 * Takes an import from one of the states `from` to another, once: of two at the same moment one gets it.
 * @throws AppError `conflict` that says where it stands
 */
export async function takeStep(
  db: EntityManager,
  { firmId, id }: ImportPlace,
  from: readonly ImportState[],
  change: QueryDeepPartialEntity<RateImportEntity> & { state: ImportState },
): Promise<void> {
  const next = { ...change, touchedAt: new Date() }
  const { affected } = await db.update(RateImportEntity, { firmId, id, state: In([...from]) }, next)
  if (affected === 1) return
  const row = await db.findOneBy(RateImportEntity, { firmId, id })
  if (row === null) throw new AppError('not_found')
  throw new AppError('conflict', `This import cannot go this way now: ${WORDS[row.state]}.`)
}
