import type { BillLine, Comparison, Cost, SchemeResult } from '#shared/contracts/appraisalResult'
import { billItem } from '#shared/contracts/appraisalResult'
import { Decimal, sumOf } from '#shared/pricing/decimal'
import { itemisedCost } from '#shared/pricing/itemisedCost'
import { printMoney } from '#shared/pricing/money'
import { formatDecimal } from '../base/formatDecimal'
import { markupName, markupWorking } from '../bill/markupInWords'
import { rateDecimals } from '../bill/rateDecimals'
import type { Pair } from '../compare/phrase'
import { itemInWords } from '../quantity/itemInWords'

/** One line of the ledger as it is read. Amounts are exact decimal strings. */
export interface LedgerRow {
  readonly key: string
  readonly name: string
  /** How the amounts came about: quantities and rate, or what a markup is charged on. */
  readonly working: string
  readonly ribbed: string
  readonly solid: string
  readonly difference: string
  readonly running: string
}

export interface LedgerRows {
  readonly rows: readonly LedgerRow[]
  /** What costs the same in both, taken together; null where there is none. */
  readonly same: { readonly names: string; readonly amount: string; readonly difference: string } | null
  readonly total: Pair<string> & { readonly difference: string }
}

/** The engine's ledger made readable: names, workings, and what is the same in both taken together. */
export function ledgerRows(comparison: Comparison, pair: Pair<SchemeResult>): LedgerRows | null {
  const [ribbed, solid] = [pair.ribbed.cost, pair.solid.cost]
  if (ribbed === null || solid === null) return null
  const lines = comparison.ledger.map((line) => ({
    ...line,
    key: line.item,
    ribbed: line.first,
    solid: line.second,
    ...named(line.item, ribbed, solid),
  }))
  const print = (amount: Decimal) => printMoney(amount, ribbed.currency)
  const same = lines.filter(({ difference }) => Number(difference) === 0)
  return {
    rows: lines.filter(({ difference }) => Number(difference) !== 0),
    same:
      same.length === 0
        ? null
        : {
            names: same.map(({ name }) => name.charAt(0).toLowerCase() + name.slice(1)).join(', '),
            difference: print(new Decimal(0)),
            amount: print(sumOf(same.map(({ first }) => new Decimal(first)))),
          },
    total: {
      ribbed: ribbed.total,
      solid: solid.total,
      difference: print(new Decimal(ribbed.total).minus(solid.total)),
    },
  }
}

function named(item: string, ribbed: Cost, solid: Cost): { name: string; working: string } {
  const code = billItem.safeParse(item)
  if (!code.success) {
    const lines = [...ribbed.markups, ...solid.markups].filter(({ name }) => name === item)
    return { name: lines[0] === undefined ? item : markupName(lines[0]), working: markupWorking(lines) }
  }
  const lines = [ribbed, solid].flatMap((cost) => itemisedCost(cost).lines.find((line) => line.item === item) ?? [])
  const quantities = lines.map((line) => formatDecimal(line.quantity))
  const units = [...new Set(lines.map((line) => line.unit))]
  const rateOf = (line: BillLine) => formatDecimal(line.rate, { decimals: rateDecimals(line.rate, ribbed.currency) })
  const rates = [...new Set(lines.map(rateOf))]
  const working =
    units.length === 1
      ? `${quantities.join(' and ')} ${units[0]} at ${rates.join(' and ')}`
      : lines.map((line, at) => `${quantities[at]} ${line.unit} at ${rateOf(line)}`).join(' and ')
  return { name: itemInWords(code.data), working }
}
