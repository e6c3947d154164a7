import { v7 } from 'uuid'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { z } from 'zod'
import { AuditEntity } from '../../server/entities/AuditEntity'
import { EditionEditorEntity } from '../../server/entities/rates/EditionEditorEntity'
import { RateEntity } from '../../server/entities/rates/RateEntity'
import { ResourceEntity } from '../../server/entities/rates/ResourceEntity'
import { rateMove, resource } from '../../shared/contracts/resource'
import { resourcePage, resourceSheet } from '../../shared/contracts/resourceSheet'
import { clientOf, makePerson, signedIn } from '../support/factories'
import { makePricedEdition } from '../support/pricedDraft'
import { material } from '../support/samplePrices'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

async function draft() {
  const { firmId, client, person } = await signedIn(server, 'estimator')
  const priced = await makePricedEdition(server, firmId)
  const other = await clientOf(server, await makePerson(server, firmId, ['estimator']))
  return { firmId, client, person, other, ...priced, at: `/api/editions/${priced.editionId}` }
}
const barAt = (likely: string, change = {}) =>
  material('bar', { unit: 't', description: 'Bars', price: { low: '850', likely, high: '1000' }, ...change })
const barRate = async (firmId: string, editionId: string) =>
  await server.db.manager.findOneByOrFail(RateEntity, { firmId, editionId, item: 'steel.bar.12' })

