import type { LabourLine, MaterialLine, PlantLine } from '../contracts/buildUp'
import type { ResourceKind } from '../contracts/resource'
import type { BuildUpLookup, PricedResource } from './buildUpPrices'
import { Decimal } from './decimal'
import { gangHour } from './gangHour'
import { readThree, threeDecimals, type ThreeDecimals } from './threeDecimals'

/** What one line of a build-up adds to a unit of the work; the expression has the likely prices in it. */
export interface PricedLine {
  readonly kind: ResourceKind
  /** Code of the resource or the gang. */
  readonly code: string
  readonly name: string
  readonly expression: string
  readonly amount: ThreeDecimals
}

/** Delivered price × quantity × (1 + waste) ÷ uses. */
export function materialAmount(line: MaterialLine, lookup: BuildUpLookup, path: string): PricedLine | null {
  const { quantity, wastePercent, uses } = line
  const material = lookup.resource(line.resource, 'material', `${path}.resource`)
  if (material === null) return null
  const price = readThree(material.price)
  const factor = new Decimal(quantity).times(new Decimal(wastePercent).div(100).plus(1))
  const waste = Number(wastePercent) === 0 ? '' : ` × (1 + ${wastePercent} %)`
  return {
    kind: 'material',
    code: line.resource,
    name: material.description,
    expression: `${quantity} ${material.unit} × ${material.price.likely}${waste}${uses === 1 ? '' : ` ÷ ${uses} uses`}`,
    amount: threeDecimals((level) => price[level].times(factor).div(uses)),
  }
}

/** Cost of the gang's hour × hours for a unit of the work, or ÷ units of the work in an hour. */
export function labourAmount({ gang, basis, value }: LabourLine, lookup: BuildUpLookup, path: string): PricedLine | null {
  const found = lookup.gang(gang, `${path}.gang`)
  const hour = found && gangHour(found, lookup, `${path}.gang`)
  if (found === null || hour === null) return null
  const { cost } = hour
  const isHours = basis === 'hours'
  return {
    kind: 'labour',
    code: gang,
    name: found.description,
    expression: `(${hour.expression}) ${isHours ? `× ${value} h` : `÷ ${value} an hour`}`,
    amount: threeDecimals((level) => (isHours ? cost[level].times(value) : cost[level].div(value))),
  }
}

/** (Hire of an hour + fuel of an hour) ÷ units of the work in an hour. */
export function plantAmount(line: PlantLine, lookup: BuildUpLookup, path: string): PricedLine | null {
  const { fuel, outputPerHour } = line
  const plant = lookup.resource(line.resource, 'plant', `${path}.resource`)
  const fuelResource = fuel === null ? null : lookup.resource(fuel.resource, 'material', `${path}.fuel.resource`)
  if (plant === null || (fuel !== null && fuelResource === null)) return null
  const hire = readThree(plant.price)
  const burnt = fuel === null || fuelResource === null ? null : burntInAnHour(fuelResource, fuel.perHour)
  const hour = burnt === null ? plant.price.likely : `(${plant.price.likely} + ${burnt.expression})`
  return {
    kind: 'plant',
    code: line.resource,
    name: plant.description,
    expression: `${hour} ÷ ${outputPerHour} an hour`,
    amount: threeDecimals((level) => hire[level].plus(burnt?.amount[level] ?? 0).div(outputPerHour)),
  }
}

function burntInAnHour({ price, unit }: PricedResource, perHour: string) {
  const three = readThree(price)
  return {
    expression: `${perHour} ${unit} × ${price.likely}`,
    amount: threeDecimals((level) => three[level].times(perHour)),
  }
}
