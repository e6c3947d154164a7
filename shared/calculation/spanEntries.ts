import type { EndOfSpan } from '../sizing/analysis/spanForces'
import type { Strip } from '../sizing/analysis/strip'
import { figure } from '../sizing/figure'
import type { RibTask } from '../sizing/ribbed/ribDesign'
import type { SlabAxis } from '../sizing/solid/slabPlan'
import type { SlabContext } from '../sizing/solid/slabContext'
import type { CalculationEntry, CalculationLine } from './calculation'
import { reckoned, said, worked } from './line'

const METHODS = {
  coefficients: 'coefficients for three or more about equal spans',
  elastic: 'linear elastic continuous beam on knife edges, every span loaded or not as is worst',
} as const

interface Ended {
  readonly isContinuous: boolean
  readonly supportMm: number
}

function endsInWords(ends: Readonly<Record<EndOfSpan, Ended>>): string {
  const words = (['start', 'end'] as const).map(
    (end) => `${ends[end].isContinuous ? 'continuous' : 'discontinuous'}, support ${figure(ends[end].supportMm)} mm`,
  )
  return words.join(' and ')
}

/** Clear span and what each end adds to it, mm. */
function spanLine(symbol: string, clearMm: number, spanMm: number): CalculationLine {
  return reckoned(symbol, 'ln + a', `${figure(clearMm)} + ${figure(spanMm - clearMm)}`, spanMm, 'mm', 1)
}

function stripLines({ spans, index }: Strip, method: keyof typeof METHODS): CalculationLine[] {
  if (spans.length === 1) return [said('one span, simple at both ends')]
  const lengths = spans.map(({ spanMm }) => figure(spanMm, 0)).join(', ')
  return [said(`span ${index + 1} of a strip of ${spans.length}: ${lengths} mm`), said(METHODS[method])]
}

/** Effective spans of a solid panel and how it carries. */
export function solidSpanEntries({ basis, analysis }: SlabContext): CalculationEntry[] {
  const { short, long, other, aspect, strip, method, panelCase } = analysis
  const clause = basis.effectiveSpanClause
  const of = (heading: string, axis: SlabAxis, line: CalculationLine) =>
    worked(heading, clause, line, said(endsInWords(axis.ends)))
  const way = long
    ? worked(
        'Two way',
        panelCase === null ? 'BS 8110-1 3.5.3.3' : 'BS 8110-1 3.5.3.4',
        reckoned('ly/lx', 'ly/lx', `${figure(long.spanMm)}/${figure(short.spanMm)}`, aspect, '', 3),
        said(panelCase === null ? 'four simple edges, corners may lift' : `panel case ${panelCase}`),
      )
    : worked(
        'One way',
        'BS 8110-1 3.5.2; EN 1992-1-1 5.3.1(5)',
        ...(strip && method !== 'twoWay' ? stripLines(strip, method) : []),
      )
  return [
    of('Short span', short.axis, spanLine('lx', short.axis.clearMm, short.spanMm)),
    ...(long ? [of('Long span', other, spanLine('ly', other.clearMm, long.spanMm))] : []),
    way,
  ]
}

/** Effective span of a panel's ribs and the strip they lie in. */
export function ribbedSpanEntries({ context }: RibTask): CalculationEntry[] {
  const { basis, analysis, clearMm, ends, section, solidZoneMm } = context
  return [
    worked('Along the ribs', basis.effectiveSpanClause, spanLine('l', clearMm, analysis.spanMm), said(endsInWords(ends))),
    worked('One way', 'statics', ...stripLines(analysis.strip, analysis.forces.method)),
    worked(
      'Section of one rib',
      'scheme',
      reckoned('spacing', 'block + rib', `${figure(section.clearMm)} + ${figure(section.ribMm)}`, section.spacingMm, 'mm', 1),
      said(`solid zone ${figure(solidZoneMm)} mm from the face of each support`),
    ),
  ]
}
