import type { BlockInput, CatalogueBlock } from '#shared/contracts/blockCatalogue'
import type { EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { SchemeEntity } from '../../entities/project/SchemeEntity'
import { BlockEntity } from '../../entities/rates/BlockEntity'
import { AppError, refuse } from '../../errors'
import { recordEvent } from '../auditLog'
import { createOnce, type CreatingRequest } from '../createOnce'
import { plainDecimal } from '../decimalText'
import { requireRole, type SignedIn } from '../session/signedIn'
import { duplicateIndex, driverCode, inTransaction } from '../transaction'
import { deleteVersioned, updateVersioned } from '../versionedUpdate'

const MOST_BLOCKS = 1000

function rethrowDuplicate(error: unknown): never {
  if (duplicateIndex(error) !== 'uq_block_code') throw error
  throw new AppError('conflict', undefined, [{ path: 'code', message: 'another block of the catalogue has this code' }])
}

function toBlock(row: BlockEntity): CatalogueBlock {
  const { id, code, name, material, length, width, height, mass, supplier, palletCount, priceCode, version } = row
  const breakagePercent = plainDecimal(row.breakagePercent)
  return { id, code, name, material, length, width, height, mass, supplier, palletCount, breakagePercent, priceCode, version }
}

async function readBlock(db: EntityManager, { firmId }: SignedIn, id: string): Promise<CatalogueBlock> {
  const row = await db.findOneBy(BlockEntity, { firmId, id })
  if (row === null) throw new AppError('not_found')
  return toBlock(row)
}

async function record(tx: EntityManager, who: SignedIn, how: string, { id, code, priceCode }: CatalogueBlock): Promise<void> {
  const detail = { how, id, code, priceCode }
  await recordEvent(tx, { event: 'block.changed', firmId: who.firmId, personId: who.personId, detail })
}

/** The firm's block catalogue in the order of its codes. */
export async function listBlocks(db: EntityManager, who: SignedIn): Promise<CatalogueBlock[]> {
  requireRole(who, 'surveyor', 'estimator')
  const rows = await db.find(BlockEntity, { where: { firmId: who.firmId }, order: { code: 'ASC' }, take: MOST_BLOCKS })
  return rows.map(toBlock)
}

/** @throws AppError `conflict` when the code is taken, `invalid_request` for the 1001st */
export async function createBlock(
  db: EntityManager,
  who: SignedIn,
  input: BlockInput,
  request: CreatingRequest,
): Promise<CatalogueBlock> {
  requireRole(who, 'estimator')
  return await createOnce(db, who, request, async (tx) => {
    if ((await tx.countBy(BlockEntity, { firmId: who.firmId })) >= MOST_BLOCKS)
      throw refuse('code', `expected at most ${MOST_BLOCKS} blocks in the catalogue`)
    const id = v7()
    await tx.insert(BlockEntity, { ...input, firmId: who.firmId, id }).catch(rethrowDuplicate)
    const block = await readBlock(tx, who, id)
    await record(tx, who, 'created', block)
    return block
  })
}

/** Changes what the catalogue says; schemes keep the sizes that they took from it. @throws AppError `not_found`, `stale`, `conflict` */
export async function changeBlock(
  db: EntityManager,
  who: SignedIn,
  id: string,
  version: number,
  input: BlockInput,
): Promise<CatalogueBlock> {
  requireRole(who, 'estimator')
  return await inTransaction(db, async (tx) => {
    await updateVersioned(tx, BlockEntity, { firmId: who.firmId, id }, version, input).catch(rethrowDuplicate)
    const block = await readBlock(tx, who, id)
    await record(tx, who, 'changed', block)
    return block
  })
}

/** @throws AppError `not_found`, `stale`, `conflict` while a scheme is built with it */
export async function removeBlock(db: EntityManager, who: SignedIn, id: string, version: number): Promise<void> {
  requireRole(who, 'estimator')
  await inTransaction(db, async (tx) => {
    const block = await readBlock(tx, who, id)
    const schemes = await tx.countBy(SchemeEntity, { firmId: who.firmId, blockId: id })
    if (schemes > 0) throw inUse(`${schemes} ${schemes === 1 ? 'scheme is' : 'schemes are'} built with it`)
    await deleteVersioned(tx, BlockEntity, { firmId: who.firmId, id }, version).catch(rethrowReferenced)
    await record(tx, who, 'removed', block)
  })
}

const inUse = (message: string) => new AppError('conflict', `The block stays: ${message}.`, [{ path: 'id', message }])

/** A scheme may take the block between the question and the removal. */
function rethrowReferenced(error: unknown): never {
  throw driverCode(error) === 'ER_ROW_IS_REFERENCED_2' ? inUse('a scheme is built with it') : error
}
