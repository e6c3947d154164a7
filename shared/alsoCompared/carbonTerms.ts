import type { CarbonFactor, CarbonModules } from '../contracts/factors'
import { figure } from '../sizing/figure'
import type { SchemeMeasures } from '../takeoff/schemeMeasures'
import { CARBON_NAMES, carbonQuantity, factorOf, usedMaterials } from './carbonUse'

/** Carbon of some modules, kg CO2e for all floors; what has no factor is named and not in the sum. */
export interface CarbonTerms {
  readonly terms: readonly { readonly kg: number; readonly working: string }[]
  /** As 'blocks A1-A3'. */
  readonly lacks: readonly string[]
  readonly used: readonly CarbonFactor[]
}

/**
 * Carbon of the materials built in, by the factors of one set of modules.
 *
 * Source: EN 15978:2011, modules A1 to A3 (product) and A4 (transport); factors by the firm
 */
export function carbonOfModules(measures: SchemeMeasures, factors: readonly CarbonFactor[], modules: CarbonModules): CarbonTerms {
  const found = usedMaterials(measures).map((material) => ({ material, factor: factorOf(factors, material, modules) }))
  const used = found.flatMap(({ factor }) => factor ?? [])
  return {
    terms: used.map(({ material, unit, value }) => {
      const quantity = carbonQuantity(material, unit, measures)
      return { kg: quantity * value, working: `${CARBON_NAMES[material]} ${figure(quantity, 2)} ${unit} × ${value}` }
    }),
    lacks: found.flatMap(({ material, factor }) => (factor ? [] : [`${CARBON_NAMES[material]} ${modules}`])),
    used,
  }
}

/**
 * Carbon of what is wasted on site (made, carried and thrown away) and of formwork, divided by its uses.
 *
 * Source: EN 15978:2011, module A5; factors, waste and uses by the firm
 */
export function carbonOfConstruction(measures: SchemeMeasures, factors: readonly CarbonFactor[]): CarbonTerms {
  const wasted = usedMaterials(measures).map((material) => wasteOf(measures, factors, material))
  const formwork = factorOf(factors, 'formwork', 'A1-A3')
  const quantity = carbonQuantity('formwork', 'm²', measures)
  const formworkTerm = formwork && {
    kg: (quantity * formwork.value) / formwork.uses,
    working: `formwork ${figure(quantity, 2)} m² × ${formwork.value} / ${formwork.uses} uses`,
  }
  return {
    terms: [...wasted.flatMap(({ term }) => term ?? []), ...(formworkTerm ? [formworkTerm] : [])],
    lacks: [...wasted.flatMap(({ lack }) => lack ?? []), ...(formwork ? [] : ['formwork'])],
    used: [...wasted.flatMap(({ factor }) => factor ?? []), ...(formwork ? [formwork] : [])],
  }
}

function wasteOf(measures: SchemeMeasures, factors: readonly CarbonFactor[], material: CarbonFactor['material']) {
  const made = factorOf(factors, material, 'A1-A3')
  const name = CARBON_NAMES[material]
  if (made?.wastePercent === undefined) return { lack: `waste of ${name}` }
  const carried = factorOf(factors, material, 'A4')
  const kgOf = (factor: CarbonFactor) => carbonQuantity(material, factor.unit, measures) * factor.value
  const total = kgOf(made) + (carried ? kgOf(carried) : 0)
  const working = `${name} ${made.wastePercent} % of ${figure(total, 0)} kg${carried ? ', A4 in' : ''}`
  return { term: { kg: (total * made.wastePercent) / 100, working }, factor: made }
}
