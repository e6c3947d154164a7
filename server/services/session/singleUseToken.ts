import { randomBytes } from 'node:crypto'
import { IsNull, MoreThan, type EntityManager } from 'typeorm'
import { SingleUseTokenEntity } from '../../entities/session/SingleUseTokenEntity'
import { sha256 } from '../sha256'

type Kind = SingleUseTokenEntity['kind']

/** Seconds for which a link works. */
const LIFE_S = { invitation: 7 * 24 * 3600, passwordReset: 600 } as const satisfies Record<Kind, number>

interface Holder {
  readonly firmId: string
  readonly personId: string
}

/** A new token, 256 random bits in base64url, kept by its hash. Earlier ones of the kind stop working. */
export async function issueToken(tx: EntityManager, { firmId, personId }: Holder, kind: Kind): Promise<string> {
  const token = randomBytes(32).toString('base64url')
  const now = new Date()
  await tx.update(SingleUseTokenEntity, { firmId, personId, kind, usedAt: IsNull() }, { usedAt: now })
  await tx.insert(SingleUseTokenEntity, {
    tokenHash: sha256(token),
    firmId,
    personId,
    kind,
    createdAt: now,
    expiresAt: new Date(now.getTime() + LIFE_S[kind] * 1000),
    usedAt: null,
  })
  return token
}

/** Whose unused token this is; null when it is none, used or run out. */
export async function holderOf(db: EntityManager, token: string, kind: Kind): Promise<Holder | null> {
  return await db.findOneBy(SingleUseTokenEntity, {
    tokenHash: sha256(token),
    kind,
    usedAt: IsNull(),
    expiresAt: MoreThan(new Date()),
  })
}

/** Uses the token up: true for the one caller who may act on it. */
export async function useToken(tx: EntityManager, token: string, kind: Kind): Promise<boolean> {
  const now = new Date()
  const unused = { tokenHash: sha256(token), kind, usedAt: IsNull(), expiresAt: MoreThan(now) }
  const { affected } = await tx.update(SingleUseTokenEntity, unused, { usedAt: now })
  return affected === 1
}
