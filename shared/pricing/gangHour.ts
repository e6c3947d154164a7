import { type BuildUpLookup, type PricedGang } from './buildUpPrices'
import { Decimal } from './decimal'
import { readThree, sumOfThree, threeDecimals, type ThreeDecimals } from './threeDecimals'

/** Cost of an hour of a gang, and how it adds up: `1 × 9.5 + 2 × 6.2`. */
export interface GangHour {
  readonly cost: ThreeDecimals
  readonly expression: string
}

/**
 * What an hour of a gang costs: so many of each of its members × the all-in cost of an hour. Null where a member is not a labour
 * resource of the edition, which `lookup` notes under `path`.
 */
export function gangHour({ members }: PricedGang, lookup: BuildUpLookup, path: string): GangHour | null {
  const found = members.flatMap(({ resource, count }) => {
    const member = lookup.resource(resource, 'labour', path)
    return member === null ? [] : [{ count: new Decimal(count), price: member.price }]
  })
  if (found.length < members.length) return null
  const costs = found.map(({ count, price }) => {
    const three = readThree(price)
    return threeDecimals((level) => three[level].times(count))
  })
  const terms = found.map(({ count, price }) => `${count.toFixed()} × ${price.likely}`)
  return { cost: sumOfThree(costs), expression: terms.join(' + ') }
}
