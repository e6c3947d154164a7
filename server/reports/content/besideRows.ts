import { figureText } from '../figureText'
import type { FrozenComparison } from '../frozenComparison'
import type { FrozenAlsoRow } from '../frozenBeside'
import type { SchemeKind } from './headline'
import type { ReportFact } from './reportFact'

/** A row of what is compared beside the cost, as text. */
export interface BesideRow {
  readonly label: string
  readonly unit: string
  readonly ribbed: string
  readonly solid: string
  readonly better: SchemeKind | null
  /** 'solid better', 'the same' or empty. */
  readonly verdict: string
  readonly remark: string
}

export interface BesideGroup {
  readonly name: string
  readonly rows: readonly BesideRow[]
}

const VERDICTS = { ribbed: 'ribbed better', solid: 'solid better', same: 'the same' } as const

function rowOf({ label, unit, decimals, ribbed, solid, better, remark }: FrozenAlsoRow): BesideRow {
  const shown = (value: number | null) => (value === null ? 'no figure' : figureText(value, decimals))
  return {
    label,
    unit,
    ribbed: shown(ribbed),
    solid: shown(solid),
    better: better === 'same' ? null : better,
    verdict: better === null ? '' : VERDICTS[better],
    remark,
  }
}

/** What is compared beside the cost, in groups; rows without a figure in either are left out. Empty for older comparisons. */
export function besideGroups({ alsoCompared = [] }: FrozenComparison): BesideGroup[] {
  const rows = alsoCompared.filter(({ ribbed, solid }) => ribbed !== null || solid !== null)
  return [...new Set(rows.map(({ group }) => group))].map((name) => ({
    name,
    rows: rows.filter(({ group }) => group === name).map(rowOf),
  }))
}

/** How each figure beside the cost came about: the formula with its numbers for both schemes, and the source. */
export function besideWorkings({ alsoCompared = [], ribbed, solid }: FrozenComparison): ReportFact[] {
  return alsoCompared.map(({ label, workings, source }) => {
    const of = (mark: string, working: string) => `${mark}: ${working}. `
    const formulas = workings ? of(ribbed.specification.mark, workings.ribbed) + of(solid.specification.mark, workings.solid) : ''
    return { title: label, text: `${formulas}Source: ${source}.` }
  })
}

/** A caution beside the totals: that they are not like for like, or that part of the scope is not declared. Empty: nothing to say. */
export function scopeCaution({ scope }: FrozenComparison): string {
  if (scope === undefined) return ''
  const undeclared = scope.undeclared === 0 ? '' : `Of the same-scope list ${scope.undeclared} entries are not declared.`
  return [scope.unequal === '' ? '' : `${scope.unequal}.`, undeclared].filter((text) => text !== '').join(' ')
}

/** Entries of the scope of which something is declared, as both schemes stand to them; the reasons in brackets. */
export function scopeFacts({ scope, ribbed, solid }: FrozenComparison): ReportFact[] {
  const declared = (scope?.rows ?? []).filter(({ states }) => states.ribbed !== 'not declared' || states.solid !== 'not declared')
  return declared.map(({ name, states, notes }) => {
    const of = (state: string, mark: string, note: string) => `${state} for ${mark}${note === '' ? '' : ` (${note})`}`
    const text = `${of(states.ribbed, ribbed.specification.mark, notes.ribbed)}; ${of(states.solid, solid.specification.mark, notes.solid)}.`
    return { title: name.charAt(0).toUpperCase() + name.slice(1), text }
  })
}
