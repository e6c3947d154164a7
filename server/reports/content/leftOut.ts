import { figureText } from '../figureText'
import type { FrozenComparison } from '../frozenComparison'

/** What neither total holds, so that nobody takes the difference for more than it is. */
export function leftOut({ ribbed, solid }: FrozenComparison): string[] {
  const lighter = solid.deadLoad.total - ribbed.deadLoad.total
  const frame =
    Math.round(lighter) === 0
      ? []
      : [
          `What a lighter floor saves below: the ${lighter > 0 ? 'ribbed' : 'solid'} floors bring ${figureText(Math.abs(lighter), 0)} kN less to columns and footings.`,
        ]
  return [
    'Beams, columns, walls, footings and stairs. Beams keep their depth in both schemes.',
    'Plaster or a ceiling, which hollow blocks need below; floor finishes; anything for sound.',
    ...frame,
    'Time on site, hoisting, storey height, cladding and what a wall along a rib asks for.',
  ]
}
