import type { BillItem, Cost } from '#shared/contracts/appraisalResult'
import { markupFactor } from '#shared/comparison/unroundedTotal'
import { Decimal, sumOf } from '#shared/pricing/decimal'
import { printMoney } from '#shared/pricing/money'
import { listText } from '../figureText'
import type { FrozenGroup } from '../frozenComparison'
import { chargedMarkups, markupWords } from './markupWords'

/** Items under one heading, in the words of the report. A family is an item code or its beginning. */
const FAMILIES: readonly { group: number; family: string; word: string }[] = [
  { group: 0, family: 'concrete.', word: 'concrete' },
  { group: 0, family: 'steel.bar.', word: 'bars' },
  { group: 0, family: 'steel.mesh.', word: 'mesh' },
  { group: 1, family: 'blocks.whole', word: 'blocks' },
  { group: 1, family: 'blocks.cut', word: 'cut blocks' },
  { group: 1, family: 'blocks.closedEnds', word: 'closing of their ends' },
  { group: 2, family: 'formwork.', word: 'formwork' },
  { group: 2, family: 'propping.', word: 'propping' },
  { group: 2, family: 'curing.', word: 'curing' },
  { group: 3, family: 'scope.', word: 'declared scope' },
]
const GROUP_COUNT = 4

interface Group {
  readonly words: readonly string[]
  /** Of the items alone, and with the markups that were joined to it. */
  readonly itemDifference: Decimal
  readonly difference: Decimal
  /** Items, or markups, that cost differently in the two schemes. */
  readonly differing: number
  readonly isMarkup: boolean
}

function amounts(cost: Cost): Map<BillItem, Decimal> {
  return new Map(cost.lines.map(({ item, amount }) => [item, new Decimal(amount)]))
}

function itemGroups(ribbed: Cost, solid: Cost): Group[] {
  const [ofRibbed, ofSolid] = [amounts(ribbed), amounts(solid)]
  const items = [...new Set([...ofRibbed.keys(), ...ofSolid.keys()])].map((item) => {
    const [first, second] = [ofRibbed.get(item) ?? new Decimal(0), ofSolid.get(item) ?? new Decimal(0)]
    const family = FAMILIES.find((candidate) => item.startsWith(candidate.family))
    if (!family) throw new RangeError(`expected a heading of the report for ${item}`)
    return { ...family, difference: first.minus(second), isUsed: !first.isZero() || !second.isZero() }
  })
  return Array.from({ length: GROUP_COUNT }, (_, group) => {
    const used = items.filter((item) => item.group === group && item.isUsed)
    const difference = sumOf(used.map((item) => item.difference))
    const words = FAMILIES.filter(({ family }) => used.some((item) => item.family === family)).map(({ word }) => word)
    const differing = used.filter((item) => !item.difference.isZero()).length
    return { words, itemDifference: difference, difference, differing, isMarkup: false }
  }).filter(({ words }) => words.length > 0)
}

function markupGroup(ribbed: Cost, solid: Cost): Group[] {
  const used = chargedMarkups(ribbed)
  if (used.length === 0) return []
  const total = ({ markups }: Cost) => sumOf(markups.map(({ amount }) => new Decimal(amount)))
  const words = markupWords(used)
  const difference = total(ribbed).minus(total(solid))
  return [{ words, itemDifference: new Decimal(0), difference, differing: used.length, isMarkup: true }]
}

function joined(first: Group, second: Group): Group {
  return {
    words: [...first.words, ...second.words],
    itemDifference: first.itemDifference.plus(second.itemDifference),
    difference: first.difference.plus(second.difference),
    differing: first.differing + second.differing,
    isMarkup: first.isMarkup && second.isMarkup,
  }
}

/** Joins a group that rests on one price alone to its neighbour: its difference ÷ its quantity would be that price. */
function withoutBareRates(groups: readonly Group[]): Group[] {
  const bare = groups.findIndex(({ differing }) => differing === 1)
  if (bare === -1 || groups.length < 2) return [...groups]
  const first = Math.min(bare, groups.length - 2)
  return withoutBareRates([...groups.slice(0, first), joined(groups[first]!, groups[first + 1]!), ...groups.slice(first + 2)])
}

function capitalised(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1)
}

/**
 * Where the difference of two priced schemes comes from, ribbed less solid, the largest first and markups last. Every group
 * rests on at least two prices that differ in effect, so that a reader who knows the quantities cannot work one back; `sway` is
 * kept back where the markups could be worked out of it.
 *
 * Source: project rule, a client sees amounts of groups and percentages
 */
export function differenceGroups(ribbed: Cost, solid: Cost): FrozenGroup[] {
  const markups = markupGroup(ribbed, solid)
  const groups = withoutBareRates([...itemGroups(ribbed, solid), ...markups])
  const isTold = markups.length === 0 || groups.some(({ isMarkup }) => isMarkup)
  const factor = markupFactor(ribbed)
  return groups
    .sort((a, b) => Number(a.isMarkup) - Number(b.isMarkup) || b.difference.abs().comparedTo(a.difference.abs()))
    .map(({ words, itemDifference, difference, isMarkup }) => ({
      label: capitalised(listText(words)),
      difference: printMoney(difference, ribbed.currency),
      sway: isTold && !isMarkup ? itemDifference.times(factor).toFixed() : null,
    }))
}
