import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { catalogueBlock } from '../../shared/contracts/blockCatalogue'
import { project } from '../../shared/contracts/project'
import { clientOf, makePerson, signedIn } from '../support/factories'
import { sampleBlock } from '../support/samplePrices'
import { sampleProject, sampleRibbed } from '../support/sampleProject'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
})
afterAll(() => server.close())

async function withBlock() {
  const estimator = await signedIn(server, 'estimator')
  const block = (await estimator.client.post('/api/blocks', sampleBlock({ priceCode: 'block' }))).as(catalogueBlock)
  return { ...estimator, block, at: `/api/blocks/${block.id}` }
}

describe('the block catalogue', () => {
  it('takes a block, changes it and lists it', async () => {
    const { client, at, block } = await withBlock()
    expect(block).toMatchObject({ ...sampleBlock(), priceCode: 'block', version: 1 })
    const changed = (await client.put(at, sampleBlock({ mass: 14.5, palletCount: null }), 1)).as(catalogueBlock)
    expect(changed).toMatchObject({ mass: 14.5, palletCount: null, priceCode: null, version: 2 })
    expect((await client.get('/api/blocks')).body).toEqual([changed])
  })

  it('loses nothing to a second estimator, and has each code once', async () => {
    const { client, at } = await withBlock()
    await client.put(at, sampleBlock({ mass: 14.5 }), 1)
    expect((await client.put(at, sampleBlock({ mass: 16 }), 1)).error.code).toBe('stale')
    expect((await client.delete(at, 1)).error.code).toBe('stale')
    expect((await client.post('/api/blocks', sampleBlock())).error).toMatchObject({
      code: 'conflict',
      issues: [{ path: 'code' }],
    })
  })

  it('keeps a block that a scheme is built with', async () => {
    const { client, at, block, firmId } = await withBlock()
    const surveyor = await clientOf(server, await makePerson(server, firmId, ['surveyor']))
    const { id } = (await surveyor.post('/api/projects', sampleProject())).as(project)
    await surveyor.post(`/api/projects/${id}/schemes`, { ...sampleRibbed(), blockId: block.id })
    expect((await client.delete(at, 1)).error).toMatchObject({
      code: 'conflict',
      issues: [{ path: 'id', message: '1 scheme is built with it' }],
    })
    expect((await surveyor.delete(at, 1)).error.code).toBe('forbidden')
  })

  it.each([
    ['width', { width: 20 }],
    ['height', { height: 1200 }],
    ['mass', { mass: -1 }],
    ['palletCount', { palletCount: 0 }],
    ['breakagePercent', { breakagePercent: '3 %' }],
    ['priceCode', { priceCode: '=1+1' }],
    ['material', { material: 'timber' as never }],
  ])('refuses a block whose %s no scheme could have', async (path, change) => {
    const { client } = await signedIn(server, 'estimator')
    const answer = await client.post('/api/blocks', sampleBlock(change))
    expect(answer.error).toMatchObject({ code: 'invalid_request', issues: [{ path }] })
  })
})
