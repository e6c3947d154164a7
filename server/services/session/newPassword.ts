import type { InvitationAcceptance, PasswordResetInput, PasswordResetRequest } from '#shared/contracts/session'
import type { EntityManager } from 'typeorm'
import { FirmEntity } from '../../entities/firm/FirmEntity'
import { PersonEntity } from '../../entities/firm/PersonEntity'
import { refuse } from '../../errors'
import { queueMail } from '../../mail/queueMail'
import { recordEvent } from '../auditLog'
import { passwordResetMail } from '../person/linkMail'
import { sha256 } from '../sha256'
import { inTransaction } from '../transaction'
import { countAttempt } from './attemptLimit'
import { hashPassword } from './passwordHash'
import { requireUncommonPassword } from './passwordPolicy'
import { endSessions } from './sessionService'
import type { SessionSettings } from './sessionSettings'
import { holderOf, issueToken, useToken } from './singleUseToken'

const HOUR_S = 3600
const MOST_MAILS = 5
const MOST_FIRMS = 5

/** @throws AppError `limited` when this address asks too often, whatever it asks for */
export async function countResetRequest(db: EntityManager, address: string): Promise<void> {
  await countAttempt(db, [{ kind: 'reset.address', subject: address, most: 60, windowS: HOUR_S }])
}

/**
 * Sends a link for a new password to whoever has this address, at most five an hour. To be called after the answer, which is the
 * same for every address and must not take longer for a known one.
 */
export async function sendPasswordReset(
  db: EntityManager,
  { origin }: SessionSettings,
  { email }: PasswordResetRequest,
): Promise<void> {
  await recordEvent(db, { event: 'passwordReset.asked', firmId: null, personId: null, detail: { email: sha256(email) } })
  const people = await db.find(PersonEntity, { where: { email, state: 'active' }, take: MOST_FIRMS })
  if (people.length === 0) return
  await countAttempt(db, [{ kind: 'reset.account', subject: email, most: MOST_MAILS, windowS: HOUR_S }])
  for (const { firmId, id, name } of people) {
    await inTransaction(db, async (tx) => {
      const token = await issueToken(tx, { firmId, personId: id }, 'passwordReset')
      await queueMail(tx, { firmId, toName: name, toEmail: email, ...passwordResetMail(origin, name, token) })
    })
  }
}

const usedUp = () => refuse('token', 'expected the token of a link that is new and not yet used')

async function wordsOf(db: EntityManager, { firmId, name, email }: PersonEntity): Promise<string[]> {
  const firm = await db.findOneByOrFail(FirmEntity, { id: firmId })
  return [firm.name, name, email, email.split('@')[0]!]
}

/** Sets a new password by the link from the mail and ends every session. @throws AppError `invalid_request` at `token` or `password` */
export async function resetPassword(db: EntityManager, { token, password }: PasswordResetInput): Promise<void> {
  const holder = await holderOf(db, token, 'passwordReset')
  if (holder === null) throw usedUp()
  const { firmId, personId } = holder
  const person = await db.findOneByOrFail(PersonEntity, { firmId, id: personId })
  requireUncommonPassword(password, await wordsOf(db, person))
  const passwordHash = await hashPassword(password)
  await inTransaction(db, async (tx) => {
    if (!(await useToken(tx, token, 'passwordReset'))) throw usedUp()
    const { affected } = await tx.update(PersonEntity, { firmId, id: personId, state: 'active' }, { passwordHash })
    if (affected !== 1) throw usedUp()
    await endSessions(tx, { firmId, personId })
    await recordEvent(tx, { event: 'passwordReset.done', firmId, personId, detail: {} })
  })
}

/** Makes an invited person an active one. @throws AppError `invalid_request` at `token` or `password` */
export async function acceptInvitation(db: EntityManager, { token, name, password }: InvitationAcceptance): Promise<void> {
  const holder = await holderOf(db, token, 'invitation')
  if (holder === null) throw usedUp()
  const { firmId, personId } = holder
  const person = await db.findOneByOrFail(PersonEntity, { firmId, id: personId })
  requireUncommonPassword(password, [name, ...(await wordsOf(db, person))])
  const passwordHash = await hashPassword(password)
  await inTransaction(db, async (tx) => {
    if (!(await useToken(tx, token, 'invitation'))) throw usedUp()
    const change = { name, passwordHash, state: 'active' as const, version: () => 'version + 1' }
    const { affected } = await tx.update(PersonEntity, { firmId, id: personId, state: 'invited' }, change)
    if (affected !== 1) throw usedUp()
    await recordEvent(tx, { event: 'invitation.accepted', firmId, personId, detail: {} })
  })
}
