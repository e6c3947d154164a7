import type { ScopeDeclaration, ScopeEntry } from '../contracts/sameScope'
import { Decimal } from '../pricing/decimal'
import { scopeQuantity } from '../pricing/scopeLines'
import type { SchemeMeasures } from '../takeoff/schemeMeasures'
import { BASIS_WORDS, SCOPE_ENTRIES } from './scopeWords'
import { scopeStateInWords } from './scopeDifferences'

/** What a scheme declares of an entry, in words; null where nothing is declared. */
export interface ScopeAnswer {
  readonly entry: ScopeEntry
  readonly state: ScopeDeclaration['state']
  /** As '1,624.68 m² × 7.20 per m² of gross floor = 11697.70, before markups' or 'in the rates'. */
  readonly working: string
  readonly note: string
}

/**
 * The same-scope declarations of a scheme in the order of the list, each with how its amount comes about.
 *
 * Source: project rule, engine design section 5 (same scope)
 */
export function scopeAnswers(declarations: readonly ScopeDeclaration[], mark: string, measures: SchemeMeasures): ScopeAnswer[] {
  return declarations
    .filter(({ scheme }) => scheme === mark)
    .sort((a, b) => SCOPE_ENTRIES.indexOf(a.entry) - SCOPE_ENTRIES.indexOf(b.entry))
    .map((declaration) => {
      const { entry, state, note } = declaration
      return { entry, state, note, working: state === 'priced' ? pricing(declaration, measures) : scopeStateInWords(state) }
    })
}

function pricing({ rate, per }: Extract<ScopeDeclaration, { state: 'priced' }>, measures: SchemeMeasures): string {
  const { quantity, unit } = scopeQuantity(per, measures)
  if (per === 'sum') return `${rate}, a ${BASIS_WORDS[per]}, before markups`
  const amount = new Decimal(quantity).times(rate).toDecimalPlaces(2).toFixed(2)
  return `${quantity} ${unit} × ${rate} per ${BASIS_WORDS[per]} = ${amount}, before markups`
}
