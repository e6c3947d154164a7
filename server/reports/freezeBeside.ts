import type { AlsoCompared } from '#shared/alsoCompared/alsoCompared'
import { alsoRows } from '#shared/alsoCompared/alsoRows'
import {
  notLikeForLike,
  scopeStateInWords,
  undeclaredCount,
  type ScopeDifference,
  type ScopeState,
} from '#shared/alsoCompared/scopeDifferences'
import { SCOPE_ENTRIES, SCOPE_WORDS } from '#shared/alsoCompared/scopeWords'
import type { ScopeDeclaration, ScopeEntry } from '#shared/contracts/sameScope'
import type { FrozenAlsoRow, FrozenScope } from './frozenBeside'

/** Groups whose formulas would tell the labour outputs of the firm. */
const OF_THE_FIRM = ['Labour and time', 'Formwork and props']

/** What is compared beside the cost, taken out for good: figures, verdicts, formulas, no money. */
export function freezeAlsoRows(ribbed: AlsoCompared, solid: AlsoCompared): FrozenAlsoRow[] {
  return alsoRows(ribbed, solid).map((row) => {
    const { key, group, label, unit, decimals, verdict, notJudged, worse, note } = row
    const isOfTheFirm = OF_THE_FIRM.includes(group)
    const remark = [worse, notJudged, note].filter((text) => text !== '').join(' ')
    return {
      key,
      group,
      label,
      unit,
      decimals,
      ribbed: row.ribbed.value,
      solid: row.solid.value,
      better: verdict,
      remark,
      workings: isOfTheFirm ? null : { ribbed: row.ribbed.working, solid: row.solid.working },
      source: isOfTheFirm
        ? 'outputs of the firm; striking times after BS 8110-1:1997, Table 6.2'
        : sourceOf(row.ribbed.source, row.solid.source),
    }
  })
}

const sourceOf = (first: string, second: string): string => (first === second ? first : `${first}; ${second}`)

/** The same-scope declarations of two schemes, taken out for good, without their rates. */
export function freezeScope(
  scope: readonly ScopeDeclaration[],
  differences: readonly ScopeDifference[],
  marks: { readonly ribbed: string; readonly solid: string },
): FrozenScope {
  const found = (mark: string, entry: ScopeEntry) => scope.find((each) => each.scheme === mark && each.entry === entry)
  const rows = SCOPE_ENTRIES.map((entry) => {
    const [ribbed, solid] = [found(marks.ribbed, entry), found(marks.solid, entry)]
    const words = (state: ScopeState | undefined) => scopeStateInWords(state ?? 'undeclared')
    const isIn = (state: ScopeState | undefined) => state === 'priced' || state === 'inRates'
    return {
      name: SCOPE_WORDS[entry].name,
      states: { ribbed: words(ribbed?.state), solid: words(solid?.state) },
      isInTotal: { ribbed: isIn(ribbed?.state), solid: isIn(solid?.state) },
      notes: { ribbed: ribbed?.note ?? '', solid: solid?.note ?? '' },
    }
  })
  return { unequal: notLikeForLike(differences), undeclared: undeclaredCount(differences), rows }
}
