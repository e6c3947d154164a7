import type { BlockRate } from '#shared/contracts/rateBook'
import { builtUpRate } from '#shared/pricing/builtUpRate'
import { withBlockResource } from '#shared/pricing/withBlockResource'
import { IsNull, Not, type EntityManager } from 'typeorm'
import { BlockEntity } from '../../entities/rates/BlockEntity'
import type { RateEntity } from '../../entities/rates/RateEntity'
import { buildUpPricesOf, type InEdition } from './buildUpPricesOf'

type BuiltRow = Pick<RateEntity, 'item' | 'buildUp'>

/**
 * What items cost built up with the blocks of the catalogue that have a price code. A block whose code is no material of the edition has
 * none: its schemes are priced by the edition's own rates.
 */
export async function blockRatesOf(
  tx: EntityManager,
  of: InEdition,
  rates: readonly BuiltRow[],
  currency: string,
): Promise<BlockRate[]> {
  const ofBlocks = rates.flatMap(({ item, buildUp }) =>
    buildUp?.materials.some(({ isBlock }) => isBlock) ? [{ item, buildUp }] : [],
  )
  if (ofBlocks.length === 0) return []
  const blocks = await tx.find(BlockEntity, {
    where: { firmId: of.firmId, priceCode: Not(IsNull()) },
    order: { code: 'ASC' },
    take: 1000,
  })
  const asked = blocks.flatMap(({ id, priceCode }) =>
    ofBlocks.map(({ item, buildUp }) => ({
      blockId: id,
      item,
      code: priceCode!,
      buildUp: withBlockResource(buildUp, priceCode!),
    })),
  )
  const prices = await buildUpPricesOf(
    tx,
    of,
    asked.map(({ buildUp }) => buildUp),
  )
  return asked
    .filter(({ code }) => prices.resources.get(code)?.kind === 'material')
    .map(({ blockId, code, item, buildUp }) => ({
      blockId,
      code,
      item,
      rate: builtUpRate(buildUp, prices, currency).price.likely,
    }))
}
