import { Decimal } from '#shared/pricing/decimal'
import { figureText } from '../figureText'
import type { FrozenComparison } from '../frozenComparison'
import { cheaperKind, otherKind } from './headline'

/** A change of all prices of a group, alone, at which both schemes cost the same. */
export interface TurningPoint {
  readonly label: string
  /** Per cent, signed: −38 means that prices fall by 38%. */
  readonly percent: number
  readonly text: string
}

/** Prices that would have to rise beyond this, to three times what they are, are not news, per cent. */
const MOST_PERCENT = 200

/** Whole per cent, a decimal below one; a fall is never called whole that leaves something. */
function shareText(percent: number): string {
  const share = Math.abs(percent)
  if (share < 1) return figureText(share, 1)
  return figureText(percent < 0 ? Math.min(99, share) : share, 0)
}

/**
 * By how much the prices of a group would have to move, all else held, for the cheaper scheme to change: −D / s, where D is the
 * difference of the totals and s what it moves by when the group's prices double. Told for groups only, of which the amounts
 * are shown anyway: from the tipping point of one rate and the quantities, the rate could be worked back.
 *
 * Source: linear equation of the two totals; sizes and quantities are held fixed
 */
export function turningPoints(frozen: FrozenComparison): TurningPoint[] {
  const cheaper = cheaperKind(frozen)
  if (cheaper === null) return []
  const difference = new Decimal(frozen.ribbed.total).minus(frozen.solid.total)
  return frozen.groups
    .flatMap(({ label, sway }) => {
      if (sway === null || new Decimal(sway).isZero()) return []
      const percent = difference.negated().div(sway).times(100).toNumber()
      if (percent <= -100 || percent > MOST_PERCENT) return []
      const verb = percent < 0 ? 'fell' : 'rose'
      const prices = `all prices of ${label.charAt(0).toLowerCase()}${label.slice(1)}`
      const text = `If ${prices} ${verb} by more than ${shareText(percent)}%, ${otherKind(cheaper)} would be the cheaper floor.`
      return [{ label, percent, text }]
    })
    .sort((a, b) => Math.abs(a.percent) - Math.abs(b.percent))
}

/** The turning points in words, or that there is none; nothing where none could be told. */
export function turningSentences(frozen: FrozenComparison): string[] {
  const cheaper = cheaperKind(frozen)
  if (cheaper === null || frozen.groups.every(({ sway }) => sway === null)) return []
  const told = turningPoints(frozen).map(({ text }) => text)
  if (told.length > 0) return told
  const other = otherKind(cheaper)
  return [`No group of prices alone, falling to nothing or trebling, would make ${other} the cheaper floor.`]
}
