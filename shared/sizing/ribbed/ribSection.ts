import type { Brief, RibbedScheme } from '../../contracts/appraisal'
import { type BarSet, centroidMm } from '../bars/barSet'
import type { BendingSection, RibShape } from '../codeBasis'
import { depthLeft } from '../sectionDepth'

/** Cross-section of one rib with its share of the topping, mm. */
export interface RibSection extends RibShape {
  readonly spacingMm: number
  readonly heightMm: number
  readonly coverMm: number
  readonly linkMm: number
}

/**
 * Cross-section that a ribbed scheme has under a brief.
 *
 * Source: project rule, engine design section 2; overall depth is block height and topping
 */
export function ribSection({ block, ribWidth, topping, link }: RibbedScheme, { cover }: Brief): RibSection {
  return {
    clearMm: block.width,
    ribMm: ribWidth,
    blockHeightMm: block.height,
    toppingMm: topping,
    spacingMm: block.width + ribWidth,
    heightMm: block.height + topping,
    coverMm: cover,
    linkMm: link,
  }
}

/**
 * Distance from the face to the centroid of bars inside cover and link, mm: the axis distance in fire.
 *
 * Source: project rule, engine design section 9 (cover is to the outermost bar, the link where there is one)
 */
export function axisDistanceMm({ coverMm, linkMm }: RibSection, bars: BarSet): number {
  return coverMm + linkMm + centroidMm(bars)
}

/**
 * Effective depth of bars near the bottom, or near the top where the same cover and link hold, mm.
 *
 * Source: statics; a mesh in the topping lies below the top bars: common practice, no source
 */
export function effectiveDepthMm(section: RibSection, bars: BarSet): number {
  return depthLeft(section.heightMm, axisDistanceMm(section, bars))
}

/**
 * The rib at midspan: a T with its flange compressed, a rectangle where there is no topping.
 *
 * Source: EN 1992-1-1:2004, 5.3.2.1 through `flangeMm`
 */
export function midspanSection(section: RibSection, depthMm: number, flangeMm: number): BendingSection {
  const { ribMm, toppingMm } = section
  if (toppingMm === 0) return { widthMm: ribMm, depthMm, flange: null }
  return { widthMm: flangeMm, depthMm, flange: { webMm: ribMm, thicknessMm: toppingMm } }
}

/**
 * Area of concrete of one rib and its share of the topping, mm².
 *
 * Source: geometry
 */
export function concreteAreaMm2({ spacingMm, toppingMm, ribMm, blockHeightMm }: RibSection): number {
  return spacingMm * toppingMm + ribMm * blockHeightMm
}
