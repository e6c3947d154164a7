import { OutOfScopeError } from '../outOfScope'

/** Depth that stands for none: bars that lie outside their section carry next to nothing, and their checks fail. */
const NO_DEPTH_MM = 1

/**
 * Effective depth of bars, mm, 1 where they lie outside the section: no bars of that size do.
 *
 * Source: statics; project rule for bars outside the section
 * @param axisMm - from the near face to the bars' centroid
 */
export function depthLeft(heightMm: number, axisMm: number): number {
  return Math.max(NO_DEPTH_MM, heightMm - axisMm)
}

/**
 * Refuses a section in which the thinnest bars that may be chosen find no place between cover and the far face.
 *
 * Source: project rule, what cannot be built is refused (engine design section 9, bars fit)
 * @param layersMm - cover, links and bars from one face
 * @throws OutOfScopeError `brief.cover`
 */
export function refuseCoverThroughSection(heightMm: number, layersMm: number): void {
  if (layersMm >= heightMm)
    throw new OutOfScopeError(
      'brief.cover',
      `cover and bars take ${layersMm} mm of a depth of ${heightMm} mm: expected room for both`,
    )
}
