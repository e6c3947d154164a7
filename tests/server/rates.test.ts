import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { EditionEntity } from '../../server/entities/rates/EditionEntity'
import { openedRate } from '../../shared/contracts/openedRate'
import { rate } from '../../shared/contracts/rateBook'
import { clientOf, makePerson, signedIn } from '../support/factories'
import { BARS, makePricedEdition } from '../support/pricedDraft'
import { material, plainRate } from '../support/samplePrices'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

async function draft() {
  const { firmId, client } = await signedIn(server, 'estimator')
  const priced = await makePricedEdition(server, firmId)
  return { firmId, client, ...priced, at: `/api/editions/${priced.editionId}` }
}
const built = (change: object = {}, unit = 't') => plainRate(unit, { price: null, buildUp: { ...BARS, ...change } })

describe('a rate of a draft', () => {
  it('is built up from resources, with the price that the build-up makes', async () => {
    const { client, at } = await draft()
    const answer = (await client.put(`${at}/rates/steel.bar.16`, built(), 1)).as(rate)
    // 850, 900, 1000 × 1.02 + 6, 7, 8 / 0.014
    expect(answer).toMatchObject({ low: '1295.57', likely: '1418', high: '1591.43', version: 2 })
    expect(answer.buildUp).toEqual(BARS)
  })

  it('is made plain again, and removed', async () => {
    const { client, at } = await draft()
    expect((await client.put(`${at}/rates/steel.bar.12`, plainRate('t'), 1)).as(rate)).toMatchObject({
      likely: '100',
      buildUp: null,
    })
    expect((await client.delete(`${at}/rates/steel.bar.12`, 1)).error.code).toBe('stale')
    expect((await client.delete(`${at}/rates/steel.bar.12`, 2)).status).toBe(204)
    expect((await client.get(`${at}/build-up/steel.bar.12`)).status).toBe(404)
  })

  it('is made for an item that has none, once', async () => {
    const { client, at } = await draft()
    expect((await client.post(`${at}/rates/formwork.edge`, plainRate('m'))).status).toBe(201)
    const again = await client.post(`${at}/rates/formwork.edge`, plainRate('m'))
    expect(again.error).toMatchObject({ code: 'conflict', issues: [{ path: 'item' }] })
  })

  it('takes overheads and profit only in an edition that holds them: they come once', async () => {
    const { client, at, firmId, editionId } = await draft()
    const asked = built({ overheadsPercent: '8', profitPercent: '5' })
    expect((await client.put(`${at}/rates/steel.bar.12`, asked, 1)).as(rate).likely).toBe('1608.01') // 1418 × 1.08 × 1.05
    await server.db.manager.update(EditionEntity, { firmId, id: editionId }, { holdsOverheads: false })
    const refused = await client.put(`${at}/rates/steel.bar.12`, asked, 2)
    expect(refused.error.issues?.map(({ path }) => path)).toEqual(['buildUp.overheadsPercent', 'buildUp.profitPercent'])
  })

  it.each([
    ['both prices and a build-up', { ...plainRate('t'), buildUp: BARS }, 'price'],
    ['neither', { ...plainRate('t'), price: null }, 'price'],
    ['another unit than the item is measured in', plainRate('kg'), 'unit'],
    [
      'a resource that is not there',
      built({ materials: [{ ...BARS.materials[0]!, resource: 'gold' }] }),
      'buildUp.materials.0.resource',
    ],
    [
      'labour as a material',
      built({ materials: [{ ...BARS.materials[0]!, resource: 'fixer' }] }),
      'buildUp.materials.0.resource',
    ],
    ['a gang that is not there', built({ labour: [{ ...BARS.labour[0]!, gang: 'ghosts' }] }), 'buildUp.labour.0.gang'],
    ['an output of nothing', built({ labour: [{ ...BARS.labour[0]!, value: '0' }] }), 'buildUp.labour.0.value'],
    ['no line at all', built({ materials: [], labour: [] }), 'buildUp.materials'],
    [
      'a resource called as a query',
      built({ materials: [{ ...BARS.materials[0]!, resource: "' OR 1 --" }] }),
      'buildUp.materials.0.resource',
    ],
  ])('is refused with %s', async (_what, asked, path) => {
    const { client, at } = await draft()
    const answer = await client.put(`${at}/rates/steel.bar.12`, asked, 1)
    expect({ status: answer.status, path: answer.error.issues?.[0]?.path }).toEqual({ status: 400, path })
  })

  it('is refused for an item that nothing is measured by', async () => {
    const { client, at } = await draft()
    expect((await client.post(`${at}/rates/steel.bar.13`, plainRate('t'))).error.issues?.[0]?.path).toBe('item')
  })

  it('keeps both of two estimators’ work: a build-up saved while a resource moves is worked out with the new price', async () => {
    const { client, at, firmId } = await draft()
    const other = await clientOf(server, await makePerson(server, firmId, ['estimator']))
    const dearer = material('bar', { unit: 't', price: { low: '850', likely: '950', high: '1000' } })
    const [moved, saved] = await Promise.all([
      client.put(`${at}/resources/bar`, dearer, 1),
      other.put(`${at}/rates/steel.bar.12`, built({ overheadsPercent: '10' }), 1),
    ])
    expect([moved.status, saved.status]).toEqual([200, 200])
    const { rate: now } = (await client.get(`${at}/build-up/steel.bar.12`)).as(openedRate)
    expect(now.likely).toBe('1615.9') // (950 × 1.02 + 500) × 1.1
    expect((await client.put(`${at}/rates/steel.bar.12`, built(), 1)).error.code).toBe('stale')
  })
})

