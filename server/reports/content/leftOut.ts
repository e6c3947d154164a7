import { figureText, listText } from '../figureText'
import type { FrozenScope } from '../frozenBeside'
import type { FrozenComparison } from '../frozenComparison'

/** What neither total holds, so that nobody takes the difference for more than it is. */
export function leftOut({ ribbed, solid, scope }: FrozenComparison): string[] {
  const lighter = solid.deadLoad.total - ribbed.deadLoad.total
  const frame =
    Math.round(lighter) === 0
      ? []
      : [
          `What a lighter floor saves below: the ${lighter > 0 ? 'ribbed' : 'solid'} floors bring ${figureText(Math.abs(lighter), 0)} kN less to columns and footings.`,
        ]
  return [
    'Beams, columns, walls, footings and stairs. Beams keep their depth in both schemes.',
    ...(scope === undefined ? ['Plaster or a ceiling, which hollow blocks need below; floor finishes; anything for sound.'] : []),
    ...frame,
    ...(scope === undefined
      ? ['Time on site, hoisting, storey height, cladding and what a wall along a rib asks for.']
      : ['Time on site.', ...ofScope(scope)]),
  ]
}

/** Entries of the same-scope list that neither total holds, and those that only one of them does. */
function ofScope({ rows }: FrozenScope): string[] {
  const named = (heading: string, ribbed: boolean, solid: boolean) => {
    const names = rows.filter(({ isInTotal }) => isInTotal.ribbed === ribbed && isInTotal.solid === solid).map(({ name }) => name)
    return names.length === 0 ? [] : [`${heading}: ${listText(names)}.`]
  }
  return [
    ...named('Left out of the solid total, and held by the ribbed one', true, false),
    ...named('Left out of the ribbed total, and held by the solid one', false, true),
    ...named('Held by neither total, or not declared', false, false),
  ]
}
