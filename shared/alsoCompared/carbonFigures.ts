import type { CarbonFactor } from '../contracts/factors'
import { figure } from '../sizing/figure'
import type { SchemeMeasures } from '../takeoff/schemeMeasures'
import type { AlsoFigure, FigureKey } from './alsoFigure'
import { type CarbonTerms, carbonOfConstruction, carbonOfModules } from './carbonTerms'
import { CARBON_NAMES } from './carbonUse'

/**
 * Embodied carbon of a scheme over its gross area, kg CO2e/m²: product (A1 to A3), transport (A4), waste and formwork (A5); and what is
 * counted of them in all, t CO2e. No factor is shipped: what the firm has not typed is named as missing. What the lighter floor saves in
 * the frame is not in.
 *
 * Source: EN 15978:2011, modules; factors by the firm
 */
export function carbonFigures(measures: SchemeMeasures, factors: readonly CarbonFactor[]): AlsoFigure[] {
  const product = carbonOfModules(measures, factors, 'A1-A3')
  const transport = carbonOfModules(measures, factors, 'A4')
  const construction = carbonOfConstruction(measures, factors)
  const perArea = (key: FigureKey, of: CarbonTerms) => areaFigure(key, of, measures.grossAreaM2)
  return [
    perArea('carbonProduct', product),
    perArea('carbonTransport', transport),
    perArea('carbonConstruction', construction),
    totalFigure([product, transport, construction]),
  ]
}

const kgOf = ({ terms }: CarbonTerms) => terms.reduce((sum, { kg }) => sum + kg, 0)

function areaFigure(key: FigureKey, of: CarbonTerms, grossAreaM2: number): AlsoFigure {
  const { terms, lacks, used } = of
  const leftOut = lacks.length > 0 ? `; leaves out ${lacks.join(', ')}` : ''
  if (terms.length === 0) return { key, value: null, working: 'no factor is typed', source: NO_FACTOR, lacks }
  const value = kgOf(of) / grossAreaM2
  const sum = terms.map(({ working }) => working).join(' + ')
  return {
    key,
    value,
    working: `(${sum}) / ${figure(grossAreaM2, 2)} m² = ${figure(value)} kg CO2e/m²${leftOut}`,
    source: sourcesOf(used),
    lacks,
  }
}

function totalFigure(all: readonly CarbonTerms[]): AlsoFigure {
  const lacks = [...new Set(all.flatMap((terms) => terms.lacks))]
  const counted = all.filter(({ terms }) => terms.length > 0)
  const key = 'carbonTotal'
  if (counted.length === 0) return { key, value: null, working: 'no factor is typed', source: NO_FACTOR, lacks }
  const value = counted.reduce((sum, terms) => sum + kgOf(terms), 0) / 1000
  const working = `(${all.map((terms) => figure(kgOf(terms), 0)).join(' + ')}) / 1000 = ${figure(value)} t CO2e`
  const leftOut = lacks.length > 0 ? `; leaves out ${lacks.join(', ')}` : ''
  const source = 'A1–A3, A4 and A5 above; beams, columns and footings, and what is saved there, not in'
  return { key, value, working: working + leftOut, source, lacks }
}

const NO_FACTOR = 'None; factors are typed with the project'

function sourcesOf(used: readonly CarbonFactor[]): string {
  return used
    .map(({ material, modules, value, unit, source, date }) => {
      return `${CARBON_NAMES[material]} ${modules}: ${value} kg CO2e/${unit}, ${source}, ${date}`
    })
    .join('; ')
}
