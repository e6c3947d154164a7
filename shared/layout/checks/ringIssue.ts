import type { ApiIssue } from '../../contracts/apiError'
import type { Ring } from '../../contracts/appraisal'
import { findRingFault } from '../../geometry/ringFault'

/**
 * What keeps a ring from being a polygon that can be measured, or null.
 *
 * @param path - of the ring, as `levels.0.panels.2.outline`
 */
export function ringIssue(ring: Ring, path: string): ApiIssue | null {
  const fault = findRingFault(ring)
  if (fault === null) return null
  const point = (i: number) => `(${ring[i]!.join(', ')})`
  const side = (i: number) => `${point(i)} to ${point((i + 1) % ring.length)}`
  switch (fault.kind) {
    case 'repeated':
      return {
        path: `${path}.${fault.vertex}`,
        message: `point ${point(fault.vertex)} stands next to itself: expected each corner once, the first not repeated at the end`,
      }
    case 'flat':
      return { path, message: 'all points lie in one line: expected corners around an area' }
    case 'foldsBack':
      return {
        path: `${path}.${fault.vertex}`,
        message: `the line runs back over itself at ${point(fault.vertex)}: expected sides that do not touch`,
      }
    case 'crosses':
      return {
        path: `${path}.${fault.edge}`,
        message: `the side ${side(fault.edge)} meets the side ${side(fault.other)}: expected sides that neither cross nor touch`,
      }
    case 'clockwise':
      return { path, message: 'the points run clockwise: expected anticlockwise' }
  }
}
