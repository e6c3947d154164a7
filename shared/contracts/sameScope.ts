/** What is priced, in the rates already or left out, scheme by scheme, so that totals are set against each other like for like. */
import { z } from 'zod'
import { decimalString, line, mark, optionalLine } from './primitives'

/** What a floor takes beside the measured items and may be priced in one scheme and forgotten in another. */
export const scopeEntry = z.enum([
  'ceiling', // plaster or ceiling; blocks need one
  'floorFinish', // floor finish for sound
  'storeyHeight', // storey height and cladding
  'ribbedConcrete', // small aggregate, pump, slow placing
  'groutLost', // grout lost into blocks
  'deck', // full or open deck
  'propping', // propping weeks and height
  'hoisting',
  'leastGang',
  'lineLoads',
  'trimmingBars',
  'tiesChairsLinks',
  'loadDirection', // direction of load on beams
])

/** Items of a bill that a same-scope declaration prices, one for each entry. */
export const scopeItem = z.enum([
  'scope.ceiling',
  'scope.floorFinish',
  'scope.storeyHeight',
  'scope.ribbedConcrete',
  'scope.groutLost',
  'scope.deck',
  'scope.propping',
  'scope.hoisting',
  'scope.leastGang',
  'scope.lineLoads',
  'scope.trimmingBars',
  'scope.tiesChairsLinks',
  'scope.loadDirection',
])

/** What a declared rate is multiplied by: gross floor area m², concrete m³, blocks whole and cut nr, bars and mesh t, or nothing. */
export const scopeBasis = z.enum(['grossArea', 'concrete', 'blocks', 'steel', 'sum'])

const rateAboveZero = decimalString.regex(/[1-9]/, 'expected a rate above zero; what costs nothing is in the rates or left out')
const note = optionalLine(160).default('')

/** One entry of one scheme: priced, before markups; in the rates already; or left out, with the reason. */
export const scopeDeclaration = z.discriminatedUnion('state', [
  z.strictObject({ scheme: mark, entry: scopeEntry, state: z.literal('priced'), rate: rateAboveZero, per: scopeBasis, note }),
  z.strictObject({ scheme: mark, entry: scopeEntry, state: z.literal('inRates'), note }),
  z.strictObject({ scheme: mark, entry: scopeEntry, state: z.literal('leftOut'), note: line(160) }),
])

/** Declarations of all schemes, each entry of a scheme at most once; what is not there is not declared. */
export const scope = z
  .array(scopeDeclaration)
  .max(260)
  .superRefine((declarations, context) => {
    const seen = new Set<string>()
    declarations.forEach(({ scheme, entry }, index) => {
      const key = `${scheme} ${entry}`
      if (seen.has(key))
        context.addIssue({
          code: 'custom',
          path: [index, 'entry'],
          message: `expected ${entry} of ${scheme} to be declared once`,
        })
      seen.add(key)
    })
  })

type DeclaredScheme = { readonly mark: string; readonly kind: 'ribbed' | 'solid' }

/** What is wrong with one declaration of a list. */
export interface ScopeFault {
  readonly index: number
  readonly field: 'scheme' | 'per'
  readonly message: string
}

/** What a declaration cannot say of the schemes there are: of one that is none of them, or by the block where there is no block. */
export function scopeFaults(declarations: readonly ScopeDeclaration[], schemes: readonly DeclaredScheme[]): ScopeFault[] {
  return declarations.flatMap((declaration, index): ScopeFault[] => {
    const scheme = schemes.find(({ mark }) => mark === declaration.scheme)
    if (scheme === undefined)
      return [{ index, field: 'scheme', message: `expected one of ${schemes.map(({ mark }) => mark).join(', ')}` }]
    if (scheme.kind === 'ribbed' || declaration.state !== 'priced' || declaration.per !== 'blocks') return []
    return [{ index, field: 'per', message: 'expected another basis: a solid scheme has no blocks' }]
  })
}

/** Those declarations that the schemes can have; a scheme that is no more leaves its own behind. */
export function declaredFor(declarations: readonly ScopeDeclaration[], schemes: readonly DeclaredScheme[]): ScopeDeclaration[] {
  const faulty = new Set(scopeFaults(declarations, schemes).map(({ index }) => index))
  return declarations.filter((_, index) => !faulty.has(index))
}

/** A declaration as those who may see no rate see it. */
export const scopeStanding = z.strictObject({
  scheme: mark,
  entry: scopeEntry,
  state: z.enum(['priced', 'inRates', 'leftOut']),
  note: z.string(),
})

export type ScopeEntry = z.infer<typeof scopeEntry>
export type ScopeItem = z.infer<typeof scopeItem>
export type ScopeBasis = z.infer<typeof scopeBasis>
export type ScopeDeclaration = z.infer<typeof scopeDeclaration>
export type ScopeStanding = z.infer<typeof scopeStanding>