describe('an opened rate', () => {
  it('shows its lines with their working, the resources behind them and the chosen quotations', async () => {
    const { client, at, quotationId } = await draft()
    const opened = (await client.get(`${at}/build-up/steel.bar.12`)).as(openedRate)
    expect(opened.built!.lines.map(({ expression, likely, inputs }) => [expression, likely, inputs])).toEqual([
      ['1 t × 900 × (1 + 2 %)', '918.0000', ['bar']],
      ['(1 × 7) ÷ 0.014 an hour', '500.0000', ['fixer']],
    ])
    expect(opened.built!.resources.map(({ code, source, sourceDate }) => [code, source, sourceDate])).toEqual([
      ['bar', 'Price list', '2026-08-01'],
      ['fixer', 'Price list', '2026-08-01'],
    ])
    await client.put(`${at}/resources/block/choice`, { quotation: quotationId }, 1)
    const blocks = plainRate('nr', {
      price: null,
      buildUp: { ...BARS, labour: [], materials: [{ ...BARS.materials[0]!, resource: 'block', isBlock: true }] },
    })
    await client.put(`${at}/rates/blocks.whole`, blocks, 1)
    const opening = (await client.get(`${at}/build-up/blocks.whole`)).as(openedRate)
    expect(opening.built!.chosen.map(({ supplier }) => supplier)).toEqual(['First kiln'])
  })

  it('takes the block of a scheme in place of its own, and refuses one that is no material', async () => {
    const { client, at } = await draft()
    await client.post(`${at}/resources`, material('big block', { price: { low: '2', likely: '2', high: '2' } }))
    const line = { ...BARS.materials[0]!, resource: 'block', wastePercent: '0', isBlock: true }
    const blocks = plainRate('nr', { price: null, buildUp: { ...BARS, labour: [], materials: [line] } })
    await client.put(`${at}/rates/blocks.whole`, blocks, 1)
    const price = async (query: string) =>
      (await client.get(`${at}/build-up/blocks.whole${query}`)).as(openedRate).built!.price.likely
    expect([await price(''), await price('?block=big%20block')]).toEqual(['0.80', '2.00'])
    expect((await client.get(`${at}/build-up/blocks.whole?block=fixer`)).status).toBe(400)
  })

  it('is a plain price where it is not built up', async () => {
    const { client, at } = await draft()
    const opened = (await client.get(`${at}/build-up/concrete.slab`)).as(openedRate)
    expect(opened).toMatchObject({ built: null, currency: 'USD', rate: { likely: '168', source: 'test' } })
  })

  it('of a draft is not a surveyor’s to see, of a published edition it is, and never a developer’s', async () => {
    const { firmId, at } = await draft()
    const published = `/api/editions/${(await makePricedEdition(server, firmId, 'published')).editionId}`
    const as = async (role: 'surveyor' | 'developer') => await clientOf(server, await makePerson(server, firmId, [role]))
    const [surveyor, developer] = [await as('surveyor'), await as('developer')]
    for (const path of ['/build-up/steel.bar.12', '/resources', '/resources/bar', '/gangs']) {
      expect((await surveyor.get(`${at}${path}`)).status).toBe(404)
      expect((await surveyor.get(`${published}${path}`)).status).toBe(200)
      expect((await developer.get(`${published}${path}`)).status).toBe(403)
    }
  })
})
