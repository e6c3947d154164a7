import type { EntityManager } from 'typeorm'
import { recordEvent } from '../auditLog'
import type { SignedIn } from '../session/signedIn'
import { recomputeRates } from './recomputeRates'

/** What was changed in a draft, for the audit log. */
export interface ChangedPrice {
  readonly what: 'resource' | 'gang' | 'quotation' | 'choice' | 'rate'
  readonly how: 'created' | 'changed' | 'removed'
  readonly code: string
}

/** Follows a change in a draft: works its built-up rates out again and records who changed what. */
export async function followChange(tx: EntityManager, who: SignedIn, editionId: string, changed: ChangedPrice): Promise<void> {
  const { firmId, personId } = who
  const moved = changed.how === 'created' && changed.what === 'resource' ? [] : await recomputeRates(tx, firmId, editionId)
  const detail = { editionId, ...changed, moved: moved.map(({ item }) => item) }
  await recordEvent(tx, { event: 'edition.pricesChanged', firmId, personId, detail })
}
