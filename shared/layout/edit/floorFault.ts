import type { Panel, Ring } from '../../contracts/appraisal'
import { areaOf, regionWhere } from '../../geometry/region'
import { boundsOf, boundsOverlap, signedArea } from '../../geometry/ring'
import type { RingFault } from '../../geometry/ringFault'
import { findRingFault } from '../../geometry/ringFault'
import { cutIntoSlabs } from '../../geometry/slabs'
import { DRAWN_TOLERANCE_MM } from '../../geometry/tolerance'

/**
 * First thing that keeps panels of a level from being a floor, in words for the screen, or null: an outline that is not
 * simple, a void outside its panel or over another void, two panels over each other.
 */
export function floorFault(panels: readonly Panel[]): string | null {
  for (const panel of panels) {
    const fault = panelFault(panel)
    if (fault !== null) return fault
  }
  const boxes = panels.map(({ outline }) => boundsOf(outline))
  for (let i = 0; i < panels.length; i += 1) {
    for (let j = i + 1; j < panels.length; j += 1) {
      if (!boundsOverlap(boxes[i]!, boxes[j]!, DRAWN_TOLERANCE_MM)) continue
      if (overlaps(panels[i]!.outline, panels[j]!.outline))
        return `${panels[i]!.mark} and ${panels[j]!.mark} would lie over each other`
    }
  }
  return null
}

/** First fault of one panel's own rings, in words, or null. */
export function panelFault({ mark, outline, voids }: Panel): string | null {
  const fault = findRingFault(outline)
  if (fault !== null) return `the outline of ${mark} ${ringFaultText(fault)}`
  for (const [i, ring] of voids.entries()) {
    const name = voids.length === 1 ? `the void of ${mark}` : `void ${i + 1} of ${mark}`
    const voidFault = findRingFault(ring)
    if (voidFault !== null) return `${name} ${ringFaultText(voidFault)}`
    if (Math.abs(overlapArea(ring, outline) - signedArea(ring)) > DRAWN_TOLERANCE_MM ** 2)
      return `${name} would lie outside the panel`
    const other = voids.findIndex((each, j) => j < i && overlaps(each, ring))
    if (other >= 0) return `voids ${other + 1} and ${i + 1} of ${mark} would lie over each other`
  }
  return null
}

/** What is wrong with a ring, as the end of a sentence; vertices and edges are numbered from 1 as in the table of points. */
export function ringFaultText(fault: RingFault): string {
  switch (fault.kind) {
    case 'repeated':
      return `has point ${fault.vertex + 1} twice`
    case 'foldsBack':
      return `runs back over itself at point ${fault.vertex + 1}`
    case 'crosses':
      return `crosses itself: the side after point ${fault.edge + 1} meets the one after point ${fault.other + 1}`
    case 'clockwise':
      return 'runs clockwise: expected its points anticlockwise'
    case 'flat':
      return 'has no area'
  }
}

function overlaps(a: Ring, b: Ring): boolean {
  const shortest = Math.min(...[a, b].map((ring) => Math.sqrt(Math.abs(signedArea(ring)))))
  return overlapArea(a, b) > DRAWN_TOLERANCE_MM * shortest
}

function overlapArea(a: Ring, b: Ring): number {
  return areaOf(regionWhere(cutIntoSlabs([a, b]), 2, ([inA, inB]) => inA !== 0 && inB !== 0))
}
