import { v7 } from 'uuid'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { AuditEntity } from '../../server/entities/AuditEntity'
import { BlockEntity } from '../../server/entities/rates/BlockEntity'
import { EditionEntity } from '../../server/entities/rates/EditionEntity'
import { RateEntity } from '../../server/entities/rates/RateEntity'
import { storedAppraisalFile } from '../../server/services/appraisal/storedAppraisalFile'
import { buildUp } from '../../shared/contracts/buildUp'
import { project, projectSheet } from '../../shared/contracts/project'
import { rateOverride } from '../../shared/contracts/rateOverride'
import { clientOf, makeEdition, makePerson, signedIn } from '../support/factories'
import { makePricedEdition } from '../support/pricedDraft'
import { sampleLevel, sampleProject, sampleRibbed, sampleSolid } from '../support/sampleProject'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

async function pricedProject(editionOf?: (firmId: string) => Promise<string>) {
  const surveyor = await signedIn(server, 'surveyor')
  const editionId = await (editionOf ?? ((firmId: string) => makeEdition(server, firmId)))(surveyor.firmId)
  const { id } = (await surveyor.client.post('/api/projects', sampleProject({ editionId }))).as(project)
  const at = `/api/projects/${id}`
  await surveyor.client.post(`${at}/levels`, sampleLevel())
  await surveyor.client.post(`${at}/schemes`, sampleRibbed())
  await surveyor.client.post(`${at}/schemes`, sampleSolid())
  return { ...surveyor, editionId, id, at }
}

const REASON = 'Tender of the second kiln, haulage in'

describe('a rate of a project’s own', () => {
  it('is kept with reason, author and day, prices the project and is recorded', async () => {
    const { client, at, id, firmId } = await pricedProject()
    const made = (await client.post(`${at}/overrides/concrete.slab`, { rate: '155.25', reason: REASON })).as(rateOverride)
    expect(made).toMatchObject({ item: 'concrete.slab', rate: '155.25', reason: REASON, author: 'Terry Test', version: 1 })
    const sheet = (await client.get(at)).as(projectSheet)
    expect(sheet.overrides).toEqual([made])
    expect(storedAppraisalFile(sheet)?.rates?.items['concrete.slab']).toBe('155.25')
    const events = await server.db.manager.findBy(AuditEntity, { firmId, event: 'project.rateOverridden' })
    expect(events.map(({ detail }) => detail)).toEqual([{ projectId: id, item: 'concrete.slab', rate: '155.25', reason: REASON }])
  })

  it('is lifted, and the rate of the edition holds again', async () => {
    const { client, at } = await pricedProject()
    const before = storedAppraisalFile((await client.get(at)).as(projectSheet))
    await client.post(`${at}/overrides/concrete.slab`, { rate: '155.25', reason: REASON })
    expect((await client.call('delete', `${at}/overrides/concrete.slab`, { version: 1 })).status).toBe(204)
    expect(storedAppraisalFile((await client.get(at)).as(projectSheet))).toEqual(before)
  })

  it('loses nothing to a second surveyor: stale, and made twice', async () => {
    const { client, at } = await pricedProject()
    const address = `${at}/overrides/concrete.slab`
    await client.post(address, { rate: '155.25', reason: REASON })
    expect((await client.post(address, { rate: '156', reason: 'another' })).error.code).toBe('conflict')
    expect((await client.put(address, { rate: '156', reason: 'another' }, 1)).as(rateOverride).version).toBe(2)
    expect((await client.put(address, { rate: '157', reason: 'late' }, 1)).error.code).toBe('stale')
    expect((await client.get(at)).as(projectSheet).overrides[0]!.rate).toBe('156')
  })

  it.each([
    ['a number', { rate: 155, reason: REASON }, 'rate'],
    ['a sign', { rate: '-1', reason: REASON }, 'rate'],
    ['no reason', { rate: '155', reason: ' ' }, 'reason'],
    ['a field too many', { rate: '155', reason: REASON, low: '1' }, 'low'],
  ])('is refused with %s', async (_name, body, path) => {
    const { client, at } = await pricedProject()
    const answer = await client.post(`${at}/overrides/concrete.slab`, body)
    expect(answer.error).toMatchObject({ code: 'invalid_request', issues: [{ path }] })
  })

  it('is refused for an item that is none, and for another firm’s project', async () => {
    const { client, at } = await pricedProject()
    const elsewhere = await pricedProject()
    expect((await client.post(`${at}/overrides/concrete.wall`, { rate: '1', reason: REASON })).error.code).toBe('invalid_request')
    expect((await client.post(`${elsewhere.at}/overrides/concrete.slab`, { rate: '1', reason: REASON })).status).toBe(404)
  })

  it('tells a developer neither reason nor author nor net rate', async () => {
    const { client, at, firmId } = await pricedProject()
    await client.post(`${at}/overrides/concrete.slab`, { rate: '155.271828', reason: REASON })
    const developer = await makePerson(server, firmId, ['developer'])
    await client.put(`${at}/readers`, { personIds: [developer.id] }, 1)
    const answer = await (await clientOf(server, developer)).get(`${at}/reading`)
    expect(answer.status).toBe(200)
    expect(JSON.stringify(answer.body)).not.toMatch(/155\.271828|second kiln|overrides/)
  })
})

