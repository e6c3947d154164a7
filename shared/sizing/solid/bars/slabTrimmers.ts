import type { BarDiameter } from '../../../contracts/appraisal'
import type { Point } from '../../../geometry/point'
import { chordsAt } from '../../../geometry/region'
import { boundsOf } from '../../../geometry/ring'
import { FIT_TOLERANCE_MM } from '../../../geometry/tolerance'
import type { PanelField } from '../../../layout/panelField'
import type { EndOfSpan } from '../../analysis/spanForces'
import type { BarLines, BarPiece } from '../../bars/barLines'
import { eitherSide } from '../../bars/eitherSide'
import { isHogging, type SlabContext } from '../slabContext'
import type { SlabAxis } from '../slabPlan'
import { bottomLineEnd } from './bottomLineEnd'
import type { SlabBars } from './chooseSlabBars'
import type { TopBars } from './chooseTopBars'
import type { StripLayers } from './slabLayer'
import { lineLevels, linesAt, type PlacedLine } from './slabLines'
import { lineCount, slabBond, topReachMm } from './slabMass'
import { stripsOf } from './slabStrips'

/** One direction of bars beside the voids of a panel. */
interface Course {
  readonly name: string
  readonly axis: SlabAxis
  readonly acrossMm: number
  readonly layers: StripLayers
  readonly isTop: boolean
}

/**
 * Bars beside voids in place of those that the voids cut: as many of the same diameter, half on each side, anchored past the void; of top
 * bars over a continuous support those that a void cuts short.
 *
 * Source: common practice of trimming openings, no source; anchorage by the basis
 */
export function trimmerLines(context: SlabContext, { bottom, tops }: SlabBars): BarLines[] {
  if (context.plan.site.panel.voids.length === 0) return []
  const { short, other, long } = context.analysis
  const along = { axis: short.axis, acrossMm: other.clearMm, layers: bottom.short }
  const across = { axis: other, acrossMm: short.axis.clearMm, layers: bottom.long }
  return [
    ...bottomTrimmers(context, { ...along, name: 'short span', isTop: false }),
    ...bottomTrimmers(context, { ...across, name: long ? 'long span' : 'distribution', isTop: false }),
    ...tops.flatMap((top) => topTrimmers(context, top)),
  ]
}

function bottomTrimmers(context: SlabContext, course: Course): BarLines[] {
  const field = context.plan.fieldAlong(course.axis)
  const { diameter } = course.layers.middle
  return field.voidRings.flatMap((ring, i) => {
    const cut = linesCut(field, course, ring).length
    const sides = sideLines(context, course, field, ring)
    const pieces = sides.map((lines) => lines.map((line) => pieceBeside(context, course, line, ring)))
    return bothSides(context, course, diameter, { cut, pieces, position: `trimmers, ${course.name}, void ${i + 1}` })
  })
}

/** Levels of the lines that a void cuts. */
function linesCut(field: PanelField, { layers, acrossMm }: Course, ring: readonly Point[]): number[] {
  const { minX, maxX, minY, maxY } = boundsOf(ring)
  const isCut = (y: number) =>
    y > minY &&
    y < maxY &&
    chordsAt(field.clear, y).some(({ start, end }) => Math.min(end, maxX) - Math.max(start, minX) > FIT_TOLERANCE_MM)
  return stripsOf(layers).flatMap(({ from, to, layer }) =>
    lineLevels(field, from, to, lineCount(acrossMm * (to - from), layer.spacing)).filter(isCut),
  )
}

/** The lines of bars nearest to a void below and above it, where the floor has room there. */
function sideLines(context: SlabContext, { axis, layers }: Course, field: PanelField, ring: readonly Point[]): PlacedLine[][] {
  const { minX, maxX, minY, maxY } = boundsOf(ring)
  const off = context.brief.cover + layers.middle.diameter / 2
  return [minY - off, maxY + off].map((y) =>
    linesAt(context.plan, axis, field, y).filter(({ from, to }) => Math.min(to, maxX) - Math.max(from, minX) > FIT_TOLERANCE_MM),
  )
}

/** A bar along a void and anchored past it on both sides, or ended at a support or another void before. */
function pieceBeside(context: SlabContext, { axis, layers }: Course, placed: PlacedLine, ring: readonly Point[]): BarPiece {
  const { diameter } = layers.middle
  const { minX, maxX } = boundsOf(ring)
  const anchorageMm = context.basis.anchorageMm(diameter, slabBond(context.heightMm, false), 1).value
  const at = (end: EndOfSpan, roomMm: number) =>
    roomMm > anchorageMm ? { pastMm: 0, legMm: 0 } : bottomLineEnd(context, axis, placed.line, end, diameter)
  const [start, end] = [at('start', minX - placed.from), at('end', placed.to - maxX)]
  const [from, to] = [Math.max(placed.from, minX - anchorageMm), Math.min(placed.to, maxX + anchorageMm)]
  return { parts: [to - from, start.pastMm, end.pastMm], legs: [start.legMm, end.legMm] }
}

function topTrimmers(context: SlabContext, { place, layers }: TopBars): BarLines[] {
  if (!layers || !isHogging(place)) return []
  const { short, other } = context.analysis
  const [axis, across] = place.direction === 'short' ? [short.axis, other] : [other, short.axis]
  const edges = place.side.edges.map((edge) => edge + 1).join(', ')
  const course: Course = { name: `top, edge ${edges}`, axis, acrossMm: across.clearMm, layers, isTop: true }
  const field = context.plan.fieldAlong(axis)
  return field.voidRings.flatMap((ring, i) => {
    const { minX, maxX } = boundsOf(ring)
    const near = (y: number) =>
      chordsAt(field.clear, y).some(({ start, end }) => {
        const fromFace = place.end === 'start' ? minX - start : end - maxX
        return fromFace < topReachMm(context, place, end - start)
      })
    const cut = linesCut(field, course, ring).filter(near).length
    const sides = sideLines(context, course, field, ring).map((lines) =>
      lines.filter(({ line }) => place.side.edges.some((edge) => edge === line[place.end].edge)),
    )
    const pieces = sides.map((lines) =>
      lines.map(({ line }): BarPiece => {
        const reach = topReachMm(context, place, line.fullMm)
        return { parts: [reach, line[place.end].supportMm, reach], legs: [0, 0] }
      }),
    )
    return bothSides(context, course, layers.middle.diameter, {
      cut,
      pieces,
      position: `trimmers, ${course.name}, void ${i + 1}`,
    })
  })
}

function bothSides(
  { basis, brief, heightMm }: SlabContext,
  { isTop }: Course,
  diameter: BarDiameter,
  { cut, pieces, position }: { cut: number; pieces: readonly (readonly BarPiece[])[]; position: string },
): BarLines[] {
  const [below, above] = [pieces[0]!, pieces[1]!]
  const numbers = eitherSide(cut, [below.length > 0, above.length > 0])
  const all = [below, above].flatMap((side, i) => side.flatMap((piece) => new Array<BarPiece>(numbers[i]!).fill(piece)))
  if (all.length === 0) return []
  return [
    {
      position,
      diameter,
      each: 1,
      lines: `bars beside, for ${cut} cut`,
      spacingMm: null,
      pieces: all,
      stockMm: brief.stockLength,
      lapMm: () => basis.lapMm(diameter, slabBond(heightMm, isTop)).value,
      clause: 'common practice',
    },
  ]
}
