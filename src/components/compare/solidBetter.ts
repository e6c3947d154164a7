import type { RibbedScheme } from '#shared/contracts/appraisal'
import type { ComparedFigure } from './compareFigures'
import { verdictOf } from './compareFigures'

/** Something in which the solid floor is the better one; `isComputed` false: a caution of the trade, no figure of this floor. */
export interface SolidAdvantage {
  readonly name: string
  readonly text: string
  readonly isComputed: boolean
}

/** Where the solid floor is better: figures of this comparison first, then what holds for every ribbed floor. */
export function solidAdvantages(figures: readonly ComparedFigure[], ribbed: RibbedScheme): SolidAdvantage[] {
  return [...computed(figures), ...general(ribbed)]
}

function computed(figures: readonly ComparedFigure[]): SolidAdvantage[] {
  const words: Record<string, (text: string) => { name: string; text: string }> = {
    total: (text) => ({ name: 'Cost', text: `${text} less in all.` }),
    frame: (text) => ({ name: 'Load', text: `${text} less on the frame.` }),
    concrete: (text) => ({ name: 'Concrete', text: `${text} less to pour.` }),
    steel: (text) => ({ name: 'Steel', text: `${text} less to fix.` }),
    depth: (text) => ({ name: 'Height', text: `${text} less at every floor.` }),
  }
  return figures.flatMap((figure) => {
    const { better, difference } = verdictOf(figure)
    const say = words[figure.key]
    if (better !== 'solid' || difference === null || say === undefined) return []
    const size = Math.abs(difference)
      .toFixed(figure.decimals)
      .replace(/\B(?=(\d{3})+(?!\d))/g, ',')
    return [{ ...say(`${size} ${figure.unit}`), isComputed: true }]
  })
}

function general({ ribWidth, topping, block }: RibbedScheme): SolidAdvantage[] {
  return [
    { name: 'Sound', text: 'Less mass lets more airborne sound through; hollows are given no credit here.', isComputed: false },
    {
      name: 'Fire',
      text: `A ${ribWidth} mm rib and a ${topping} mm topping stand less long in the tables than the same depth of solid concrete.`,
      isComputed: false,
    },
    {
      name: 'Holes',
      text: `Services pass between ribs only, at most ${block.width} mm wide; a rib is never cut.`,
      isComputed: false,
    },
    { name: 'Point loads', text: 'A wall along a rib wants a doubled rib, a heavy stand a solid patch.', isComputed: false },
    { name: 'Parts', text: 'One trade fewer: no blocks to hoist, lay and close before the pour.', isComputed: false },
  ]
}
