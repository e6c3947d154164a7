import type { Point } from './point'
import { areaOf, regionWhere } from './region'
import type { Bounds } from './ring'
import { boundsOf, boundsOverlap } from './ring'
import { cutIntoSlabs } from './slabs'
import { DRAWN_TOLERANCE_MM } from './tolerance'

type Polygon = readonly Point[]

/** Area that two simple anticlockwise rings have in common, mm². */
export function commonArea(a: Polygon, b: Polygon): number {
  if (!boundsOverlap(boundsOf(a), boundsOf(b), 0)) return 0
  return areaOf(regionWhere(cutIntoSlabs([a, b]), 2, ([inA, inB]) => inA! > 0 && inB! > 0))
}

/** Area of `inner` that lies outside `outer`, both simple and anticlockwise, mm². */
export function areaOutside(inner: Polygon, outer: Polygon): number {
  return areaOf(regionWhere(cutIntoSlabs([inner, outer]), 2, ([inInner, inOuter]) => inInner! > 0 && inOuter! <= 0))
}

/** Whether a common area is more than a sliver a millimetre deep along where two rings meet. */
export function isMoreThanSliver(areaMm2: number, a: Polygon, b: Polygon): boolean {
  return areaMm2 > DRAWN_TOLERANCE_MM * Math.min(longestSide(boundsOf(a)), longestSide(boundsOf(b)))
}

function longestSide({ minX, minY, maxX, maxY }: Bounds): number {
  return Math.max(maxX - minX, maxY - minY)
}
