import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { IsNull } from 'typeorm'
import { AuditEntity } from '../../server/entities/AuditEntity'
import { createAllowance } from '../../server/services/allowance'
import { clientOf, signedIn } from '../support/factories'
import { TestClient } from '../support/testClient'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

describe('refusals for want of rights', () => {
  it('are recorded with who asked for what', async () => {
    const { person } = await signedIn(server, 'client')
    await (await clientOf(server, person)).get('/api/people')
    await expect.poll(() => server.db.manager.countBy(AuditEntity, { personId: person.id, event: 'request.refused' })).toBe(1)
  })

  it('are recorded a hundred times an hour for one caller, so that nobody fills the table', () => {
    let nowMs = 0
    const isRecorded = createAllowance({ most: 100, windowMs: 3_600_000 }, () => nowMs)
    const recorded = (caller: string) => Array.from({ length: 150 }, () => isRecorded(caller)).filter(Boolean).length
    expect([recorded('a'), recorded('b'), recorded('a')]).toEqual([100, 100, 0])
    nowMs = 3_600_000
    expect(recorded('a')).toBe(100)
  })

  it('by the Origin of another site leave at most a hundred rows', async () => {
    const client = new TestClient(server.app)
    const refused = () => server.db.manager.countBy(AuditEntity, { event: 'request.refused', personId: IsNull() })
    const before = await refused()
    for (let run = 0; run < 130; run++)
      expect((await client.post('/api/session', {}, { headers: { Origin: 'https://evil.example' } })).status).toBe(403)
    await new Promise((resolve) => setTimeout(resolve, 300))
    const rows = (await refused()) - before
    expect(rows).toBeGreaterThan(0)
    expect(rows).toBeLessThanOrEqual(100)
  })
})
