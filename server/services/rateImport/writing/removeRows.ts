import type { EntityManager } from 'typeorm'
import type { InEdition } from '../../rates/buildUpPricesOf'
import type { DraftKind } from './draftWrite'

const AT_ONCE = 1000
const KEY: Readonly<Record<DraftKind, string>> = { resource: 'code', quotation: 'id', rate: 'item' }

/** Removes rows of a draft by their codes or ids, a thousand at a time. */
export async function removeRows(
  tx: EntityManager,
  kind: DraftKind,
  { firmId, editionId }: InEdition,
  targets: readonly string[],
): Promise<void> {
  for (let at = 0; at < targets.length; at += AT_ONCE) {
    const some = targets.slice(at, at + AT_ONCE)
    await tx.query(`DELETE FROM \`${kind}\` WHERE firm_id = ? AND edition_id = ? AND \`${KEY[kind]}\` IN (?)`, [
      firmId,
      editionId,
      some,
    ])
  }
}
