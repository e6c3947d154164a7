import type { Mesh } from '../contracts/appraisal'
import type { Quantity } from '../contracts/appraisalResult'
import { FABRIC } from '../sizing/tables/fabric'

/**
 * Steel of a scheme, kg: bars by their mass, mesh by its area as billed and nominal mass, laps in where the rules have them in the area.
 *
 * Source: BS 4449 and BS 4483, nominal masses as in the tables of `sizing`
 */
export function steelMassKg(quantities: readonly Pick<Quantity, 'item' | 'unit' | 'net' | 'analysis'>[]): number {
  const items = quantities.flatMap(({ analysis, ...quantity }) => analysis ?? [quantity])
  return items.reduce((sum, quantity) => sum + massPerUnitKg(quantity) * quantity.net, 0)
}

const MESH_PREFIX = 'steel.mesh.'

function massPerUnitKg({ item, unit }: Pick<Quantity, 'item' | 'unit'>): number {
  if (item.startsWith('steel.bar.')) return unit === 'kg' ? 1 : 1000
  return item.startsWith(MESH_PREFIX) ? FABRIC[item.slice(MESH_PREFIX.length) as Mesh].massKgPerM2 : 0
}
