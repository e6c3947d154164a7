import type { EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { FirmEntity } from '../../entities/firm/FirmEntity'
import { recordEvent } from '../auditLog'
import { inTransaction } from '../transaction'
import { addInvited } from './personService'

/** A new firm whose first admin is invited by mail. The admin's name is the start of the address until they give their own. */
export async function makeFirm(db: EntityManager, origin: string, name: string, email: string): Promise<void> {
  await inTransaction(db, async (tx) => {
    const firmId = v7()
    await tx.insert(FirmEntity, { id: firmId, name, isDemo: false, createdAt: new Date() })
    await recordEvent(tx, { event: 'firm.made', firmId, personId: null, detail: {} })
    await addInvited(tx, firmId, origin, { name: email.split('@')[0]!, email, roles: ['admin'] })
  })
}
