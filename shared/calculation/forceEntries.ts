import { ultimateLoad } from '../sizing/actions'
import type { EndOfSpan } from '../sizing/analysis/spanForces'
import { figure } from '../sizing/figure'
import { endName } from '../sizing/ribbed/ribContext'
import type { RibTask } from '../sizing/ribbed/ribDesign'
import type { SlabSpan } from '../sizing/solid/slabAnalysis'
import type { SlabContext } from '../sizing/solid/slabContext'
import type { CalculationEntry, CalculationLine } from './calculation'
import { reckoned, said, worked } from './line'

/** Moments this close are one. */
const SAME = 1e-9

const ENDS: readonly EndOfSpan[] = ['start', 'end']

/** What coefficients are of: ultimate load, kN/m², and span, m. */
interface Scale {
  readonly load: number
  readonly spanM: number
  readonly span: string
}

/** A moment as a coefficient of n·l². */
function momentLine(symbol: string, momentNmm: number, { load, spanM, span }: Scale): CalculationLine {
  const value = momentNmm / 1e6
  const coefficient = momentNmm / 1e3 / (load * spanM ** 2) / 1e3
  return reckoned(symbol, `c·n·${span}²`, `${figure(coefficient, 4)}·${figure(load, 3)}·${figure(spanM, 3)}²`, value, 'kNm/m')
}

/** The moment over a support: the panel's own, and where the floor behind has a larger one, that of the two which counts. */
function hoggingLines(momentNmm: number, ownNmm: number, scale: Scale): CalculationLine[] {
  if (momentNmm <= 0) return []
  if (momentNmm <= ownNmm * (1 + SAME)) return [momentLine('M hogging', momentNmm, scale)]
  const [own, counts] = [ownNmm / 1e6, momentNmm / 1e6]
  const larger = reckoned('M hogging', 'max(M own; M behind)', `max(${figure(own, 2)}; ${figure(counts, 2)})`, counts, 'kNm/m')
  return [
    ...(own > 0 ? [momentLine('M own', ownNmm, scale)] : []),
    { ...larger, note: 'of unequal moments the larger counts on both sides, on the safe side' },
  ]
}

/** A shear as a coefficient of n·l. */
function shearLine(symbol: string, shearN: number, { load, spanM, span }: Scale): CalculationLine {
  const value = shearN / 1000
  return reckoned(
    symbol,
    `c·n·${span}`,
    `${figure(value / (load * spanM), 4)}·${figure(load, 3)}·${figure(spanM, 3)}`,
    value,
    'kN/m',
  )
}

/** Moments and shears of a solid panel, per metre. */
export function solidForceEntries(context: SlabContext): CalculationEntry[] {
  const { basis, analysis } = context
  const { short, long, method, panelCase } = analysis
  const load = ultimateLoad(analysis.loads, basis.loadFactors)
  const scale = { load, spanM: short.spanMm / 1000, span: long ? 'lx' : 'l' }
  const tables = panelCase === null ? 'BS 8110-1 Table 3.13' : 'BS 8110-1 Tables 3.14, 3.15'
  const clause = { twoWay: tables, coefficients: 'BS 8110-1 Table 3.12', elastic: 'linear elastic analysis' }[method]
  return [...spanEntries('short span', short, scale, clause), ...(long ? spanEntries('long span', long, scale, clause) : [])]
}

function spanEntries(name: string, { axis, ends, saggingNmm }: SlabSpan, scale: Scale, clause: string): CalculationEntry[] {
  const atEnd = (end: EndOfSpan): CalculationEntry[] => {
    const side = axis.ends[end]
    if (side.isFree) return []
    const { hoggingNmm, ownNmm, shearN } = ends[end]
    const heading = `${name}, ${endName({ ends: axis.ends }, end)}`
    return [worked(heading, clause, ...hoggingLines(hoggingNmm, ownNmm, scale), shearLine('V', shearN, scale))]
  }
  return [worked(`${name}, midspan`, clause, momentLine('M sagging', saggingNmm, scale)), ...ENDS.flatMap(atEnd)]
}

/** Moments and shears of a panel's ribs, per metre and for one rib. */
export function ribbedForceEntries({ context, panel }: RibTask): CalculationEntry[] {
  const { analysis, basis, section, ends } = context
  const { forces, spanMm } = analysis
  const scale = { load: ultimateLoad(panel.loads, basis.loadFactors), spanM: spanMm / 1000, span: 'l' }
  const clause = { coefficients: 'BS 8110-1 Table 3.12', elastic: 'linear elastic analysis' }[forces.method]
  const ofRib = (symbol: string, perMetre: number, unit: string) => {
    const spacingM = section.spacingMm / 1000
    return reckoned(
      `${symbol} of one rib`,
      `${symbol}·spacing`,
      `${figure(perMetre, 3)}·${figure(spacingM, 4)}`,
      perMetre * spacingM,
      unit,
    )
  }
  const atEnd = (end: EndOfSpan): CalculationEntry[] => {
    if (ends[end].edges.length === 0) return [worked(endsAtVoid, clause, said('hangs on trimmers of a void'))]
    const [hoggingNmm, shearN] = [forces.hoggingNmm(end, 0), forces.shearN(end, 0)]
    const ownNmm = forces.ownHoggingNmm?.(end) ?? hoggingNmm
    const isHogging = ends[end].isContinuous && hoggingNmm > 0
    const hogging = isHogging ? [...hoggingLines(hoggingNmm, ownNmm, scale), ofRib('M hogging', hoggingNmm / 1e6, 'kNm')] : []
    return [worked(endName(context, end), clause, ...hogging, shearLine('V', shearN, scale), ofRib('V', shearN / 1000, 'kN'))]
  }
  const sagging = [momentLine('M sagging', forces.saggingNmm, scale), ofRib('M sagging', forces.saggingNmm / 1e6, 'kNm')]
  return [worked('midspan', clause, ...sagging), ...ENDS.flatMap(atEnd)]
}

const endsAtVoid = 'end at a void'
