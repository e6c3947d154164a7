import type { BarLayer } from '../../../contracts/appraisal'
import { type Candidate, chooseLeastMass } from '../../bars/chooseLeastMass'
import type { Flexure } from '../../codeBasis'
import type { Finding } from '../../finding'
import { CHOSEN_DIAMETERS } from '../../tables/bars'
import { chooseLongBottom, shortFindings, shortLayer } from './chooseBottomBars'
import { chooseTopBars, type TopBars } from './chooseTopBars'
import { inStrips } from './firstMeeting'
import { midspanFlexure } from '../layerFindings'
import { layerDepthMm, type SlabContext, topPlaces } from '../slabContext'
import type { StripLayers } from './slabLayer'
import { bottomParts, stripsMassKg } from './slabMass'
import { type TorsionBars, torsionBars } from './torsionBars'

/** All bars of a solid panel, and what the checks find. */
export interface SlabBars {
  readonly bottom: Readonly<Record<'short' | 'long', StripLayers>>
  readonly tops: readonly TopBars[]
  readonly torsion: readonly TorsionBars[]
  readonly midspan: Flexure
  readonly findings: readonly Finding[]
}

/** Bottom bars with one layer in the direction spanned first, and all that follows from it. */
type BottomBars = Omit<SlabBars, 'tops' | 'findings'>

function candidateOf(context: SlabContext, layer: BarLayer): Candidate<BottomBars> {
  const { analysis, given } = context
  const midspan = midspanFlexure(context, 'short', layer.diameter, null)
  const depthMm = layerDepthMm(context, layer.diameter, null)
  const short = given ? { middle: layer, edge: null } : inStrips(context, layer, depthMm)
  const across = chooseLongBottom(context, layer)
  const bottom = { short, long: across.option }
  const torsion = torsionBars(context, midspan.requiredMm2)
  const own = stripsMassKg(context, short, bottomParts(context, analysis.short.axis, layer), analysis.other.clearMm, false)
  return {
    option: { bottom, torsion, midspan },
    massKg: own + across.massKg + torsion.reduce((sum, each) => sum + each.massKg, 0),
    findings: () => [...shortFindings(context, layer), ...across.findings()],
  }
}

/**
 * All bars of a solid panel: the given ones, or the set of least total mass, corner steel included.
 *
 * Source: project rule, engine design section 4 (set of least total mass that passes every check)
 */
export function chooseSlabBars(context: SlabContext): SlabBars {
  const tops = topPlaces(context).map((place) => chooseTopBars(context, place))
  const candidates = context.given
    ? [candidateOf(context, context.given.bottomX)]
    : CHOSEN_DIAMETERS.map((diameter) => candidateOf(context, shortLayer(context, diameter)))
  const best = chooseLeastMass(candidates)
  return { ...best.option, tops, findings: [...best.findings(), ...tops.flatMap(({ findings }) => findings)] }
}
