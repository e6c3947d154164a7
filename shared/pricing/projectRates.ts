import type { Rates } from '../contracts/appraisal'
import type { ProjectSheet } from '../contracts/project'
import type { EditionWithRates } from '../contracts/rateBook'

/** What the rates of a project are made of. */
export interface PricedProject {
  readonly edition: EditionWithRates
  readonly markups: Rates['markups']
  readonly overrides: ProjectSheet['overrides']
  readonly schemes: ProjectSheet['schemes']
}

/**
 * The rates that a project is priced by: the likely ones of its edition; for a scheme whose block has a price code, those built up with
 * that block; and before either what the project prices otherwise.
 *
 * Source: project rule, engine design section 6
 */
export function projectRates({ edition, markups, overrides, schemes }: PricedProject): Rates {
  const items: Rates['items'] = Object.fromEntries(edition.rates.map(({ item, likely }) => [item, likely]))
  for (const { item, rate } of overrides) items[item] = rate
  const byScheme: Rates['byScheme'] = {}
  for (const { blockId, specification } of schemes) {
    if (blockId === null || specification.kind !== 'ribbed') continue
    const own = edition.blockRates.filter((each) => each.blockId === blockId && !overrides.some(({ item }) => item === each.item))
    if (own.length > 0) byScheme[specification.mark] = Object.fromEntries(own.map(({ item, rate }) => [item, rate]))
  }
  return { currency: edition.currency, items, byScheme, markups }
}
