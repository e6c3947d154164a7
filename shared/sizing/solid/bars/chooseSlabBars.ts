import type { BarLayer } from '../../../contracts/appraisal'
import { type Candidate, chooseLeastMass } from '../../bars/chooseLeastMass'
import type { Flexure } from '../../codeBasis'
import { type Finding, isMet } from '../../finding'
import { CHOSEN_DIAMETERS } from '../../tables/bars'
import { chooseLongBottom, shortFindings, shortLayer } from './chooseBottomBars'
import { chooseTopBars, type TopBars } from './chooseTopBars'
import { inStrips } from './firstMeeting'
import { midspanFlexure } from '../layerFindings'
import { layerDepthMm, type SlabContext } from '../slabContext'
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

/** Bottom bars in the direction spanned first alone: their mass, and what the checks find of them. */
interface ShortBars {
  readonly layer: BarLayer
  readonly strips: StripLayers
  readonly massKg: number
  readonly findings: readonly Finding[]
}

function shortBars(context: SlabContext, layer: BarLayer): ShortBars {
  const { analysis, given } = context
  const strips = given ? { middle: layer, edge: null } : inStrips(context, layer, layerDepthMm(context, layer.diameter, null))
  const piece = bottomParts(context, analysis.short.axis, layer)
  const massKg = stripsMassKg(context, strips, piece, analysis.other.clearMm, false)
  return { layer, strips, massKg, findings: shortFindings(context, layer) }
}

function candidateOf(context: SlabContext, { layer, strips, massKg, findings }: ShortBars): Candidate<BottomBars> {
  const midspan = midspanFlexure(context, 'short', layer.diameter, null)
  const across = chooseLongBottom(context, layer)
  const torsion = torsionBars(context, midspan.requiredMm2)
  return {
    option: { bottom: { short: strips, long: across.option }, torsion, midspan },
    massKg: massKg + across.massKg + torsion.reduce((sum, each) => sum + each.massKg, 0),
    findings: () => [...findings, ...across.findings()],
  }
}

const pass = (findings: readonly Finding[]) => findings.every(({ demand, capacity }) => isMet(demand, capacity))

/**
 * The lightest bottom bars that pass every check; null where none does. Bars that weigh more in one direction than the best so far in
 * both are passed over.
 */
function lightestPassing(context: SlabContext, all: readonly ShortBars[]): Candidate<BottomBars> | null {
  let best: Candidate<BottomBars> | null = null
  for (const each of all.filter(({ findings }) => pass(findings)).sort((a, b) => a.massKg - b.massKg)) {
    if (best && each.massKg > best.massKg) return best
    const candidate = candidateOf(context, each)
    if ((!best || candidate.massKg < best.massKg) && pass(candidate.findings())) best = candidate
  }
  return best
}

/**
 * All bars of a solid panel: the given ones, or the set of least total mass, corner steel included.
 *
 * Source: project rule, engine design section 4 (set of least total mass that passes every check)
 */
export function chooseSlabBars(context: SlabContext): SlabBars {
  const tops = context.places.map((place) => chooseTopBars(context, place))
  const layers = context.given ? [context.given.bottomX] : CHOSEN_DIAMETERS.map((diameter) => shortLayer(context, diameter))
  const all = layers.map((layer) => shortBars(context, layer))
  const best = lightestPassing(context, all) ?? chooseLeastMass(all.map((each) => candidateOf(context, each)))
  return { ...best.option, tops, findings: [...best.findings(), ...tops.flatMap(({ findings }) => findings)] }
}
