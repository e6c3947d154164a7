import type { Brief } from '../contracts/appraisal'
import { OutOfScopeError } from '../outOfScope'
import type { CodeBasis } from './codeBasis'
import { en1992Basis } from './en1992/en1992Basis'

type Basis = Brief['basis']
type BasisMakers = { readonly [Name in Basis]?: (brief: Extract<Brief, { basis: Name }>) => CodeBasis }

/** The codes of practice that are built, by the name a brief gives them. */
const codeBases: BasisMakers = { EN1992: en1992Basis }

/**
 * The code of practice of a brief, ready to answer for its strengths.
 *
 * Source: project rule, engine design section 4 (one module per code basis behind one interface)
 * @throws OutOfScopeError `brief.basis` for a code that is not built
 */
export function codeBasisOf(brief: Brief): CodeBasis {
  const basis = brief.basis === 'EN1992' ? codeBases.EN1992?.(brief) : codeBases.BS8110?.(brief)
  if (!basis) throw new OutOfScopeError('brief.basis', `expected one of ${Object.keys(codeBases).join(', ')}`)
  return basis
}
