import { formatDecimal } from '../base/formatDecimal'
import type { Tip } from './compareStandfirst'

/** Who wins on the far side of a tip: 'above 1.49 solid is cheaper'. */
export function tipInWords({ point, change }: Tip, ribbedMark: string): string {
  const isRibbedBelow = point.cheaperBelow === ribbedMark
  const winner = change > 0 === isRibbedBelow ? 'solid' : 'ribbed'
  return `${change > 0 ? 'above' : 'below'} ${formatDecimal(point.value, { decimals: 2 })} ${winner} is cheaper`
}
