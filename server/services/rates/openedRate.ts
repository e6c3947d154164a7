import type { BuildUp } from '#shared/contracts/buildUp'
import type { OpenedBuildUp, OpenedRate } from '#shared/contracts/openedRate'
import { builtUpRate, type BuiltUpLine } from '#shared/pricing/builtUpRate'
import { withBlockResource } from '#shared/pricing/withBlockResource'
import { In, type EntityManager } from 'typeorm'
import { GangEntity } from '../../entities/rates/GangEntity'
import { QuotationEntity } from '../../entities/rates/QuotationEntity'
import { RateEntity } from '../../entities/rates/RateEntity'
import { ResourceEntity } from '../../entities/rates/ResourceEntity'
import { AppError } from '../../errors'
import type { SignedIn } from '../session/signedIn'
import { buildUpPricesOf, type InEdition } from './buildUpPricesOf'
import { editionCurrency } from './editionCurrency'
import { rateRefused } from './rateRefused'
import { toRate } from './rateRow'
import type { RatePlace } from './rateService'
import { readableEdition } from './readableEdition'
import { toGang, toQuotation, toResource } from './resourceRows'

/** Where each line's amount or output comes from, and the resources in it, in the order of the lines. */
function behindLines({ materials, labour, plant }: BuildUp, gangs: readonly GangEntity[]) {
  const membersOf = (code: string) => gangs.find((gang) => gang.code === code)?.members.map(({ resource }) => resource) ?? []
  return [
    ...materials.map(({ source, resource }) => ({ source, inputs: [resource] })),
    ...labour.map(({ source, gang }) => ({ source, inputs: membersOf(gang) })),
    ...plant.map(({ source, resource, fuel }) => ({ source, inputs: fuel === null ? [resource] : [resource, fuel.resource] })),
  ]
}

function toLine(line: BuiltUpLine, { source, inputs }: { source: string; inputs: string[] }) {
  const { kind, code, name, expression, low, likely, high } = line
  return { kind, code, name, expression, low, likely, high, source, inputs }
}

async function opened(db: EntityManager, of: InEdition, buildUp: BuildUp, currency: string): Promise<OpenedBuildUp> {
  const prices = await buildUpPricesOf(db, of, [buildUp])
  const codes = <T>(map: ReadonlyMap<string, T>) => In([...map.keys()])
  const inOrder = { order: { code: 'ASC' } } as const
  const resources = await db.find(ResourceEntity, { where: { ...of, code: codes(prices.resources) }, ...inOrder })
  const gangs = await db.find(GangEntity, { where: { ...of, code: codes(prices.gangs) }, ...inOrder })
  const chosenIds = resources.flatMap(({ quotationId }) => quotationId ?? [])
  const chosen = await db.findBy(QuotationEntity, { ...of, id: In(chosenIds) })
  const { lines, net, overheads, profit, price } = rateRefused(() => builtUpRate(buildUp, prices, currency))
  const behind = behindLines(buildUp, gangs)
  return {
    lines: lines.map((line, index) => toLine(line, behind[index]!)),
    ...{ net, overheads, profit, price },
    resources: resources.map(toResource),
    gangs: gangs.map(toGang),
    chosen: chosen.map((row) => toQuotation(row, row.id)),
  }
}

/**
 * A rate of an edition with what it is built up from, for whoever may read the edition.
 * @param block - code of the resource that stands for a scheme's block, where one is asked for
 * @throws AppError `forbidden`, `not_found`, `invalid_request` for a block that is no material of the edition
 */
export async function readOpenedRate(
  db: EntityManager,
  who: SignedIn,
  { editionId, item }: RatePlace,
  block?: string,
): Promise<OpenedRate> {
  await readableEdition(db, who, editionId)
  const of = { firmId: who.firmId, editionId }
  const row = await db.findOneBy(RateEntity, { ...of, item })
  if (row === null) throw new AppError('not_found')
  const currency = await editionCurrency(db, who.firmId, editionId)
  const { buildUp } = row
  if (buildUp === null) return { currency, rate: toRate(row), built: null }
  const asked = block === undefined ? buildUp : withBlockResource(buildUp, block)
  return { currency, rate: toRate(row), built: await opened(db, of, asked, currency) }
}
