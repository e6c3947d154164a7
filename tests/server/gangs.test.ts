import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { z } from 'zod'
import { GangEntity } from '../../server/entities/rates/GangEntity'
import { RateEntity } from '../../server/entities/rates/RateEntity'
import { gang, rateMove } from '../../shared/contracts/resource'
import { signedIn } from '../support/factories'
import { makePricedEdition } from '../support/pricedDraft'
import { fixers } from '../support/samplePrices'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

async function draft() {
  const { firmId, client } = await signedIn(server, 'estimator')
  const { editionId } = await makePricedEdition(server, firmId)
  return { firmId, client, editionId, at: `/api/editions/${editionId}` }
}

describe('a gang of a draft', () => {
  it('moves every rate that rests on it, as the preview said', async () => {
    const { client, at, firmId, editionId } = await draft()
    const asked = fixers('gang.fixer', { members: [{ resource: 'fixer', count: '1.5' }] })
    const moves = (await client.post(`${at}/gangs/gang.fixer/preview`, asked)).as(z.array(rateMove))
    expect(moves.map(({ after }) => after.likely)).toEqual(['1668']) // 918 + 1.5 × 7 / 0.014
    expect((await client.get(`${at}/gangs`)).as(z.array(gang))[0]).toMatchObject({ version: 1, members: [{ count: '1' }] })
    expect((await client.put(`${at}/gangs/gang.fixer`, asked, 1)).as(gang).version).toBe(2)
    const rate = await server.db.manager.findOneByOrFail(RateEntity, { firmId, editionId, item: 'steel.bar.12' })
    expect(rate.likely).toBe('1668.000000')
    expect((await client.put(`${at}/gangs/gang.fixer`, asked, 1)).error.code).toBe('stale')
  })

  it.each([
    ['nobody of that name', 'ghost', 'the edition has no such resource'],
    ['a material', 'bar', 'it is material'],
  ])('has no member who is %s, in the preview nor when it is saved', async (_what, code, reason) => {
    const { client, at } = await draft()
    const asked = fixers('gang.fixer', {
      members: [
        { resource: 'fixer', count: '1' },
        { resource: code, count: '1' },
      ],
    })
    for (const answer of [
      await client.post(`${at}/gangs/gang.fixer/preview`, asked),
      await client.put(`${at}/gangs/gang.fixer`, asked, 1),
      await client.post(`${at}/gangs`, { ...asked, code: 'other' }),
    ]) {
      expect(answer.status).toBe(400)
      expect(answer.error.issues).toMatchObject([{ path: 'members.1.resource' }])
      expect(answer.error.issues![0]!.message).toContain(reason)
    }
    expect((await client.get(`${at}/gangs`)).as(z.array(gang))).toMatchObject([{ version: 1 }])
  })

  it('is removed once nothing rests on it', async () => {
    const { client, at } = await draft()
    expect((await client.post(`${at}/gangs`, fixers('spare'))).status).toBe(201)
    expect((await client.post(`${at}/gangs`, fixers('spare'))).error.issues?.[0]?.path).toBe('code')
    expect((await client.delete(`${at}/gangs/spare`, 1)).status).toBe(204)
    expect((await client.delete(`${at}/gangs/gang.fixer`, 1)).error.message).toBe('Still in use: the rate of steel.bar.12.')
  })

  it('is one of at most 500', async () => {
    const { client, at, firmId, editionId } = await draft()
    const rows = Array.from({ length: 499 }, (_, index) => ({ ...fixers(`g${index}`), firmId, editionId }))
    await server.db.manager.insert(GangEntity, rows)
    const answer = await client.post(`${at}/gangs`, fixers('one more'))
    expect(answer.error.issues?.[0]).toEqual({ path: 'code', message: 'expected at most 500 gangs in an edition' })
  })
})
