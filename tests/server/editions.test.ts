import { v7 } from 'uuid'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { EditionEntity } from '../../server/entities/rates/EditionEntity'
import { RateEntity } from '../../server/entities/rates/RateEntity'
import { catalogueBlock } from '../../shared/contracts/blockCatalogue'
import { editionWithRates, rateBook, type EditionState } from '../../shared/contracts/rateBook'
import { clientOf, makeBlock, makeEdition, makePerson, signedIn } from '../support/factories'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

const FIXED: readonly EditionState[] = ['published', 'superseded', 'withdrawn']

describe('a published edition', () => {
  const changes: readonly [string, Partial<EditionEntity>][] = [
    ['base date', { baseDate: '2020-01-01' }],
    ['last day', { validUntil: '2030-01-01' }],
    ['number', { number: 9 }],
    ['tax basis', { taxBasis: 'other' }],
    ['note', { note: 'other' }],
    ['compiler', { compiledBy: 'other' }],
    ['checker', { checkedBy: null }],
    ['state, back to draft', { state: 'draft' }],
  ]
  it.each(changes)('keeps its %s, whoever tries', async (_what, change) => {
    const { firmId } = await signedIn(server, 'estimator')
    const id = await makeEdition(server, firmId)
    const before = await server.db.manager.findOneByOrFail(EditionEntity, { firmId, id })
    await expect(server.db.manager.update(EditionEntity, { firmId, id }, change)).rejects.toThrow(
      'a published edition is never edited',
    )
    expect(await server.db.manager.findOneByOrFail(EditionEntity, { firmId, id })).toEqual(before)
  })

  it('keeps its rates: none is changed, added or removed', async () => {
    const { firmId } = await signedIn(server, 'estimator')
    for (const state of FIXED) {
      const id = await makeEdition(server, firmId, state)
      const row = await server.db.manager.findOneByOrFail(RateEntity, { firmId, editionId: id, item: 'concrete.slab' })
      const where = { firmId, editionId: id }
      await expect(server.db.manager.update(RateEntity, where, { likely: '1' })).rejects.toThrow('in a draft only')
      await expect(server.db.manager.delete(RateEntity, where)).rejects.toThrow('in a draft only')
      await expect(server.db.manager.insert(RateEntity, { ...row, item: 'steel.bar.6' as const })).rejects.toThrow()
      await expect(server.db.manager.delete(EditionEntity, { firmId, id })).rejects.toThrow()
      expect(await server.db.manager.findOneByOrFail(RateEntity, { ...where, item: 'concrete.slab' })).toEqual(row)
    }
  })

  it('may be superseded or withdrawn, and not published a second time', async () => {
    const { firmId } = await signedIn(server, 'estimator')
    const id = await makeEdition(server, firmId)
    await server.db.manager.update(EditionEntity, { firmId, id }, { state: 'superseded' })
    await expect(server.db.manager.update(EditionEntity, { firmId, id }, { state: 'published' })).rejects.toThrow()
    await server.db.manager.update(EditionEntity, { firmId, id }, { state: 'withdrawn' })
  })

  it('was a draft, whose rates may change', async () => {
    const { firmId } = await signedIn(server, 'estimator')
    const id = await makeEdition(server, firmId, 'draft')
    await server.db.manager.update(RateEntity, { firmId, editionId: id, item: 'concrete.slab' }, { likely: '99.123456' })
    await server.db.manager.delete(RateEntity, { firmId, editionId: id, item: 'curing.area' })
    const { client } = await signedIn(server, 'estimator')
    expect((await client.get(`/api/editions/${id}`)).status).toBe(404)
  })
})

describe('rate books', () => {
  it('show an estimator every edition, a surveyor those once published', async () => {
    const { client, firmId } = await signedIn(server, 'surveyor')
    const estimator = await clientOf(server, await makePerson(server, firmId, ['estimator']))
    const ids = new Map<EditionState, string>()
    for (const state of ['draft', 'checked', ...FIXED] as const) ids.set(state, await makeEdition(server, firmId, state))
    const states = async (of: typeof client) =>
      (await of.get('/api/rate-books')).as(rateBook.array()).flatMap(({ editions }) => editions.map(({ state }) => state))
    expect((await states(client)).sort()).toEqual([...FIXED].sort())
    expect((await states(estimator)).sort()).toEqual(['checked', 'draft', ...FIXED].sort())
    for (const [state, id] of ids) {
      expect((await client.get(`/api/editions/${id}`)).status).toBe(FIXED.includes(state) ? 200 : 404)
      expect((await estimator.get(`/api/editions/${id}`)).status).toBe(200)
    }
  })

  it('give decimals as they were written, not as the database pads them', async () => {
    const { client, firmId } = await signedIn(server, 'surveyor')
    const edition = (await client.get(`/api/editions/${await makeEdition(server, firmId)}`)).as(editionWithRates)
    const likely = new Map(edition.rates.map(({ item, likely: rate }) => [item, rate]))
    expect(likely.get('concrete.slab')).toBe('168')
    expect(likely.get('blocks.whole')).toBe('1.62')
  })

  it('are the firm’s own', async () => {
    const { client } = await signedIn(server, 'surveyor')
    await makeEdition(server, (await signedIn(server, 'estimator')).firmId)
    expect((await client.get('/api/rate-books')).body).toEqual([])
    expect((await client.get(`/api/editions/${v7()}`)).status).toBe(404)
  })
})

describe('the block catalogue', () => {
  it('lists the firm’s blocks with numbers as numbers', async () => {
    const { client, firmId } = await signedIn(server, 'surveyor')
    const id = await makeBlock(server, firmId)
    await makeBlock(server, (await signedIn(server, 'surveyor')).firmId)
    const blocks = (await client.get('/api/blocks')).as(catalogueBlock.array())
    expect(blocks).toMatchObject([{ id, length: 200, width: 400, height: 200, mass: 15, palletCount: 120, breakagePercent: '3' }])
  })
})
