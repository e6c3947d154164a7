import { OutOfScopeError } from '../../outOfScope'
import type { CodeBasis, LoadFactors, RedistributionRules } from '../codeBasis'
import { remember } from '../remember'
import type { BeamInfluence } from './beamInfluence'

/** What the analysis of strips goes by. */
export interface AnalysisRules {
  readonly factors: LoadFactors
  /** Share of the elastic support moments to be moved to the spans, 0 to 0.3, and what the code says of it. */
  readonly redistributedShare: number
  readonly redistribution: RedistributionRules
  /** Influences by the shape of strips, worked out once while one scheme is sized. */
  readonly influenceFor: ReturnType<typeof remember<BeamInfluence>>
}

/**
 * Rules of one scheme's analysis, with nothing worked out yet.
 *
 * Source: by the basis, `loadFactors` and `redistribution`
 * @param redistributionPercent - of elastic support moments
 * @throws OutOfScopeError `brief.redistribution` for more than the code allows
 */
export function analysisRules({ loadFactors, redistribution }: CodeBasis, redistributionPercent: number): AnalysisRules {
  const { greatestShare, clause } = redistribution
  if (redistributionPercent > 100 * greatestShare)
    throw new OutOfScopeError('brief.redistribution', `expected at most ${100 * greatestShare} % (${clause})`)
  return {
    factors: loadFactors,
    redistributedShare: redistributionPercent / 100,
    redistribution,
    influenceFor: remember(),
  }
}