describe('markups and blocks of a project', () => {
  it('have overheads and profit once: refused where the edition holds them', async () => {
    const { client, at, editionId } = await pricedProject()
    const holds = (await server.db.manager.findOneByOrFail(EditionEntity, { id: editionId })).holdsOverheads
    expect(holds).toBe(true)
    const input = sampleProject({ editionId })
    const markups = { ...input.markups, overheadsAndProfitPercent: '8' }
    expect((await client.put(at, { ...input, markups }, 1)).error).toMatchObject({
      code: 'invalid_request',
      issues: [{ path: 'markups.overheadsAndProfitPercent' }],
    })
    const summed = { ...input.markups, preliminariesFixed: '2500', preliminariesPerWeek: '640' }
    expect((await client.put(at, { ...input, markups: summed }, 1)).as(project).markups).toMatchObject(summed)
  })

  it('price a scheme by its own block, unless the project prices the item otherwise', async () => {
    const { client, at, firmId } = await pricedProject(async (firmId) => {
      const { editionId } = await makePricedEdition(server, firmId)
      const { manager } = server.db
      const built = buildUp.parse({ materials: [{ resource: 'bar', quantity: '1', isBlock: true }], labour: [], plant: [] })
      const three = { low: '900', likely: '900', high: '900' }
      const words = { description: 'Blocks', unit: 'nr', source: '', sourceDate: null }
      await manager.delete(RateEntity, { firmId, editionId, item: 'blocks.whole' })
      await manager.insert(RateEntity, { firmId, editionId, item: 'blocks.whole', ...three, ...words, buildUp: built as never })
      await manager.update(EditionEntity, { firmId, id: editionId }, { state: 'published' })
      return editionId
    })
    const blockId = v7()
    await server.db.manager.insert(BlockEntity, {
      ...{ firmId, id: blockId, code: 'B1', name: 'Block', material: 'fired clay', length: 200, width: 400, height: 200 },
      ...{ mass: 12.5, supplier: 'First kiln', palletCount: null, breakagePercent: '3', priceCode: 'block' },
    })
    const before = (await client.get(at)).as(projectSheet)
    expect(storedAppraisalFile(before)?.rates?.byScheme).toEqual({})
    const ribbed = before.schemes.find(({ specification }) => specification.kind === 'ribbed')!
    await client.put(`${at}/schemes/${ribbed.id}`, { ...sampleRibbed(), blockId }, ribbed.version)
    const file = storedAppraisalFile((await client.get(at)).as(projectSheet))
    expect(file?.rates?.byScheme).toEqual({ [ribbed.specification.mark]: { 'blocks.whole': '0.80' } }) // 1 × 0.8
    await client.post(`${at}/overrides/blocks.whole`, { rate: '0.91', reason: REASON })
    const own = storedAppraisalFile((await client.get(at)).as(projectSheet))?.rates
    expect(own?.byScheme).toEqual({})
    expect(own?.items['blocks.whole']).toBe('0.91')
  })
})
