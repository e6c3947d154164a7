import type { Brief } from '../contracts/appraisal'
import { bs8110Basis } from './bs8110/bs8110Basis'
import type { CodeBasis } from './codeBasis'
import { en1992Basis } from './en1992/en1992Basis'

type Basis = Brief['basis']
type BasisMakers = { readonly [Name in Basis]: (brief: Extract<Brief, { basis: Name }>) => CodeBasis }

/** The codes of practice that are built, by the name a brief gives them; the contract of the brief lists the same. */
const codeBases: BasisMakers = { EN1992: en1992Basis, BS8110: bs8110Basis }

/**
 * The code of practice of a brief, ready to answer for its strengths and national values.
 *
 * Source: project rule, engine design section 4 (one module per code basis behind one interface)
 */
export function codeBasisOf(brief: Brief): CodeBasis {
  const make = codeBases[brief.basis] as (own: Brief) => CodeBasis // each maker takes the briefs of its own name, and this is one
  return make(brief)
}
