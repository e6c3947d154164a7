import type { BarLayer } from '../../../contracts/appraisal'
import { type BarLines, pastFaceMm } from '../../bars/barRuns'
import type { LineEndOnEdge } from '../../bars/lineEndAt'
import type { SlabBars } from './chooseSlabBars'
import type { TopBars } from './chooseTopBars'
import { isHogging, type SlabContext } from '../slabContext'
import { layerText, type StripLayers } from './slabLayer'
import { type SlabLine, slabLines } from './slabLines'
import { EDGE_STRIP, isPoorBond, lineCount, SLAB_TOP_REACH } from './slabMass'
import type { SlabAxis } from '../slabPlan'
import type { TorsionBars } from './torsionBars'

/** A strip of the panel across the bars, shares of the clear width, and the layer that lies in it. */
interface Strip {
  readonly name: string
  readonly from: number
  readonly to: number
  readonly layer: BarLayer
}

function stripsOf({ middle, edge }: StripLayers): Strip[] {
  if (!edge) return [{ name: '', from: 0, to: 1, layer: middle }]
  return [
    { name: ', middle strip', from: EDGE_STRIP, to: 1 - EDGE_STRIP, layer: middle },
    { name: ', edge strips', from: 0, to: EDGE_STRIP, layer: edge },
    { name: ', edge strips', from: 1 - EDGE_STRIP, to: 1, layer: edge },
  ]
}

/** Lines of every strip along an axis, made into bars by `partsOf`; strips of the same name and layer together. */
function linesIn(
  context: SlabContext,
  axis: SlabAxis,
  acrossMm: number,
  layers: StripLayers,
  bars: Pick<BarLines, 'position' | 'clause'> & { readonly isTop: boolean },
  partsOf: (line: SlabLine, layer: BarLayer) => number[][],
): BarLines[] {
  const found = stripsOf(layers).map(({ name, from, to, layer }): BarLines => {
    const lines = slabLines(context.plan, axis, from, to, lineCount(acrossMm * (to - from), layer.spacing))
    return {
      position: bars.position + name,
      diameter: layer.diameter,
      each: 1,
      lines: `bars, ${layerText(layer)}`,
      pieces: lines.flatMap((line) => partsOf(line, layer)),
      lapMm: () => context.basis.lapMm(layer.diameter, bars.isTop && isPoorBond(context.heightMm)).value,
      clause: bars.clause,
    }
  })
  const joined = new Map<string, BarLines>()
  for (const each of found) {
    const before = joined.get(each.position)
    joined.set(each.position, before ? { ...before, pieces: [...before.pieces, ...each.pieces] } : each)
  }
  return [...joined.values()].filter(({ pieces }) => pieces.length > 0)
}

/**
 * Bottom bars of a solid panel on its real outline, voids left out.
 *
 * Source: see pastFaceMm; middle and edge strips BS 8110-1:1997, 3.5.3.5
 */
export function bottomBarLines(context: SlabContext, { bottom }: SlabBars): BarLines[] {
  const { short, other } = context.analysis
  const coverMm = context.brief.cover
  const past = ({ edge, supportMm }: LineEndOnEdge, { diameter }: BarLayer) =>
    edge === null ? -coverMm : pastFaceMm(diameter, supportMm, coverMm)
  const partsOf = (line: SlabLine, layer: BarLayer) => [[line.clearMm, past(line.start, layer), past(line.end, layer)]]
  const clause = 'EN 1992-1-1 9.3.1.2(1)'
  const named = (position: string) => ({ position, clause, isTop: false })
  return [
    ...linesIn(context, short.axis, other.clearMm, bottom.short, named('bottom, short span'), partsOf),
    ...linesIn(
      context,
      other,
      short.axis.clearMm,
      bottom.long,
      named(`bottom, ${context.analysis.long ? 'long span' : 'distribution'}`),
      partsOf,
    ),
  ]
}

/**
 * Top bars at one end of a solid panel: where its lines of bars meet the edges there.
 *
 * Source: by the basis, `simpleEdge`, `anchorageMm`; 0.3 of the clear span common practice
 */
export function topBarLines(context: SlabContext, { place, layers }: TopBars): BarLines[] {
  if (!layers) return []
  const { basis, analysis, heightMm } = context
  const [axis, across] =
    place.direction === 'short' ? [analysis.short.axis, analysis.other] : [analysis.other, analysis.short.axis]
  const hogging = isHogging(place)
  const { spanMm } = place.span ?? analysis.short
  const partsOf = (line: SlabLine, { diameter }: BarLayer): number[][] => {
    const { edge, supportMm } = line[place.end]
    if (edge === null || !place.side.edges.includes(edge)) return []
    if (hogging) return [[supportMm / 2, SLAB_TOP_REACH * line.clearMm]]
    return [[basis.anchorageMm(diameter, isPoorBond(heightMm), 1).value, basis.simpleEdge.reach * spanMm]]
  }
  const edges = place.side.edges.map((edge) => edge + 1).join(', ')
  const position = `top, edge ${edges}`
  const clause = hogging ? 'common practice' : basis.simpleEdge.clause
  return linesIn(context, axis, across.clearMm, layers, { position, clause, isTop: true }, partsOf)
}

/**
 * Corner bars of a solid panel, equal ones together.
 *
 * Source: BS 8110-1:1997, 3.5.3.5 (see torsionBars)
 */
export function torsionBarLines(context: SlabContext, torsion: readonly TorsionBars[]): BarLines[] {
  const joined = new Map<string, BarLines>()
  for (const { face, direction, layer, parts, widthMm } of torsion) {
    const position = `torsion, ${face}, ${direction} span`
    const key = [position, layerText(layer), ...parts].join()
    const pieces = new Array<readonly number[]>(lineCount(widthMm, layer.spacing)).fill(parts)
    const before = joined.get(key)
    joined.set(key, {
      position,
      diameter: layer.diameter,
      each: 1,
      lines: `bars, ${layerText(layer)}`,
      pieces: [...(before?.pieces ?? []), ...pieces],
      lapMm: () => context.basis.lapMm(layer.diameter, face === 'top' && isPoorBond(context.heightMm)).value,
      clause: 'BS 8110-1 3.5.3.5',
    })
  }
  return [...joined.values()]
}
