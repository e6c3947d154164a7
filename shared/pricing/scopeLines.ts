import type { BillLine } from '../contracts/appraisalResult'
import type { ScopeBasis, ScopeDeclaration } from '../contracts/sameScope'
import { comparingRules } from '../takeoff/rules/comparingRules'
import type { SchemeMeasures } from '../takeoff/schemeMeasures'
import { Decimal } from './decimal'
import { printMoney } from './money'
import { toQuantity } from './toQuantity'

/** What a declared rate is multiplied by, as it is printed. */
export interface ScopeQuantity {
  readonly quantity: string
  readonly unit: string
}

/**
 * The quantity behind a declared rate: gross floor area m², concrete m³, blocks whole and cut nr, bars and mesh t, or one sum.
 *
 * Source: project rule, quantities are priced as printed
 */
export function scopeQuantity(per: ScopeBasis, measures: SchemeMeasures): ScopeQuantity {
  const printed = (value: number, unit: 'm²' | 'm³' | 'nr' | 't') => ({
    quantity: toQuantity(value, comparingRules.decimals[unit]),
    unit,
  })
  switch (per) {
    case 'grossArea':
      return printed(measures.grossAreaM2, 'm²')
    case 'concrete':
      return printed(measures.concreteM3, 'm³')
    case 'blocks':
      return printed(measures.blockCount, 'nr')
    case 'steel':
      return printed((Object.values(measures.barsKg).reduce((sum, kg) => sum + kg, 0) + measures.meshKg) / 1000, 't')
    case 'sum':
      return { quantity: '1', unit: 'sum' }
  }
}

/**
 * Bill lines of what a scheme's same-scope declarations price, in their order; before markups, each rounded as every line is.
 *
 * Source: project rule, engine design section 5 (same scope); a printed bill adds up
 * @param declarations - of any schemes; those of `mark` count
 */
export function scopeLines(
  declarations: readonly ScopeDeclaration[],
  mark: string,
  measures: SchemeMeasures,
  currency: string,
): BillLine[] {
  return declarations.flatMap((declaration) => {
    if (declaration.scheme !== mark || declaration.state !== 'priced') return []
    const { entry, rate, per } = declaration
    const { quantity, unit } = scopeQuantity(per, measures)
    return [{ item: `scope.${entry}`, quantity, unit, rate, amount: printMoney(new Decimal(quantity).times(rate), currency) }]
  })
}
