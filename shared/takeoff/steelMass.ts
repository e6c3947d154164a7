import type { ItemCode, Mesh, Quantity } from '../contracts/appraisal'
import { FABRIC } from '../sizing/tables/fabric'

/**
 * Steel of a scheme, kg: bars by their tonnage, mesh by its net area and nominal mass, laps not in.
 *
 * Source: BS 4449 and BS 4483, nominal masses as in the tables of `sizing`
 */
export function steelMassKg(quantities: readonly Quantity[]): number {
  return quantities.reduce((sum, { item, net }) => sum + massPerUnitKg(item) * net, 0)
}

const MESH_PREFIX = 'steel.mesh.'

function massPerUnitKg(item: ItemCode): number {
  if (item.startsWith('steel.bar.')) return 1000
  return item.startsWith(MESH_PREFIX) ? FABRIC[item.slice(MESH_PREFIX.length) as Mesh].massKgPerM2 : 0
}
