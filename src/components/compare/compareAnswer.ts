import type { SchemeResult } from '#shared/contracts/appraisalResult'
import { Decimal } from '#shared/pricing/decimal'
import { moneyInWords } from './moneyInWords'
import type { Pair, Phrase } from './phrase'

type Kind = SchemeResult['kind']
/** Dead loads nearer than this are called the same. */
const SAME_SHARE = 0.005

const other = (kind: Kind): Kind => (kind === 'ribbed' ? 'solid' : 'ribbed')
const name = (kind: Kind, isFirst = false): Phrase => ({ kind, text: isFirst ? (kind === 'ribbed' ? 'Ribbed' : 'Solid') : kind })

/** Ribbed less solid, exact; null where either is not priced. */
export function costDifference({ ribbed, solid }: Pair<SchemeResult>): Decimal | null {
  if (ribbed.cost === null || solid.cost === null) return null
  return new Decimal(ribbed.cost.total).minus(solid.cost.total)
}

/**
 * The sentence that answers which floor: failing checks first, then money, load and depth, whichever way they fall.
 * Nothing is said that was not computed.
 */
export function compareAnswer(pair: Pair<SchemeResult>): Phrase[] {
  return [...failing(pair), ...money(pair), ...depth(pair)]
}

function failing({ ribbed, solid }: Pair<SchemeResult>): Phrase[] {
  if (ribbed.passes && solid.passes) return []
  if (!ribbed.passes && !solid.passes) return [{ text: 'Neither floor passes its checks. ' }]
  return [name(ribbed.passes ? 'solid' : 'ribbed', true), { text: ' does not pass its checks. ' }]
}

function money(pair: Pair<SchemeResult>): Phrase[] {
  const difference = costDifference(pair)
  if (difference === null) return unpriced(pair)
  const currency = pair.ribbed.cost?.currency ?? ''
  const isPartly = [pair.ribbed, pair.solid].some(({ cost }) => (cost?.unpriced.length ?? 0) > 0)
  const opening: Phrase[] = isPartly ? [{ text: 'As far as they are priced, ' }] : []
  if (difference.isZero()) {
    return [
      ...opening,
      name('ribbed', !isPartly),
      { text: ' and ' },
      name('solid'),
      { text: ' cost the same' },
      ...sameCostLoad(pair),
    ]
  }
  const cheaper: Kind = difference.isNegative() ? 'ribbed' : 'solid'
  return [
    ...opening,
    name(cheaper, !isPartly),
    { text: ` costs ${moneyInWords(difference.abs().toFixed(), currency)} less than ` },
    name(other(cheaper)),
    ...load(pair, cheaper),
  ]
}

function unpriced(pair: Pair<SchemeResult>): Phrase[] {
  const lighter: Kind = pair.ribbed.deadLoad.total <= pair.solid.deadLoad.total ? 'ribbed' : 'solid'
  const share = loadChange(pair, lighter)
  if (Math.abs(share) < SAME_SHARE)
    return [name('ribbed', true), { text: ' and ' }, name('solid'), { text: ' weigh the same; neither is priced yet.' }]
  return [
    name(lighter, true),
    { text: ` weighs ${percent(share)} less than ` },
    name(other(lighter)),
    { text: '; neither is priced yet.' },
  ]
}

function load(pair: Pair<SchemeResult>, cheaper: Kind): Phrase[] {
  const share = loadChange(pair, cheaper)
  if (Math.abs(share) < SAME_SHARE) return [{ text: ' and weighs the same.' }]
  return [{ text: share < 0 ? ` and weighs ${percent(share)} less.` : ` but weighs ${percent(share)} more.` }]
}

function sameCostLoad(pair: Pair<SchemeResult>): Phrase[] {
  const share = loadChange(pair, 'ribbed')
  if (Math.abs(share) < SAME_SHARE) return [{ text: ' and weigh the same.' }]
  return [{ text: '; ' }, name('ribbed'), { text: ` weighs ${percent(share)} ${share < 0 ? 'less' : 'more'}.` }]
}

function depth({ ribbed, solid }: Pair<SchemeResult>): Phrase[] {
  const difference = ribbed.depth - solid.depth
  if (difference === 0) return [{ text: ` Both are ${ribbed.depth} mm deep.` }]
  return [
    { text: ' ' },
    name(difference > 0 ? 'ribbed' : 'solid', true),
    { text: ` is ${Math.abs(Math.round(difference * 10) / 10)} mm deeper.` },
  ]
}

/** Dead load of one kind against the other's, as a share: −0.18 is 18 % lighter. */
function loadChange(pair: Pair<SchemeResult>, kind: Kind): number {
  return pair[kind].deadLoad.total / pair[other(kind)].deadLoad.total - 1
}

function percent(share: number): string {
  const size = Math.abs(share) * 100
  return `${size < 2 ? size.toFixed(1) : Math.round(size)}%`
}
