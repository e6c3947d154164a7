import { v7 } from 'uuid'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { z } from 'zod'
import { RateEntity } from '../../server/entities/rates/RateEntity'
import { buildUp } from '../../shared/contracts/buildUp'
import { quotation, rateMove } from '../../shared/contracts/resource'
import { resourceSheet } from '../../shared/contracts/resourceSheet'
import { signedIn } from '../support/factories'
import { makePricedEdition } from '../support/pricedDraft'
import { blockQuotation, material } from '../support/samplePrices'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

/** A draft whose rate of whole blocks is a block and nothing else. */
async function draft() {
  const { firmId, client } = await signedIn(server, 'estimator')
  const priced = await makePricedEdition(server, firmId)
  const of = { firmId, editionId: priced.editionId, item: 'blocks.whole' as const }
  const one = buildUp.parse({ materials: [{ resource: 'block', quantity: '1' }], labour: [], plant: [] })
  await server.db.manager.update(RateEntity, of, { buildUp: one, low: '0.75', likely: '0.8', high: '0.9' })
  const at = `/api/editions/${priced.editionId}`
  const sheet = async () => (await client.get(`${at}/resources/block`)).as(resourceSheet)
  const rate = async () => {
    const { low, likely, high } = await server.db.manager.findOneByOrFail(RateEntity, of)
    return [low, likely, high].map(Number)
  }
  return { client, at, sheet, rate, ...priced }
}

describe('quotations', () => {
  it('stand side by side, the cheapest a unit first', async () => {
    const { sheet } = await draft()
    const { quotations } = await sheet()
    // 80 / 100 = 0.8; 105 / 120 = 0.875
    expect(quotations.map(({ supplier }) => supplier)).toEqual(['First kiln', 'Second kiln'])
  })

  it('give their price, source and day when one is chosen, with the least and the most of those that hold', async () => {
    const { client, at, sheet, rate, secondQuotationId } = await draft()
    const gone = blockQuotation({ supplier: 'Gone', price: '10', day: '2020-01-01', validUntil: '2020-12-31' })
    expect((await client.post(`${at}/quotations`, gone)).status).toBe(201)
    expect((await client.post(`${at}/quotations`, blockQuotation())).status).toBe(201) // 99 / 120 = 0.825
    const asked = { quotation: secondQuotationId }
    const moves = (await client.post(`${at}/resources/block/choice/preview`, asked)).as(z.array(rateMove))
    expect(moves).toMatchObject([{ item: 'blocks.whole', after: { low: '0.8', likely: '0.88', high: '0.88' } }])
    expect(await rate()).toEqual([0.75, 0.8, 0.9])
    const chosen = (await client.put(`${at}/resources/block/choice`, asked, 1)).as(resourceSheet)
    expect(chosen.resource).toMatchObject({
      price: { low: '0.8', likely: '0.875', high: '0.875' },
      ...{ source: 'Second kiln', sourceDate: '2026-08-10', hasChosenQuotation: true, version: 2 },
    })
    expect(chosen.quotations.filter(({ isChosen }) => isChosen).map(({ id }) => id)).toEqual([secondQuotationId])
    expect(await rate()).toEqual([0.8, 0.88, 0.88])
    expect((await client.put(`${at}/resources/block/choice`, asked, 1)).error.code).toBe('stale')
    expect((await sheet()).resource.version).toBe(2)
  })

  it('take the resource and its rates along when the chosen one changes', async () => {
    const { client, at, sheet, rate, quotationId } = await draft()
    await client.put(`${at}/resources/block/choice`, { quotation: quotationId }, 1)
    const dearer = blockQuotation({ price: '100', contains: '3', day: '2026-08-10' })
    expect((await client.put(`${at}/quotations/${quotationId}`, dearer, 1)).as(quotation).isChosen).toBe(true)
    expect((await sheet()).resource.price).toEqual({ low: '0.875', likely: '33.333333', high: '33.333333' })
    expect(await rate()).toEqual([0.88, 33.33, 33.33])
  })

  it('bind the price while one is chosen, and leave it to be typed again with none', async () => {
    const { client, at, sheet, quotationId } = await draft()
    await client.put(`${at}/resources/block/choice`, { quotation: quotationId }, 1)
    const typed = material('block', { price: { low: '1', likely: '1', high: '1' } })
    expect((await client.put(`${at}/resources/block`, typed, 2)).error.issues?.[0]?.path).toBe('price')
    const removed = await client.delete(`${at}/quotations/${quotationId}`, 1)
    expect(removed.error).toMatchObject({ code: 'conflict', message: 'Choose another quotation, or none, first.' })
    const none = (await client.put(`${at}/resources/block/choice`, { quotation: null }, 2)).as(resourceSheet).resource
    expect(none).toMatchObject({ hasChosenQuotation: false, price: { likely: '0.8' }, version: 3 })
    expect((await client.put(`${at}/resources/block`, typed, 3)).status).toBe(200)
    expect((await client.delete(`${at}/quotations/${quotationId}`, 1)).status).toBe(204)
    expect((await sheet()).quotations).toHaveLength(1)
  })

  it.each([
    ['an id that is not there', v7(), 'quotation'],
    ['no id at all', 'first', 'quotation'],
  ])('are not chosen by %s', async (_what, id, path) => {
    const { client, at, sheet } = await draft()
    const answer = await client.put(`${at}/resources/block/choice`, { quotation: id }, 1)
    expect({ status: answer.status, path: answer.error.issues?.[0]?.path }).toEqual({ status: 400, path })
    expect((await sheet()).resource).toMatchObject({ version: 1, hasChosenQuotation: false })
  })

  it('leave the version of the resource where a change of another quotation does not move it', async () => {
    const { client, at, sheet, quotationId, secondQuotationId } = await draft()
    await client.put(`${at}/resources/block/choice`, { quotation: quotationId }, 1)
    const same = blockQuotation({ supplier: 'Second kiln', price: '105', reference: 'as told', day: '2026-08-10' })
    expect((await client.put(`${at}/quotations/${secondQuotationId}`, same, 1)).status).toBe(200)
    expect((await sheet()).resource.version).toBe(2)
    expect((await client.put(`${at}/quotations/${secondQuotationId}`, { ...same, price: '120' }, 2)).status).toBe(200)
    expect((await sheet()).resource).toMatchObject({ version: 3, price: { likely: '0.8', high: '1' } })
  })

  it('are chosen for their own resource only', async () => {
    const { client, at, quotationId } = await draft()
    const answer = await client.put(`${at}/resources/bar/choice`, { quotation: quotationId }, 1)
    expect(answer.error.issues).toEqual([{ path: 'quotation', message: 'expected a quotation for bar, or null for none' }])
  })

  it.each([
    ['a resource that is not there', { resource: 'ghost' }, 'resource'],
    ['nothing in it', { contains: '0' }, 'contains'],
    ['a unit price beyond all bounds', { price: '999999999', contains: '0.000001' }, 'contains'],
    ['an end before its day', { validUntil: '2026-08-31' }, 'validUntil'],
    ['a day that is none', { day: '2026-02-30' }, 'day'],
    ['two lines for a supplier', { supplier: 'a\nb' }, 'supplier'],
  ])('are refused with %s', async (_what, change, path) => {
    const { client, at } = await draft()
    const answer = await client.post(`${at}/quotations`, blockQuotation(change))
    expect({ status: answer.status, path: answer.error.issues?.[0]?.path }).toEqual({ status: 400, path })
  })
})
