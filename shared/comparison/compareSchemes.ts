import { itemCode } from '../contracts/appraisal'
import { type Comparison, type SchemeResult } from '../contracts/appraisalResult'
import { itemisedCost } from '../pricing/itemisedCost'
import { ledger } from './ledger'
import { type PricedScheme, tippingPoint } from './tippingPoint'

/**
 * Two priced schemes set against each other: the difference ledger and the tipping point of every rate that either uses.
 * Both are compared item by item, whatever rules they are billed by. Null where one of them is not priced.
 */
export function compareSchemes(first: SchemeResult, second: SchemeResult): Comparison | null {
  const [a, b] = [pricedOf(first), pricedOf(second)]
  if (!a || !b) return null
  const used = new Set([...a.cost.lines, ...b.cost.lines].map(({ item }) => item))
  return {
    between: [a.mark, b.mark],
    ledger: ledger(a.cost, b.cost),
    tippingPoints: itemCode.options.filter((item) => used.has(item)).map((item) => tippingPoint(item, a, b)),
  }
}

/**
 * The comparison of the two schemes with these marks; null where they are not priced.
 *
 * @throws RangeError when no scheme bears one of the marks
 */
export function compareMarks(schemes: readonly SchemeResult[], between: readonly [string, string]): Comparison | null {
  const [first, second] = between.map((mark) => {
    const scheme = schemes.find((candidate) => candidate.mark === mark)
    if (!scheme)
      throw new RangeError(`expected the mark of a scheme, as ${schemes.map((known) => known.mark).join(', ')}; got ${mark}`)
    return scheme
  })
  return compareSchemes(first!, second!)
}

function pricedOf({ mark, cost }: SchemeResult): PricedScheme | null {
  return cost && { mark, cost: itemisedCost(cost) }
}
