import type { PanelCalculation } from '#shared/calculation/calculation'
import type { Check } from '#shared/contracts/appraisalResult'
import { Decimal } from '#shared/pricing/decimal'
import { signedDecimalText } from '../figureText'
import type { FrozenComparison } from '../frozenComparison'
import { basisFacts } from './basisFacts'
import { besideGroups, besideWorkings, scopeCaution, scopeFacts, type BesideGroup } from './besideRows'
import { besideTheCost } from './besideTheCost'
import { CAUTIONS } from './cautions'
import { comparedFigures, type ComparedFigure } from './comparedFigures'
import { headline, standfirst, wholeTotal, type SchemeKind, type Sentence } from './headline'
import { leftOut } from './leftOut'
import type { ReportFact } from './reportFact'
import { titleBlock } from './titleBlock'
import { turningSentences } from './turningPoints'
import { wholeParts } from './wholeParts'

/** A bar of the chart of differences: `share` of the longest bar, negative where ribbed is the cheaper there. */
export interface DifferenceBar {
  readonly label: string
  /** Whole units of money, signed; the bars add up to the total as printed. */
  readonly amount: string
  readonly share: number
}

export interface CheckedScheme {
  readonly kind: SchemeKind
  readonly mark: string
  readonly summary: string
  readonly checks: readonly Check[]
}

/** Everything the report says, once; the page, the PDF, the e-mail and its text alternative only set it differently. */
export interface ReportContent {
  readonly title: string
  readonly headline: Sentence
  readonly standfirst: string
  readonly note: string
  /** That the totals are not like for like, or not fully declared; may be empty. */
  readonly scopeCaution: string
  readonly currency: string
  readonly figures: readonly ComparedFigure[]
  readonly bars: readonly DifferenceBar[]
  readonly totalDifference: string
  readonly turning: readonly string[]
  /** Where each is the better floor beside the cost. */
  readonly better: Readonly<Record<SchemeKind, readonly ReportFact[]>>
  /** What is compared beside the cost, and how it came about; empty for what was sent before it was compared. */
  readonly beside: readonly BesideGroup[]
  readonly besideWorkings: readonly ReportFact[]
  readonly scopeFacts: readonly ReportFact[]
  readonly basis: readonly ReportFact[]
  readonly leftOut: readonly string[]
  readonly checked: readonly CheckedScheme[]
  readonly cautions: readonly string[]
  /** Of the tightest panel of each scheme. */
  readonly calculations: readonly PanelCalculation[]
  readonly titleBlock: readonly ReportFact[]
}

function differenceBars(frozen: FrozenComparison, total: Decimal): DifferenceBar[] {
  const exact = frozen.groups.map(({ difference }) => new Decimal(difference))
  const amounts = wholeParts(exact, total)
  const longest = Math.max(1, ...exact.map((difference) => difference.abs().toNumber()))
  return frozen.groups.map(({ label }, index) => ({
    label,
    amount: signedDecimalText(amounts[index]!.toFixed()),
    share: exact[index]!.toNumber() / longest,
  }))
}

function checkedScheme(frozen: FrozenComparison, kind: SchemeKind): CheckedScheme {
  const { specification, checkCount, failedCount, checks } = frozen[kind]
  const summary =
    failedCount === 0
      ? `All ${checkCount} checks pass; the tightest of each kind:`
      : `${failedCount} of ${checkCount} checks fail:`
  return { kind, mark: specification.mark, summary, checks }
}

export function reportContent(frozen: FrozenComparison): ReportContent {
  const total = wholeTotal(frozen, 'ribbed').minus(wholeTotal(frozen, 'solid'))
  return {
    title: `${frozen.project.name}: the floor built both ways`,
    headline: headline(frozen),
    standfirst: standfirst(frozen),
    note: frozen.note,
    scopeCaution: scopeCaution(frozen),
    currency: frozen.edition.currency,
    figures: comparedFigures(frozen),
    bars: differenceBars(frozen, total),
    totalDifference: signedDecimalText(total.toFixed()),
    turning: turningSentences(frozen),
    better: { ribbed: besideTheCost(frozen, 'ribbed'), solid: besideTheCost(frozen, 'solid') },
    beside: besideGroups(frozen),
    besideWorkings: besideWorkings(frozen),
    scopeFacts: scopeFacts(frozen),
    basis: basisFacts(frozen),
    leftOut: leftOut(frozen),
    checked: [checkedScheme(frozen, 'ribbed'), checkedScheme(frozen, 'solid')],
    cautions: CAUTIONS,
    calculations: frozen.calculations ?? [],
    titleBlock: titleBlock(frozen),
  }
}
