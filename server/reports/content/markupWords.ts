import type { Cost, MarkupName } from '#shared/contracts/appraisalResult'

const WORDS: Readonly<Record<MarkupName, string>> = {
  preliminaries: 'preliminaries',
  preliminariesFixed: 'preliminaries',
  preliminariesPerWeek: 'preliminaries',
  overheadsAndProfit: 'overheads and profit',
  contingency: 'contingency',
  tax: 'tax',
}

/** Names of the markups that a cost holds: percentages and sums above zero. */
export function chargedMarkups({ markups }: Pick<Cost, 'markups'>): MarkupName[] {
  return markups.filter(({ percent, amount }) => /[1-9]/.test(percent + amount)).map(({ name }) => name)
}

/** Markups by name in the words of the report, each once. */
export function markupWords(names: readonly MarkupName[]): string[] {
  return [...new Set(names.map((name) => WORDS[name]))]
}
