import type { Rates } from '#shared/contracts/appraisal'
import type { Cost, LedgerLine, SchemeResult } from '#shared/contracts/appraisalResult'
import { itemCode } from '#shared/contracts/appraisal'
import { billItem } from '#shared/contracts/appraisalResult'
import type { RateOverride } from '#shared/contracts/rateOverride'
import { ledger } from '#shared/comparison/ledger'
import { itemisedCost } from '#shared/pricing/itemisedCost'
import { priceScheme } from '#shared/pricing/priceScheme'
import { ratesOfScheme } from '#shared/pricing/ratesOfScheme'
import { RULE_SETS } from '#shared/takeoff/ruleSets'
import { itemInWords } from '../quantity/itemInWords'
import { markupName } from './markupInWords'

/** What another edition moves in the bill, and by which rate; null: that edition has none of it. */
export interface BillMove {
  readonly key: string
  readonly name: string
  readonly before: string | null
  readonly now: string | null
  readonly difference: string
}

/** The bill of a scheme under the former edition's rates, the quantities being the same. */
function costBefore({ mark, quantities }: SchemeResult, now: Cost, former: Rates, measurement: keyof typeof RULE_SETS): Cost {
  const weeks = now.markups.find((line) => line.weeks !== undefined)?.weeks
  const scope = now.lines.filter(({ item }) => item.startsWith('scope.'))
  return priceScheme(quantities, ratesOfScheme(former, mark, weeks), 1, scope, RULE_SETS[measurement])
}

function moveOf({ item, difference }: LedgerLine, before: Cost, now: Cost, overrides: readonly RateOverride[]): BillMove {
  const code = billItem.safeParse(item)
  if (!code.success) {
    const line = [...now.markups, ...before.markups].find(({ name }) => name === item)
    return { key: item, name: line === undefined ? item : markupName(line), before: null, now: null, difference }
  }
  const rateIn = (cost: Cost) => cost.lines.find((line) => line.item === item)?.rate ?? null
  const isOwn = overrides.some((own) => own.item === item)
  const name = itemInWords(code.data) + (isOwn ? ', by this project’s own rate' : '')
  return { key: item, name, before: rateIn(before), now: rateIn(now), difference }
}

/**
 * Why the bill of a scheme moved when its project took another edition: item by item, the largest first, ending at the difference of
 * the totals. Null where the two editions are of different money.
 */
export function billMoves(
  scheme: SchemeResult,
  former: Rates,
  overrides: readonly RateOverride[],
  measurement: keyof typeof RULE_SETS,
): { readonly before: Cost; readonly now: Cost; readonly moves: readonly BillMove[] } | null {
  if (scheme.cost === null || scheme.cost.currency !== former.currency) return null
  const now = itemisedCost(scheme.cost)
  const before = itemisedCost(costBefore(scheme, scheme.cost, former, measurement))
  const moves = ledger(now, before)
    .filter(({ difference }) => Number(difference) !== 0)
    .map((line) => moveOf(line, before, now, overrides))
  return { before, now, moves }
}

/** Whether a move is of an item, and so has rates. */
export const isItemMove = ({ key }: BillMove): boolean => itemCode.safeParse(key).success
