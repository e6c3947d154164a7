import type { AnalysisRules } from '#shared/sizing/analysis/analysisRules'
import { remember } from '#shared/sizing/remember'

/** Rules of analysis as EN 1990 and EN 1992-1-1 have them, redistribution 0 unless given. */
export function analysisRulesOf(changes: Partial<Omit<AnalysisRules, 'influenceFor'>> = {}): AnalysisRules {
  return {
    factors: { permanent: 1.35, variable: 1.5, unloaded: 1.35, clause: 'EN 1990 6.10' },
    redistributedShare: 0,
    redistribution: { greatestShare: 0.3, greatestSpanRatio: 2, leastElasticShare: 0, clause: 'EN 1992-1-1 5.5(4)' },
    ...changes,
    influenceFor: remember(),
  }
}
