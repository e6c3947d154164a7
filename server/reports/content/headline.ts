import { Decimal } from '#shared/pricing/decimal'
import { decimalText, figureText } from '../figureText'
import type { FrozenComparison } from '../frozenComparison'

export type SchemeKind = 'ribbed' | 'solid'

/** A sentence in pieces; a piece that names a scheme is set in the scheme's colour. */
export type Sentence = readonly { readonly text: string; readonly scheme?: SchemeKind }[]

export function sentenceText(sentence: Sentence): string {
  return sentence.map(({ text }) => text).join('')
}

/** Total of a scheme rounded to whole units of money, as the report prints it. */
export function wholeTotal(frozen: FrozenComparison, kind: SchemeKind): Decimal {
  return new Decimal(frozen[kind].total).toDecimalPlaces(0)
}

/** The scheme that costs less as printed; null: they cost the same. */
export function cheaperKind(frozen: FrozenComparison): SchemeKind | null {
  const order = wholeTotal(frozen, 'ribbed').comparedTo(wholeTotal(frozen, 'solid'))
  return order === 0 ? null : order < 0 ? 'ribbed' : 'solid'
}

export function otherKind(kind: SchemeKind): SchemeKind {
  return kind === 'ribbed' ? 'solid' : 'ribbed'
}

/** `18% less`, `3% more` or null where the two weigh the same as printed. */
function weightWords(frozen: FrozenComparison, kind: SchemeKind): { share: string; isLess: boolean } | null {
  const [own, other] = [frozen[kind].deadLoad.perArea, frozen[otherKind(kind)].deadLoad.perArea]
  const percent = (100 * (own - other)) / other
  if (Math.abs(percent) < 0.5) return null
  return { share: `${figureText(Math.abs(percent), 0)}%`, isLess: percent < 0 }
}

function costSentence(frozen: FrozenComparison, cheaper: SchemeKind): Sentence {
  const other = otherKind(cheaper)
  const difference = wholeTotal(frozen, other).minus(wholeTotal(frozen, cheaper))
  const weight = weightWords(frozen, cheaper)
  const weighs = weight
    ? ` ${weight.isLess ? 'and' : 'but'} weighs ${weight.share} ${weight.isLess ? 'less' : 'more'}.`
    : ' and weighs the same.'
  return [
    { text: cheaper === 'ribbed' ? 'Ribbed' : 'Solid', scheme: cheaper },
    { text: ` costs ${decimalText(difference.toFixed())} ${frozen.edition.currency} less than ` },
    { text: other, scheme: other },
    { text: weighs },
  ]
}

function sameCostSentence(frozen: FrozenComparison): Sentence {
  const weight = weightWords(frozen, 'ribbed')
  const weighs = weight ? `; ribbed weighs ${weight.share} ${weight.isLess ? 'less' : 'more'}.` : ' and weigh the same.'
  const cost = `${decimalText(wholeTotal(frozen, 'ribbed').toFixed())} ${frozen.edition.currency}`
  return [
    { text: 'Ribbed', scheme: 'ribbed' },
    { text: ' and ' },
    { text: 'solid', scheme: 'solid' },
    { text: ` cost the same, ${cost}` },
    { text: weighs },
  ]
}

/** Says first what does not pass: figures of a failing scheme are those of a floor that cannot be built so. */
function failureSentence(frozen: FrozenComparison): Sentence {
  const failing = (['ribbed', 'solid'] as const).filter((kind) => !frozen[kind].passes)
  return failing.flatMap((kind) => [
    { text: kind === 'ribbed' ? 'Ribbed' : 'Solid', scheme: kind },
    { text: ` fails ${frozen[kind].failedCount} of its ${frozen[kind].checkCount} checks. ` },
  ])
}

/** The sentence that answers: failures first, then which floor costs less and by how much, then what it weighs. */
export function headline(frozen: FrozenComparison): Sentence {
  const cheaper = cheaperKind(frozen)
  return [...failureSentence(frozen), ...(cheaper ? costSentence(frozen, cheaper) : sameCostSentence(frozen))]
}

/** What qualifies the headline, in two or three sentences. */
export function standfirst(frozen: FrozenComparison): string {
  const cheaper = cheaperKind(frozen)
  const sentences: string[] = []
  if (cheaper) {
    const other = wholeTotal(frozen, otherKind(cheaper))
    const percent = other.minus(wholeTotal(frozen, cheaper)).times(100).div(other).toNumber()
    sentences.push(`The difference is ${figureText(percent, 1)}% of what the ${otherKind(cheaper)} floors cost.`)
  }
  const deeper = frozen.ribbed.depth - frozen.solid.depth
  if (deeper !== 0) {
    sentences.push(`Ribbed is ${figureText(Math.abs(deeper), 0)} mm ${deeper > 0 ? 'deeper' : 'shallower'} on every floor.`)
  }
  const failing = (['ribbed', 'solid'] as const).filter((kind) => !frozen[kind].passes)
  sentences.push(
    failing.length > 0
      ? `The cost of a floor that fails a check is not the cost of a floor that can be built: its sizes must change first.`
      : 'Both are sized for the same spans, loads, cover and fire period, and priced from the same rates.',
  )
  return sentences.join(' ')
}
