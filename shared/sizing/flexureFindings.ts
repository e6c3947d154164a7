import type { BendingSection, Flexure, TensionZone } from './codeBasis'
import type { CodeBasis } from './codeBasis'
import { figure } from './figure'
import type { Finding } from './finding'

/**
 * The two findings of a section in bending: K against the greatest K, and steel required against provided.
 *
 * Source: by the basis, `flexure`
 * @param where - opens the working, as `midspan`; asked only when shown
 */
export function flexureFindings(
  name: 'flexure.midspan' | 'flexure.support',
  where: () => string,
  { k, greatestK, requiredMm2, clause, kWorking, steelWorking }: Flexure,
  providedMm2: number,
): Finding[] {
  const sign = (isMet: boolean) => (isMet ? '≤' : '>')
  return [
    {
      name,
      clause,
      demand: k,
      capacity: greatestK,
      unit: '-',
      working: () => `${where()}: ${kWorking()} ${sign(k <= greatestK)} ${greatestK}`,
    },
    {
      name,
      clause,
      demand: requiredMm2,
      capacity: providedMm2,
      unit: 'mm²',
      working: () => `${where()}: ${steelWorking()} ${sign(requiredMm2 <= providedMm2)} ${figure(providedMm2, 0)} mm² provided`,
    },
  ]
}

/**
 * Least and most steel of a section.
 *
 * Source: by the basis, `leastSteelMm2` and `mostSteelMm2`
 * @param concreteMm2 - area of concrete that the most is a share of
 */
export function steelLimitFindings(
  basis: CodeBasis,
  where: () => string,
  zone: TensionZone,
  concreteMm2: number,
  providedMm2: number,
): Finding[] {
  const [least, most] = [basis.leastSteelMm2(zone), basis.mostSteelMm2(concreteMm2)]
  const provided = () => `${figure(providedMm2, 0)} mm² provided`
  return [
    {
      name: 'steel.least',
      clause: least.clause,
      demand: least.value,
      capacity: providedMm2,
      unit: 'mm²',
      working: () => `${where()}: ${least.working()}; ${provided()}`,
    },
    {
      name: 'steel.most',
      clause: most.clause,
      demand: providedMm2,
      capacity: most.value,
      unit: 'mm²',
      working: () => `${where()}: ${most.working()}; ${provided()}`,
    },
  ]
}

/**
 * Span over effective depth against its limit.
 *
 * Source: by the basis, `spanDepthLimit`
 */
export function deflectionFinding(
  basis: CodeBasis,
  where: () => string,
  input: Parameters<CodeBasis['spanDepthLimit']>[0] & { readonly section: BendingSection },
): Finding {
  const limit = basis.spanDepthLimit(input)
  const { spanMm, section } = input
  const actual = spanMm / section.depthMm
  return {
    name: 'deflection',
    clause: limit.clause,
    demand: actual,
    capacity: limit.value,
    unit: '-',
    working: () => `${where()}: l/d = ${figure(spanMm, 0)}/${figure(section.depthMm)} = ${figure(actual)}; ${limit.working()}`,
  }
}
