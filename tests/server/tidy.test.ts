import { v7 } from 'uuid'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { SessionEntity } from '../../server/entities/session/SessionEntity'
import { RefreshTokenEntity } from '../../server/entities/session/RefreshTokenEntity'
import { tidy } from '../../server/services/tidy'
import { clientOf, makeFirm, makePerson } from '../support/factories'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

describe('tidying', () => {
  it('removes sessions that ran out or were ended over a day ago with their tokens, and leaves the others', async () => {
    const somebody = await makePerson(server, await makeFirm(server), ['surveyor'])
    const client = await clientOf(server, somebody)
    const now = Date.now()
    const [old, ended, recent] = [v7(), v7(), v7()]
    const day = 24 * 3600 * 1000
    const at = (days: number) => new Date(now + days * day)
    const of = { firmId: somebody.firmId, personId: somebody.id, createdAt: at(-20) }
    await server.db.manager.insert(SessionEntity, [
      { ...of, id: old, expiresAt: at(-2), revokedAt: null },
      { ...of, id: ended, expiresAt: at(5), revokedAt: at(-2) },
      { ...of, id: recent, expiresAt: at(5), revokedAt: at(-0.5) },
    ])
    await server.db.manager.insert(RefreshTokenEntity, { tokenHash: v7(), sessionId: old, createdAt: at(-20), usedAt: null })
    await tidy(server.db.manager, new Date(now))
    const left = await server.db.manager.findBy(SessionEntity, { personId: somebody.id })
    expect(left.map(({ id }) => id)).toEqual(expect.arrayContaining([recent]))
    expect(left).toHaveLength(2)
    expect(await server.db.manager.countBy(RefreshTokenEntity, { sessionId: old })).toBe(0)
    expect((await client.get('/api/session')).status).toBe(200)
  })
})
