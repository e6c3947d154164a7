import type { Bar, BarDiameter } from '../../contracts/appraisal'
import { BAR_MASS_KG_PER_M, barAreaMm2 } from '../tables/bars'

/** Bars lying side by side in one layer, one entry a diameter. */
export type BarSet = readonly Bar[]

/**
 * Cross-section of a set of bars, mm².
 *
 * Source: EN 10080:2005, nominal areas
 */
export function areaOf(set: BarSet): number {
  return set.reduce((sum, { diameter, count }) => sum + count * barAreaMm2(diameter), 0)
}

/**
 * Distance from the near side of the layer to the centroid of its bars, mm; 0 for no bars.
 *
 * Source: statics, centroid of areas
 */
export function centroidMm(set: BarSet): number {
  const area = areaOf(set)
  return area === 0 ? 0 : set.reduce((sum, { diameter, count }) => sum + (count * barAreaMm2(diameter) * diameter) / 2, 0) / area
}

/**
 * Thickest bar of a set; 8 for no bars, so that limits by diameter stay defined.
 *
 * Source: project rule
 */
export function thickest(set: BarSet): BarDiameter {
  return set.reduce<BarDiameter>((most, { diameter }) => (diameter > most ? diameter : most), set[0]?.diameter ?? 8)
}

/**
 * Number of bars in a set.
 *
 * Source: project rule
 */
export function countOf(set: BarSet): number {
  return set.reduce((sum, { count }) => sum + count, 0)
}

/**
 * Mass of a set per metre of its length, kg/m.
 *
 * Source: BS 4449, nominal masses (see BAR_MASS_KG_PER_M)
 */
export function massPerM(set: BarSet): number {
  return set.reduce((sum, { diameter, count }) => sum + count * BAR_MASS_KG_PER_M[diameter], 0)
}

/**
 * A set as a reader writes it, `2φ12 + 1φ10`.
 *
 * Source: project rule
 */
export function setText(set: BarSet): string {
  return set.length === 0 ? 'no bars' : set.map(({ diameter, count }) => `${count}φ${diameter}`).join(' + ')
}
