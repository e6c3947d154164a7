import type { BarLayer } from '../../../contracts/appraisal'
import type { EndOfSpan } from '../../analysis/spanForces'
import { pastFaceMm } from '../../bars/barRuns'
import { CHOSEN_DIAMETERS } from '../../tables/bars'
import type { SlabContext, TopPlace } from '../slabContext'
import { layerAreaMm2, layerFor, type StripLayers } from './slabLayer'
import { layerMassKg } from './slabMass'
import type { SlabSide } from '../slabPlan'

/** Corner steel as a share of the short midspan steel, by how many of its two edges are discontinuous. */
const SHARES = [0, 0.375, 0.75] as const

/** Side of the square it covers, as a share of the short span. */
const EXTENT = 1 / 5

/** Bars added in one layer at one corner, beside what lies there already. */
export interface TorsionBars {
  readonly face: 'bottom' | 'top'
  readonly direction: 'short' | 'long'
  readonly corner: Readonly<Record<'short' | 'long', EndOfSpan>>
  readonly layer: BarLayer
  readonly parts: readonly number[]
  readonly widthMm: number
  readonly massKg: number
}

/** Layers that cross a panel's corners already. */
export interface CornerSteel {
  readonly bottom: Readonly<Record<'short' | 'long', StripLayers>>
  readonly tops: readonly { readonly place: TopPlace; readonly layers: StripLayers | null }[]
}

const ENDS: readonly EndOfSpan[] = ['start', 'end']
const areaIn = (layers: StripLayers | null) => (layers ? layerAreaMm2(layers.edge ?? layers.middle) : 0)

/**
 * Torsion steel of a two-way panel with corners held down: in four layers, each three quarters of the short midspan steel where both
 * edges of a corner are discontinuous, half of that where one is, over a fifth of the short span; less what crosses the corner already.
 *
 * Source: BS 8110-1:1997, 3.5.3.5, rules 4 to 6 (from memory, engine design section 4)
 * @param midspanMm2 - required at midspan of the short direction, per metre
 */
export function torsionBars(context: SlabContext, midspanMm2: number, present: CornerSteel): TorsionBars[] {
  const { analysis } = context
  if (!analysis.long) return []
  const sides = { short: analysis.short.axis.ends, long: analysis.other.ends }
  return ENDS.flatMap((short) =>
    ENDS.flatMap((long) => {
      const corner = { short, long }
      const loose = Number(!sides.short[short].isContinuous) + Number(!sides.long[long].isContinuous)
      const neededMm2 = SHARES[loose as 0 | 1 | 2] * midspanMm2
      const add = (face: 'bottom' | 'top', direction: 'short' | 'long') => {
        const there = face === 'bottom' ? present.bottom[direction] : topAt(present, direction, corner[direction])
        return added(context, { face, direction, corner }, neededMm2 - areaIn(there), sides[direction][corner[direction]])
      }
      return [add('bottom', 'short'), add('bottom', 'long'), add('top', 'short'), add('top', 'long')].flat()
    }),
  )
}

function topAt({ tops }: CornerSteel, direction: 'short' | 'long', end: EndOfSpan): StripLayers | null {
  return tops.find(({ place }) => place.direction === direction && place.end === end)?.layers ?? null
}

function added(
  context: SlabContext,
  where: Pick<TorsionBars, 'face' | 'direction' | 'corner'>,
  missingMm2: number,
  { supportMm }: SlabSide,
): TorsionBars[] {
  if (missingMm2 <= 1e-9) return []
  const widthMm = EXTENT * context.analysis.short.spanMm
  const greatest = context.basis.greatestSpacingMm('principal', context.heightMm).value
  const options = CHOSEN_DIAMETERS.map((diameter) => ({ layer: layerFor(diameter, missingMm2, greatest), diameter }))
  const enough = options.filter(({ layer }) => layerAreaMm2(layer) >= missingMm2)
  const made = (enough.length > 0 ? enough : options.slice(-1)).map(({ layer, diameter }): TorsionBars => {
    const parts = [widthMm, pastFaceMm(diameter, supportMm, context.brief.cover)]
    return { ...where, layer, parts, widthMm, massKg: layerMassKg(context, layer, parts, widthMm, where.face === 'top') }
  })
  return [made.reduce((best, each) => (each.massKg < best.massKg ? each : best))]
}
