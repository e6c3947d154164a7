import { figure } from '../sizing/figure'
import type { AlsoFigure, FigureKey } from './alsoFigure'
import type { AlsoCompared } from './alsoCompared'
import { FIGURE_RULES, type FigureRule } from './figureRules'

/** One figure of two schemes side by side. */
export interface AlsoRow extends FigureRule {
  readonly key: FigureKey
  readonly ribbed: AlsoFigure
  readonly solid: AlsoFigure
  /** Which is the better as printed; 'same'; or null: not judged, and `notJudged` tells why where it could have been. */
  readonly verdict: 'ribbed' | 'solid' | 'same' | null
  readonly notJudged: string
  /** Where the ribbed floor is the worse one, in a sentence with the figures; else empty. */
  readonly worse: string
}

/**
 * What is compared beside the cost for a ribbed and a solid scheme. Carbon of different scope is not judged: where a factor is missing
 * for what only one of them takes, or for concrete or bars, neither is called the better.
 *
 * Source: project rule, engine design section 5 (each says when the ribbed floor is worse; never compare different scopes)
 */
export function alsoRows(ribbed: AlsoCompared, solid: AlsoCompared): AlsoRow[] {
  return ribbed.figures.map((first, index) => rowOf(first, solid.figures[index]!, [ribbed.mark, solid.mark]))
}

function rowOf(ribbed: AlsoFigure, solid: AlsoFigure, marks: readonly [string, string]): AlsoRow {
  const rule = FIGURE_RULES[ribbed.key]
  const notJudged = rule.better === 'neither' ? '' : reasonNotToJudge(ribbed, solid, marks)
  const verdict = rule.better === 'neither' || notJudged !== '' ? null : verdictOf(rule, ribbed.value!, solid.value!)
  return {
    ...rule,
    key: ribbed.key,
    ribbed,
    solid,
    verdict,
    notJudged,
    worse: verdict === 'solid' ? worse(rule, ribbed, solid) : '',
  }
}

function reasonNotToJudge(ribbed: AlsoFigure, solid: AlsoFigure, marks: readonly [string, string]): string {
  const without = [ribbed, solid].flatMap(({ value }, index) => (value === null ? [marks[index]!] : []))
  if (without.length > 0) return `No figure for ${without.join(' and ')}.`
  const differing = [
    ...ribbed.lacks.filter((lack) => !solid.lacks.includes(lack)).map((lack) => `${marks[0]} leaves out ${lack}`),
    ...solid.lacks.filter((lack) => !ribbed.lacks.includes(lack)).map((lack) => `${marks[1]} leaves out ${lack}`),
  ]
  if (differing.length > 0) return `Not like for like: ${differing.join(', ')}.`
  const main = ribbed.lacks.filter((lack) => lack.startsWith('concrete ') || lack.startsWith('bars '))
  return main.length > 0 ? `Both leave out ${main.join(', ')}.` : ''
}

function verdictOf({ better, decimals }: FigureRule, ribbed: number, solid: number): 'ribbed' | 'solid' | 'same' {
  const [first, second] = [Number(ribbed.toFixed(decimals)), Number(solid.toFixed(decimals))]
  if (first === second) return 'same'
  return first < second === (better === 'less') ? 'ribbed' : 'solid'
}

function worse({ label, unit, decimals, ribbedWorse }: FigureRule, ribbed: AlsoFigure, solid: AlsoFigure): string {
  const figures = `${figure(ribbed.value!, decimals)} against ${figure(solid.value!, decimals)} ${unit}`
  const why = ribbedWorse === '' ? '' : `: ${ribbedWorse}`
  return `${label}: the ribbed floor is the worse one, ${figures}${why}.`
}
