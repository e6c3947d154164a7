import type { Cost, SchemeResult } from '#shared/contracts/appraisalResult'
import { Decimal, sumOf } from '#shared/pricing/decimal'
import { itemisedCost } from '#shared/pricing/itemisedCost'
import type { WorkSection } from '../quantity/itemInWords'
import { WORK_SECTIONS, workSectionOf } from '../quantity/itemInWords'
import type { Pair } from './phrase'

const MARKUPS = {
  plain: 'Preliminaries, contingency, tax',
  withOverheads: 'Preliminaries, overheads and profit, contingency, tax',
} as const

/** Cost of one work section in both schemes, exact decimal strings. */
export interface SectionCost {
  readonly name: WorkSection | (typeof MARKUPS)[keyof typeof MARKUPS]
  readonly amounts: Pair<string>
}

function ofSection(cost: Cost, section: WorkSection): Decimal {
  return sumOf(
    itemisedCost(cost)
      .lines.filter(({ item }) => workSectionOf(item) === section)
      .map(({ amount }) => new Decimal(amount)),
  )
}

/** Costs by work section, markups last, sections that cost nothing in both left out; empty where either is not priced. */
export function costBySection({ ribbed, solid }: Pair<SchemeResult>): SectionCost[] {
  const [first, second] = [ribbed.cost, solid.cost]
  if (first === null || second === null) return []
  const row = (name: SectionCost['name'], a: Decimal, b: Decimal) => ({ name, a, b })
  const markups = (cost: Cost) => sumOf(cost.markups.map(({ amount }) => new Decimal(amount)))
  const hasOverheads = [...first.markups, ...second.markups].some(({ name }) => name === 'overheadsAndProfit')
  return [
    ...WORK_SECTIONS.map((section) => row(section, ofSection(first, section), ofSection(second, section))),
    row(hasOverheads ? MARKUPS.withOverheads : MARKUPS.plain, markups(first), markups(second)),
  ]
    .filter(({ a, b }) => !a.isZero() || !b.isZero())
    .map(({ name, a, b }) => ({ name, amounts: { ribbed: a.toFixed(), solid: b.toFixed() } }))
}
