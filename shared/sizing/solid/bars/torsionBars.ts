import type { BarDiameter, BarLayer } from '../../../contracts/appraisal'
import type { EndOfSpan } from '../../analysis/spanForces'
import { bottomBarEnd } from '../../bars/barEnds'
import type { BarPiece } from '../../bars/barLines'
import { CHOSEN_DIAMETERS } from '../../tables/bars'
import { topFlexure } from '../layerFindings'
import { greatestSpacingMm } from '../slabLimits'
import { givenTop, hasHeldCorners, isHogging, layerDepthMm, type SlabContext, type TopPlace } from '../slabContext'
import { remember } from '../../remember'
import { leastMm2 } from './firstMeeting'
import { layerAreaMm2, layerFor } from './slabLayer'
import { layerMassKg } from './slabMass'
import type { SlabSide } from '../slabPlan'

/** Corner steel as a share of the short midspan steel, by how many of its two edges are discontinuous. */
const SHARES = [0, 0.375, 0.75] as const

/** Side of the square it covers, as a share of the short span. */
const EXTENT = 1 / 5

type Direction = 'short' | 'long'

/** Bars added in one layer at one corner, beside what lies there already. */
export interface TorsionBars {
  readonly face: 'bottom' | 'top'
  readonly direction: Direction
  readonly corner: Readonly<Record<Direction, EndOfSpan>>
  readonly layer: BarLayer
  readonly piece: BarPiece
  readonly widthMm: number
  readonly massKg: number
}

const ENDS: readonly EndOfSpan[] = ['start', 'end']
const [THINNEST, THICKEST] = [CHOSEN_DIAMETERS[0], CHOSEN_DIAMETERS[CHOSEN_DIAMETERS.length - 1]!]

/**
 * Torsion steel of a two-way panel with corners held down: in four layers, each three quarters of the short midspan steel where both
 * edges of a corner are discontinuous, half of that where one is, over a fifth of the short span; less what crosses the corner anyway.
 *
 * Source: BS 8110-1:1997, 3.5.3.5, rules 4 to 6 (from memory, engine design section 4)
 * @param midspanMm2 - required at midspan of the short direction, per metre
 */
export function torsionBars(context: SlabContext, midspanMm2: number): TorsionBars[] {
  if (!hasHeldCorners(context)) return []
  const places = context.places
  const lightest = remember<AddedBars>()
  const placeAt = (direction: Direction, end: EndOfSpan) =>
    places.find((each) => each.direction === direction && each.end === end)
  return ENDS.flatMap((short) =>
    ENDS.flatMap((long) => {
      const corner = { short, long }
      const meeting = { short: placeAt('short', short), long: placeAt('long', long) }
      if (!meeting.short || !meeting.long) return []
      const loose = Number(!meeting.short.side.isContinuous) + Number(!meeting.long.side.isContinuous)
      const neededMm2 = SHARES[loose as 0 | 1 | 2] * midspanMm2
      const sides = { short: meeting.short, long: meeting.long }
      return (['bottom', 'top'] as const).flatMap((face) =>
        (['short', 'long'] as const).flatMap((direction) => {
          const crossing = face === 'bottom' ? bottomCrossing(context, direction) : topCrossing(context, sides[direction])
          const missingMm2 = neededMm2 - crossing
          if (missingMm2 <= 1e-9) return []
          const { side } = sides[direction]
          const bars = lightest([missingMm2, face, side.supportMm, side.isContinuous].join(), () =>
            added(context, missingMm2, face, side),
          )
          return [{ face, direction, corner, ...bars }]
        }),
      )
    }),
  )
}

/** Steel that any bars there must have, whatever their diameter: so that more load never ends in less corner steel. */
function leastCrossing(context: SlabContext): number {
  return leastMm2(context, layerDepthMm(context, THICKEST, THICKEST))
}

function bottomCrossing(context: SlabContext, direction: Direction): number {
  const { given } = context
  if (given) return layerAreaMm2(direction === 'short' ? given.bottomX : given.bottomY)
  return leastCrossing(context)
}

function topCrossing(context: SlabContext, place: TopPlace): number {
  const given = givenTop(context, place)
  if (given) return layerAreaMm2(given)
  if (isHogging(place)) return context.given ? 0 : leastCrossing(context)
  return topFlexure(context, place, THINNEST, place.direction === 'short' ? null : THINNEST).requiredMm2
}

type AddedBars = Omit<TorsionBars, 'face' | 'direction' | 'corner'>

/** The lightest layer that makes up what is missing. */
function added(context: SlabContext, missingMm2: number, face: TorsionBars['face'], side: SlabSide): AddedBars {
  const widthMm = EXTENT * context.analysis.short.spanMm
  const greatestMm = (diameterMm: BarDiameter) =>
    greatestSpacingMm(context, 'principal', diameterMm, layerDepthMm(context, diameterMm, null))
  const options = CHOSEN_DIAMETERS.map((diameter) => ({ layer: layerFor(diameter, missingMm2, greatestMm(diameter)), diameter }))
  const enough = options.filter(({ layer }) => layerAreaMm2(layer) >= missingMm2)
  const made = (enough.length > 0 ? enough : options.slice(-1)).map(({ layer, diameter }): AddedBars => {
    const { pastMm, legMm } = bottomBarEnd(context.basis, diameter, side, {
      coverMm: context.brief.cover,
      heightMm: context.heightMm,
    })
    const piece: BarPiece = { parts: [widthMm, pastMm], legs: [legMm, 0] }
    return { layer, piece, widthMm, massKg: layerMassKg(context, layer, piece, widthMm, face === 'top') }
  })
  return made.reduce((best, each) => (each.massKg < best.massKg ? each : best))
}