describe('a resource of a draft', () => {
  it('moves every rate that rests on it when it is changed, as the preview said, and notes who did it', async () => {
    const { client, at, firmId, editionId, person } = await draft()
    const asked = barAt('950')
    const moves = (await client.post(`${at}/resources/bar/preview`, asked)).as(z.array(rateMove))
    // 950 × 1.02 + 7 / 0.014 = 969 + 500
    expect(moves).toMatchObject([{ item: 'steel.bar.12', before: { likely: '1418' }, after: { likely: '1469' } }])
    expect(await barRate(firmId, editionId)).toMatchObject({ likely: '1418.000000', version: 1 })
    const answer = await client.put(`${at}/resources/bar`, asked, 1)
    expect(answer.as(resource)).toMatchObject({ price: { likely: '950' }, version: 2 })
    expect(answer.headers['etag']).toBe('"2"')
    expect(await barRate(firmId, editionId)).toMatchObject({ likely: '1469.000000' })
    expect(await server.db.manager.countBy(EditionEditorEntity, { firmId, editionId, personId: person.id })).toBe(1)
    const [event] = await server.db.manager.findBy(AuditEntity, { firmId, event: 'edition.pricesChanged' })
    expect(event!.detail).toMatchObject({ editionId, what: 'resource', code: 'bar', moved: ['steel.bar.12'] })
  })

  it('moves rates through the gangs that it is a member of', async () => {
    const { client, at } = await draft()
    const asked = material('fixer', { kind: 'labour', unit: 'h', price: { low: '6', likely: '7.7', high: '8' } })
    const [move] = (await client.post(`${at}/resources/fixer/preview`, asked)).as(z.array(rateMove))
    expect(move!.after.likely).toBe('1468') // 918 + 7.7 / 0.014 = 918 + 550
  })

  it('is made once for one key, and its code once in an edition', async () => {
    const { client, at, firmId, editionId } = await draft()
    const key = v7()
    const answers = await Promise.all([1, 2, 3].map(() => client.post(`${at}/resources`, material('new'), { key })))
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201])
    expect(await server.db.manager.countBy(ResourceEntity, { firmId, editionId, code: 'new' })).toBe(1)
    const again = await client.post(`${at}/resources`, material('new'), { key: v7() })
    expect(again.error).toMatchObject({ code: 'conflict', issues: [{ path: 'code' }] })
    expect((await client.post(`${at}/resources`, material('NEW'))).status).toBe(201)
  })

  it('loses nothing when two estimators change it: the second gets 412, reads what stands and decides', async () => {
    const { client, other, at } = await draft()
    expect((await client.put(`${at}/resources/bar`, barAt('950'), 1)).status).toBe(200)
    const late = await other.put(`${at}/resources/bar`, barAt('910'), 1)
    expect(late.error.code).toBe('stale')
    const now = (await other.get(`${at}/resources/bar`)).as(resourceSheet).resource
    expect(now).toMatchObject({ price: { likely: '950' }, version: 2 })
    expect((await other.put(`${at}/resources/bar`, barAt('910'), now.version)).as(resource).price.likely).toBe('910')
    expect((await other.put(`${at}/resources/bar`, barAt('910'))).error.code).toBe('version_required')
  })

  it('keeps every change of two estimators who change different resources at once', async () => {
    const { client, other, at, firmId, editionId } = await draft()
    const fixer = material('fixer', { kind: 'labour', unit: 'h', price: { low: '6', likely: '7.7', high: '8' } })
    const [a, b] = await Promise.all([
      client.put(`${at}/resources/bar`, barAt('950'), 1),
      other.put(`${at}/resources/fixer`, fixer, 1),
    ])
    expect([a.status, b.status]).toEqual([200, 200])
    expect((await barRate(firmId, editionId)).likely).toBe('1519.000000') // 969 + 550
  })

  it('is not removed while a rate or a gang rests on it, which the refusal names', async () => {
    const { client, at } = await draft()
    const bar = await client.delete(`${at}/resources/bar`, 1)
    expect(bar.error).toMatchObject({ code: 'conflict', message: 'Still in use: the rate of steel.bar.12.' })
    const fixer = await client.delete(`${at}/resources/fixer`, 1)
    expect(fixer.error.message).toBe('Still in use: the rate of steel.bar.12, the gang gang.fixer.')
    expect((await client.delete(`${at}/resources/block`, 1)).status).toBe(204)
    expect((await client.get(`${at}/resources/block`)).status).toBe(404)
  })

  it.each([
    ['its code', barAt('900', { code: 'bar2' }), 400, 'code'],
    ['its unit while a rate counts in it', barAt('900', { unit: 'kg' }), 409, 'unit'],
    ['its kind while a rate rests on it', barAt('900', { kind: 'plant', unit: 'h' }), 409, 'kind'],
    ['a low price above the likely one', barAt('800'), 400, 'price.low'],
    ['a number that is none', barAt('9e2'), 400, 'price.likely'],
    ['an unknown field', { ...barAt('900'), more: 1 }, 400, 'more'],
  ])('does not change %s', async (_what, asked, status, path) => {
    const { client, at } = await draft()
    const answer = await client.put(`${at}/resources/bar`, asked, 1)
    expect({ status: answer.status, path: answer.error.issues?.[0]?.path }).toEqual({ status, path })
  })

  it('refuses a price that makes a rate too large for a book, and keeps what stood', async () => {
    const { client, at, firmId, editionId } = await draft()
    const price = { low: '850', likely: '900', high: '999999999' }
    const answer = await client.put(`${at}/resources/bar`, barAt('900', { price }), 1)
    expect(answer.error).toMatchObject({ code: 'conflict', issues: [{ path: 'rates.steel.bar.12' }] })
    expect((await barRate(firmId, editionId)).high).toBe('1591.430000')
    expect((await client.get(`${at}/resources/bar`)).as(resourceSheet).resource.version).toBe(1)
  })

  it.each(['checked', 'published', 'superseded', 'withdrawn'] as const)('is fixed in an edition that is %s', async (state) => {
    const { firmId, client } = await signedIn(server, 'estimator')
    const { editionId } = await makePricedEdition(server, firmId, state)
    const at = `/api/editions/${editionId}`
    expect((await client.put(`${at}/resources/bar`, barAt('950'), 1)).error.code).toBe('conflict')
    expect((await client.post(`${at}/resources`, material('new'))).error.code).toBe('conflict')
    expect((await client.delete(`${at}/resources/block`, 1)).error.code).toBe('conflict')
    expect((await client.post(`${at}/resources/bar/preview`, barAt('950'))).as(z.array(rateMove))).toHaveLength(1)
    expect((await barRate(firmId, editionId)).likely).toBe('1418.000000')
  })
})

