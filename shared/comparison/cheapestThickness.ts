import type { AppraisalFile, ItemCode, SolidScheme } from '../contracts/appraisal'
import type { Cost, SchemeResult } from '../contracts/appraisalResult'
import { Decimal, sumOf } from '../pricing/decimal'
import { itemisedCost } from '../pricing/itemisedCost'
import { markupFactor } from './unroundedTotal'

/** One thickness tried: whether it passes, and its total where it is priced. */
export interface ThicknessTrial {
  readonly thicknessMm: number
  readonly passes: boolean
  readonly total: string | null
}

/** The thickness a solid scheme should have, and how it was found. */
export interface ThicknessChoice {
  readonly thicknessMm: number
  /** By cost, or the least that passes where it cannot be priced. */
  readonly by: 'cost' | 'least'
  readonly trials: readonly ThicknessTrial[]
  /** What a price would need a rate for; empty where it was priced, or where there are no rates at all. */
  readonly unpriced: readonly ItemCode[]
  /** One sentence for the reader: what was tried and what it came to. */
  readonly note: string
}

/**
 * Step and greatest thickness that are tried, mm.
 *
 * Source: project rule, engine design section 3 (the firm's step); greatest as the contract allows
 */
const STEP_MM = 5
const MOST_MM = 1500

type ResultOf = (scheme: SolidScheme) => SchemeResult

/**
 * The cheapest thickness of a solid scheme among those that pass: from the least that passes upwards, step by step, until what costs
 * money beside the bars alone exceeds the best total found. Those items never get less with thickness, and bars never cost less than
 * nothing, so that no thicker slab can be cheaper. Where concrete or bars have no rate, the least that passes is taken and said so.
 *
 * Source: project rule, engine design sections 3 and 7 (least thickness is not least cost)
 * @param appraise - the engine on a file of this one scheme
 * @throws RangeError when the file has no solid scheme of that mark, or what `appraise` throws
 */
export function cheapestThickness(
  file: AppraisalFile,
  mark: string,
  appraise: (file: AppraisalFile) => { readonly schemes: readonly SchemeResult[] },
): ThicknessChoice {
  const scheme = file.schemes.find((each) => each.mark === mark)
  if (scheme?.kind !== 'solid') throw new RangeError(`expected the mark of a solid scheme, got ${mark}`)
  const resultOf: ResultOf = (tried) => appraise({ ...file, schemes: [tried] }).schemes[0]!
  const least = resultOf({ ...scheme, thickness: 'least', thicknessPer: 'scheme' })
  const unpriced = needed(least)
  if (least.cost === null || unpriced.length > 0) return leastOnly(least, unpriced)
  return cheapestFrom(least, least.cost, (thickness) => resultOf({ ...scheme, thickness, thicknessPer: 'scheme' }))
}

/** Items that change with the thickness and have no rate. */
function needed({ cost }: SchemeResult): ItemCode[] {
  return (cost?.unpriced ?? []).filter(
    (item) => item === 'concrete.slab' || item === 'formwork.edge' || item.startsWith('steel.'),
  )
}

function leastOnly({ depth, passes }: SchemeResult, unpriced: readonly ItemCode[]): ThicknessChoice {
  const why = unpriced.length > 0 ? `no rate for ${unpriced.join(', ')}` : 'no rates to price by'
  return {
    thicknessMm: depth,
    by: 'least',
    trials: [{ thicknessMm: depth, passes, total: null }],
    unpriced,
    note: `${depth} mm, the least that passes: ${why}, so the cheapest is not known`,
  }
}

function cheapestFrom(least: SchemeResult, leastCost: Cost, resultAt: (thicknessMm: number) => SchemeResult): ThicknessChoice {
  const hopeless = failuresOf(least)
  const trials: ThicknessTrial[] = []
  let best = { thicknessMm: least.depth, total: leastCost.total }
  let [result, cost] = [least, leastCost]
  for (let thicknessMm = least.depth; ;) {
    const { total } = cost
    const passes = [...failuresOf(result)].every((failure) => hopeless.has(failure))
    trials.push({ thicknessMm, passes, total })
    if (passes && new Decimal(total).lessThan(best.total)) best = { thicknessMm, total }
    thicknessMm += STEP_MM
    if (besideBars(cost).greaterThan(best.total) || thicknessMm > MOST_MM) break
    result = resultAt(thicknessMm)
    const unpriced = needed(result)
    if (result.cost === null || unpriced.length > 0) return leastOnly(least, unpriced)
    cost = result.cost
  }
  return { thicknessMm: best.thicknessMm, by: 'cost', trials, unpriced: [], note: noteOf(trials, best, leastCost) }
}

/** Checks that fail, by panel and name: what fails at the least thickness no thickness mends. */
function failuresOf({ checks }: SchemeResult): Set<string> {
  return new Set(checks.flatMap(({ level, panel, name, pass }) => (pass ? [] : [`${level} ${panel} ${name}`])))
}

/** What all but the bars costs, markups included; without declared scope, which may go by the steel. */
function besideBars(cost: Cost): Decimal {
  const amounts = itemisedCost(cost)
    .lines.filter(({ item }) => !item.startsWith('steel.') && !item.startsWith('scope.'))
    .map(({ amount }) => new Decimal(amount))
  return sumOf(amounts).times(markupFactor(cost))
}

function noteOf(
  trials: readonly ThicknessTrial[],
  best: { readonly thicknessMm: number; readonly total: string },
  { currency, total }: Cost,
): string {
  const [first, last] = [trials[0]!, trials.at(-1)!]
  const range = `${trials.length} thicknesses from ${first.thicknessMm} to ${last.thicknessMm} mm in steps of ${STEP_MM}`
  if (best.thicknessMm === first.thicknessMm)
    return `${first.thicknessMm} mm, the least that passes, is the cheapest of ${range}: ${total} ${currency}; thicker costs more in concrete than it saves in bars`
  return `${best.thicknessMm} mm is the cheapest of ${range}: ${best.total} ${currency} against ${total} at ${first.thicknessMm} mm, the least that passes`
}
