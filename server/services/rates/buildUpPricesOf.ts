import type { BuildUp } from '#shared/contracts/buildUp'
import type { BuildUpPrices, PricedGang, PricedResource } from '#shared/pricing/buildUpPrices'
import { In, type EntityManager } from 'typeorm'
import { GangEntity } from '../../entities/rates/GangEntity'
import { ResourceEntity } from '../../entities/rates/ResourceEntity'
import { plainDecimal } from '../decimalText'

type PriceRow = Pick<ResourceEntity, 'kind' | 'description' | 'unit' | 'low' | 'likely' | 'high'>

/** A stored resource as build-ups are priced by it. */
export function toPriced({ kind, description, unit, low, likely, high }: PriceRow): PricedResource {
  const price = { low: plainDecimal(low), likely: plainDecimal(likely), high: plainDecimal(high) }
  return { kind, description, unit, price }
}

/** Which edition of which firm. */
export interface InEdition {
  readonly firmId: string
  readonly editionId: string
}

/** Codes of the resources that build-ups name themselves: materials, plant and fuel. */
export const namedResources = ({ materials, plant }: BuildUp): string[] => [
  ...materials.map(({ resource }) => resource),
  ...plant.flatMap(({ resource, fuel }) => (fuel === null ? [resource] : [resource, fuel.resource])),
]

/**
 * The gangs and resources of an edition that build-ups rest on, as stored; of 50,000 resources only those few are read.
 * @param proposed - gangs as they would be: their members are read too
 */
export async function buildUpPricesOf(
  tx: EntityManager,
  of: InEdition,
  buildUps: readonly BuildUp[],
  proposed: ReadonlyMap<string, PricedGang> = new Map(),
): Promise<BuildUpPrices> {
  const gangCodes = new Set(buildUps.flatMap(({ labour }) => labour.map(({ gang }) => gang)))
  const gangRows = gangCodes.size === 0 ? [] : await tx.findBy(GangEntity, { ...of, code: In([...gangCodes]) })
  const gangs = new Map<string, PricedGang>([...gangRows.map((row) => [row.code, row] as const), ...proposed])
  const members = [...gangs.values()].flatMap((gang) => gang.members.map(({ resource }) => resource))
  const codes = new Set([...buildUps.flatMap(namedResources), ...members])
  const rows = codes.size === 0 ? [] : await tx.findBy(ResourceEntity, { ...of, code: In([...codes]) })
  return { resources: new Map(rows.map((row) => [row.code, toPriced(row)])), gangs }
}
