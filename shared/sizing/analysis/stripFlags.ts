import type { Edge } from '../../contracts/appraisal'
import type { RedistributionRules, SpanPosition } from '../codeBasis'
import { figure } from '../figure'
import { type Strip, stripText } from './strip'

/** How a one-way panel was analysed. */
export interface StripAnalysis {
  readonly strip: Strip
  readonly position: SpanPosition
  readonly method: 'coefficients' | 'elastic'
  readonly redistributedShare: number
  /** Share that the brief asks for. */
  readonly askedShare: number
  /** Edges, numbers from 0, off which load on other spans may lift the panel. */
  readonly liftedEdges: readonly number[]
}

/**
 * How a one-way panel was analysed, in sentences: method, strip, redistribution, uplift.
 *
 * Source: project rule, what was assumed is stated (engine design section 4)
 */
export function stripFlags(analysis: StripAnalysis, rules: RedistributionRules): string[] {
  const { strip, position, liftedEdges } = analysis
  if (position === 'cantilever')
    return ['cantilever: moment and shear by statics; distribution bars across its top bars are not included']
  return [
    methodFlag(analysis),
    ...(strip.spans.length > 1 ? [`analysed in the strip ${stripText(strip)}`] : []),
    ...redistributionFlag(analysis, rules),
    ...(strip.assumedEnds > 0
      ? ['continuous edge without a neighbour spanning the same way: an equal span is assumed behind it']
      : []),
    ...(liftedEdges.length > 0
      ? [`load on other spans may lift it off ${edgesText(liftedEdges)}: expected to be held down there, not checked`]
      : []),
  ]
}

const edgesText = (edges: readonly number[]) => `edge${edges.length > 1 ? 's' : ''} ${edges.map((edge) => edge + 1).join(', ')}`

function methodFlag({ strip, method }: StripAnalysis): string {
  if (strip.spans.length === 1) return 'one way, simple span'
  return method === 'coefficients'
    ? 'one way, coefficients of BS 8110-1 Table 3.12 (3.5.2.3 holds; 20 % redistribution included)'
    : 'one way, elastic continuous beam with pattern loading (conditions of BS 8110-1 3.5.2.3 do not hold)'
}

function redistributionFlag(analysis: StripAnalysis, { greatestSpanRatio, clause }: RedistributionRules): string[] {
  const { strip, method, redistributedShare, askedShare } = analysis
  const supported = strip.spans.filter(({ isCantilever }) => !isCantilever).length
  if (askedShare === 0 || supported === 1) return []
  if (method === 'coefficients') return ['redistribution of the brief is not added to that of the coefficients']
  if (redistributedShare === 0)
    return [`support moments are not redistributed: neighbouring spans differ by more than ${greatestSpanRatio} to 1 (${clause})`]
  return [`support moments redistributed by ${figure(100 * redistributedShare)} % (${clause}), the spans take what they lose`]
}

/**
 * Edges at which what was typed to go on behind them is of no use, because the panel does not span there.
 *
 * Source: project rule, nothing typed is passed over in silence
 * @param borne - numbers of the edges that the panel's strip goes over
 */
export function idleBeyondFlags(edges: readonly Edge[], borne: readonly number[]): string[] {
  const idle = edges.flatMap(({ beyond }, edge) => (beyond && !borne.includes(edge) ? [edge] : []))
  if (idle.length === 0) return []
  return [`${edgesText(idle)}: what was typed to go on behind makes no difference, the panel is not in a strip there`]
}
