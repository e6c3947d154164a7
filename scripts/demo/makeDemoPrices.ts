import type { ItemCode } from '#shared/contracts/appraisal'
import type { EntityManager } from 'typeorm'
import { v7 } from 'uuid'
import { GangEntity } from '../../server/entities/rates/GangEntity'
import { QuotationEntity } from '../../server/entities/rates/QuotationEntity'
import { RateEntity } from '../../server/entities/rates/RateEntity'
import { ResourceEntity } from '../../server/entities/rates/ResourceEntity'
import { recomputeRates } from '../../server/services/rates/recomputeRates'
import { DEMO_BUILD_UPS } from './demoBuildUps'
import { DEMO_GANGS, DEMO_QUOTATIONS, DEMO_RESOURCES } from './demoResources'

/**
 * Gives a draft of the demo firm its resources, gangs, quotations and build-ups.
 * @throws Error when a build-up does not make the price that its rate has: the demo's bills rest on these to the cent
 */
export async function makeDemoPrices(tx: EntityManager, firmId: string, editionId: string): Promise<void> {
  const of = { firmId, editionId }
  const quotations = DEMO_QUOTATIONS.map(({ isChosen, ...quotation }) => ({ isChosen, row: { ...quotation, ...of, id: v7() } }))
  const resources = DEMO_RESOURCES.map(({ price, ...own }) => {
    const chosen = quotations.find(({ isChosen, row }) => isChosen && row.resource === own.code)?.row
    const taken = chosen && { quotationId: chosen.id, source: `${chosen.supplier}, ${chosen.reference}`, sourceDate: chosen.day }
    return { ...own, ...price, ...taken, ...of }
  })
  await tx.insert(ResourceEntity, resources)
  await tx.insert(
    GangEntity,
    DEMO_GANGS.map((gang) => ({ ...gang, ...of })),
  )
  await tx.insert(
    QuotationEntity,
    quotations.map(({ row }) => row),
  )
  for (const [item, buildUp] of Object.entries(DEMO_BUILD_UPS)) {
    await tx.update(RateEntity, { ...of, item: item as ItemCode }, { buildUp })
  }
  const [moved] = await recomputeRates(tx, firmId, editionId)
  if (moved !== undefined) {
    throw new Error(`demo rate ${moved.item} is ${moved.before.likely}, its build-up makes ${moved.after.likely}`)
  }
}
