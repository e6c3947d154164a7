import type { CarbonFactor, CarbonMaterial, CarbonUnit } from '../contracts/factors'
import type { SchemeMeasures } from '../takeoff/schemeMeasures'

/** Materials by name, in the order they are read. */
export const CARBON_NAMES: Readonly<Record<CarbonMaterial, string>> = {
  concrete: 'concrete',
  bars: 'bars',
  mesh: 'mesh',
  blocks: 'blocks',
  formwork: 'formwork',
}

/** Materials that stay in the floor; formwork does not. */
export const BUILT_IN: readonly CarbonMaterial[] = ['concrete', 'bars', 'mesh', 'blocks']

/** How much a scheme takes of a material, in a declared unit; 0 where it takes none. */
export function carbonQuantity(material: CarbonMaterial, unit: CarbonUnit, measures: SchemeMeasures): number {
  const { concreteM3, barsKg, meshKg, meshM2, blockCount, blocksKg, soffitM2 } = measures
  const massKg = { bars: Object.values(barsKg).reduce((sum, kg) => sum + kg, 0), mesh: meshKg, blocks: blocksKg }
  if (material === 'concrete') return concreteM3
  if (material === 'formwork') return soffitM2
  if (unit === 'kg') return massKg[material]
  if (unit === 't') return massKg[material] / 1000
  return unit === 'nr' ? blockCount : meshM2
}

/** Built-in materials of which a scheme takes some. */
export function usedMaterials(measures: SchemeMeasures): CarbonMaterial[] {
  const units: Readonly<Record<CarbonMaterial, CarbonUnit>> = {
    concrete: 'm³',
    bars: 'kg',
    mesh: 'kg',
    blocks: 'nr',
    formwork: 'm²',
  }
  return BUILT_IN.filter((material) => carbonQuantity(material, units[material], measures) > 0)
}

/** The factor typed for a material and modules, if any. */
export function factorOf(
  factors: readonly CarbonFactor[],
  material: CarbonMaterial,
  modules: CarbonFactor['modules'],
): CarbonFactor | undefined {
  return factors.find((factor) => factor.material === material && factor.modules === modules)
}
