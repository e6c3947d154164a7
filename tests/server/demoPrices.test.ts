import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { ensureDemoFirm } from '../../scripts/demoFirm'
import { DEMO_RATES } from '../../scripts/demo/demoRates'
import { FirmEntity } from '../../server/entities/firm/FirmEntity'
import { EditionEntity } from '../../server/entities/rates/EditionEntity'
import { RateBookEntity } from '../../server/entities/rates/RateBookEntity'
import { openedRate } from '../../shared/contracts/openedRate'
import { resourceSheet } from '../../shared/contracts/resourceSheet'
import { clientOf, makePerson } from '../support/factories'
import { openTestServer, type TestServer } from '../support/testServer'

let server: TestServer
beforeAll(async () => {
  server = await openTestServer()
  await server.db.manager.transaction(ensureDemoFirm)
})
afterAll(async () => {
  await server.db.manager.update(FirmEntity, { isDemo: true }, { isDemo: false })
  await server.close()
})

async function demoSurveyor() {
  const { manager } = server.db
  const { id: firmId } = await manager.findOneByOrFail(FirmEntity, { isDemo: true })
  const { id: bookId } = await manager.findOneByOrFail(RateBookEntity, { firmId, region: 'Eastmere' })
  const { id: editionId } = await manager.findOneByOrFail(EditionEntity, { firmId, bookId, number: 4 })
  return { client: await clientOf(server, await makePerson(server, firmId, ['surveyor'])), editionId }
}

describe('the demo edition', () => {
  it.each(['concrete.slab', 'blocks.whole', 'formwork.soffit', 'steel.bar.12', 'steel.mesh.A142'] as const)(
    'has a rate of %s that its build-up makes, low, likely and high',
    async (item) => {
      const { client, editionId } = await demoSurveyor()
      const { rate, built } = (await client.get(`/api/editions/${editionId}/build-up/${item}`)).as(openedRate)
      const printed = (text: string) => Number(text).toFixed(2)
      expect(built!.price).toEqual({ low: printed(rate.low), likely: printed(rate.likely), high: printed(rate.high) })
      expect(printed(rate.likely)).toBe(DEMO_RATES.find((row) => row.item === item)!.likely.toFixed(2))
      expect(built!.resources.every(({ source, sourceDate }) => source !== '' && sourceDate !== null)).toBe(true)
    },
  )

  it('has three suppliers for bars and for blocks, one of each chosen', async () => {
    const { client, editionId } = await demoSurveyor()
    for (const code of ['BAR-12', 'HC 200']) {
      const address = `/api/editions/${editionId}/resources/${encodeURIComponent(code)}`
      const { resource, quotations } = (await client.get(address)).as(resourceSheet)
      expect(quotations).toHaveLength(3)
      const chosen = quotations.filter(({ isChosen }) => isChosen)
      expect(chosen).toHaveLength(1)
      expect(Number(chosen[0]!.price) / Number(chosen[0]!.contains)).toBeCloseTo(Number(resource.price.likely), 9)
      const units = quotations.map(({ price, contains }) => Number(price) / Number(contains))
      expect(Math.min(...units)).toBeCloseTo(Number(resource.price.low), 9)
      expect(Math.max(...units)).toBeCloseTo(Number(resource.price.high), 9)
    }
  })
})
