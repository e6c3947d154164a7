import type { BarLayer } from '../../../contracts/appraisal'
import type { BarLines, BarPiece } from '../../bars/barLines'
import type { EndOfSpan } from '../../analysis/spanForces'
import { bottomLineEnd } from './bottomLineEnd'
import type { SlabBars } from './chooseSlabBars'
import type { TopBars } from './chooseTopBars'
import { isHogging, type SlabContext } from '../slabContext'
import { layerText, type StripLayers } from './slabLayer'
import { type SlabLine, slabLines } from './slabLines'
import { lineCount, simpleTopPiece, slabBond, topReachMm } from './slabMass'
import { stripsOf } from './slabStrips'
import { trimmerLines } from './slabTrimmers'
import type { SlabAxis } from '../slabPlan'
import type { TorsionBars } from './torsionBars'

/** Lines of every strip along an axis, made into bars by `pieceOf`; strips of the same name and layer together. */
function linesIn(
  context: SlabContext,
  axis: SlabAxis,
  acrossMm: number,
  layers: StripLayers,
  bars: Pick<BarLines, 'position' | 'clause'> & { readonly isTop: boolean },
  pieceOf: (line: SlabLine, layer: BarLayer) => BarPiece | null,
): BarLines[] {
  const found = stripsOf(layers).map(({ name, from, to, layer }): BarLines => {
    const lines = slabLines(context.plan, axis, from, to, lineCount(acrossMm * (to - from), layer.spacing))
    return {
      position: bars.position,
      strip: name,
      diameter: layer.diameter,
      each: 1,
      lines: `bars, ${layerText(layer)}`,
      spacingMm: layer.spacing,
      pieces: lines.flatMap((line) => pieceOf(line, layer) ?? []),
      stockMm: context.brief.stockLength,
      lapMm: () => context.basis.lapMm(layer.diameter, slabBond(context.heightMm, bars.isTop)).value,
      clause: bars.clause,
    }
  })
  const joined = new Map<string, BarLines>()
  for (const each of found) {
    const before = joined.get(each.strip ?? '')
    joined.set(each.strip ?? '', before ? { ...before, pieces: [...before.pieces, ...each.pieces] } : each)
  }
  return [...joined.values()].filter(({ pieces }) => pieces.length > 0)
}

/**
 * All bars of a solid panel to be scheduled.
 *
 * Source: as the functions below
 */
export function slabBarLines(context: SlabContext, bars: SlabBars): BarLines[] {
  return [
    ...bottomBarLines(context, bars),
    ...bars.tops.flatMap((top) => topBarLines(context, top)),
    ...torsionBarLines(context, bars.torsion),
    ...trimmerLines(context, bars),
  ]
}

/**
 * Bottom bars of a solid panel on its real outline, voids left out.
 *
 * Source: see `bottomBarEnd`; middle and edge strips BS 8110-1:1997, 3.5.3.5
 */
export function bottomBarLines(context: SlabContext, { bottom }: SlabBars): BarLines[] {
  const { short, other } = context.analysis
  const { basis, heightMm } = context
  const pieceAlong =
    (axis: SlabAxis) =>
    (line: SlabLine, { diameter }: BarLayer): BarPiece => {
      const [start, end] = [
        bottomLineEnd(context, axis, line, 'start', diameter),
        bottomLineEnd(context, axis, line, 'end', diameter),
      ]
      return { parts: [line.clearMm, start.pastMm, end.pastMm], legs: [start.legMm, end.legMm] }
    }
  const { clause } = basis.bottomEnd(bottom.short.middle.diameter, short.axis.ends.start, heightMm)
  const named = (position: string) => ({ position, clause, isTop: false })
  return [
    ...linesIn(context, short.axis, other.clearMm, bottom.short, named('bottom, short span'), pieceAlong(short.axis)),
    ...linesIn(
      context,
      other,
      short.axis.clearMm,
      bottom.long,
      named(`bottom, ${context.analysis.long ? 'long span' : 'distribution'}`),
      pieceAlong(other),
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
  const { basis, analysis } = context
  const [axis, across] =
    place.direction === 'short' ? [analysis.short.axis, analysis.other] : [analysis.other, analysis.short.axis]
  const hogging = isHogging(place)
  const pieceOf = (line: SlabLine, { diameter }: BarLayer): BarPiece | null => {
    const { edge, supportMm } = line[place.end]
    if (edge === null || !place.side.edges.includes(edge)) return null
    const roomMm = line[opposite(place.end)].edge === null ? line.clearMm - context.brief.cover : Infinity
    if (!hogging) return simpleTopPiece(context, place, diameter, supportMm, roomMm)
    return { parts: [supportMm / 2, Math.min(topReachMm(context, place, line.fullMm), roomMm)], legs: [0, 0], over: edge }
  }
  const edges = place.side.edges.map((edge) => edge + 1).join(', ')
  const position = `top, edge ${edges}`
  const clause = hogging ? 'common practice' : basis.simpleEdge.slab.clause
  return linesIn(context, axis, across.clearMm, layers, { position, clause, isTop: true }, pieceOf)
}

const opposite = (end: EndOfSpan): EndOfSpan => (end === 'start' ? 'end' : 'start')

/**
 * Corner bars of a solid panel, equal ones together.
 *
 * Source: BS 8110-1:1997, 3.5.3.5 (see torsionBars)
 */
export function torsionBarLines(context: SlabContext, torsion: readonly TorsionBars[]): BarLines[] {
  const joined = new Map<string, BarLines>()
  for (const { face, direction, layer, piece, widthMm } of torsion) {
    const position = `torsion, ${face}, ${direction} span`
    const key = [position, layerText(layer), ...piece.parts, ...piece.legs].join()
    const pieces = new Array<BarPiece>(lineCount(widthMm, layer.spacing)).fill(piece)
    const before = joined.get(key)
    joined.set(key, {
      position,
      diameter: layer.diameter,
      each: 1,
      lines: `bars, ${layerText(layer)}`,
      spacingMm: layer.spacing,
      stockMm: context.brief.stockLength,
      pieces: [...(before?.pieces ?? []), ...pieces],
      lapMm: () => context.basis.lapMm(layer.diameter, slabBond(context.heightMm, face === 'top')).value,
      clause: 'BS 8110-1 3.5.3.5',
    })
  }
  return [...joined.values()]
}