describe('the list of resources', () => {
  it('is searched by words in codes and descriptions, whatever their case, and by kind', async () => {
    const { client, at } = await draft()
    const codes = async (query: string) =>
      (await client.get(`${at}/resources${query}`)).as(resourcePage).resources.map(({ code }) => code)
    expect(await codes('')).toEqual(['bar', 'block', 'fixer', 'pump'])
    expect(await codes('?search=HOLLOW')).toEqual(['block'])
    expect(await codes('?search=BAR%20high')).toEqual(['bar'])
    expect(await codes('?kind=labour')).toEqual(['fixer'])
    expect(await codes('?search=nothing')).toEqual([])
  })

  it.each(['%', '_', '\\', "' OR 1=1 --", '"; DROP TABLE resource; --', '%%%'])('takes %s as text', async (search) => {
    const { client, at } = await draft()
    const answer = await client.get(`${at}/resources?search=${encodeURIComponent(search)}`)
    expect(answer.as(resourcePage).total).toBe(0)
  })

  it.each([
    ['?page=0', 'page'],
    ['?page=1e3', 'page'],
    ['?page=1&page=2', 'page'],
    ['?kind=gold', 'kind'],
    ['?sort=price', 'sort'],
  ])('refuses %s', async (query, path) => {
    const { client, at } = await draft()
    expect((await client.get(`${at}/resources${query}`)).error.issues?.[0]?.path).toBe(path)
  })

  it.each(["';--", '../../people', '%', '<b>', 'a\u0000', 'x'.repeat(41), '\ud83d'])('refuses %j as a code', async (code) => {
    const { client, at } = await draft()
    expect((await client.post(`${at}/resources`, material(code))).error.issues?.[0]?.path).toBe('code')
  })

  it('answers for codes with slashes and spaces in the address, each by its own name only', async () => {
    const { client, at } = await draft()
    for (const code of ['Bar 12/16', 'é.1']) {
      expect((await client.post(`${at}/resources`, material(code))).status).toBe(201)
      const found = await client.get(`${at}/resources/${encodeURIComponent(code)}`)
      expect(found.as(resourceSheet).resource.code).toBe(code)
    }
    expect((await client.get(`${at}/resources/BAR`)).status).toBe(404)
  })

  it('pages through 50,000 of them, and searches them, each within a second', async () => {
    const { client, at, firmId, editionId } = await draft()
    await server.db.manager.query(
      `INSERT INTO resource (firm_id, edition_id, code, kind, description, unit, low, likely, high, source)
       SELECT ?, ?, CONCAT('item ', LPAD(seq, 5, '0')), 'material', CONCAT('Article no. ', seq), 'kg', 1, 2, 3, '' FROM seq_1_to_50000`,
      [firmId, editionId],
    )
    const timed = async (query: string) => {
      const from = performance.now()
      const page = (await client.get(`${at}/resources${query}`)).as(resourcePage)
      return { page, ms: performance.now() - from }
    }
    await timed('')
    const first = await timed('')
    expect(first.page).toMatchObject({ page: 1, total: 50_004 })
    expect(first.page.resources).toHaveLength(100)
    const last = await timed('?page=501')
    expect(last.page.resources.map(({ code }) => code)).toEqual(['item 49998', 'item 49999', 'item 50000', 'pump'])
    const found = await timed('?search=article%2049999')
    expect(found.page.resources.map(({ code }) => code)).toEqual(['item 49999'])
    for (const { ms } of [first, last, found]) expect(ms).toBeLessThan(1000)
    expect((await client.put(`${at}/resources/bar`, barAt('950'), 1)).status).toBe(200)
  })
})
