import type { BendingSection, Flexure, TensionZone } from './codeBasis'
import type { CodeBasis } from './codeBasis'
import { figure } from './figure'
import type { Finding, Where } from './finding'

const opening = ({ place, bars }: Where) => `${place()}, ${bars()}`

/**
 * The two findings of a section in bending: K against the greatest K, and steel required against provided.
 *
 * Source: by the basis, `flexure`
 * @param where - opens the working
 */
export function flexureFindings(
  name: 'flexure.midspan' | 'flexure.support',
  where: Where,
  { k, greatestK, requiredMm2, clause, kWorking, steelWorking }: Flexure,
  providedMm2: number,
): Finding[] {
  const sign = (isMet: boolean) => (isMet ? '≤' : '>')
  const { place } = where
  return [
    {
      name,
      place,
      clause,
      demand: k,
      capacity: greatestK,
      unit: '-',
      working: () => `${opening(where)}: ${kWorking()} ${sign(k <= greatestK)} ${greatestK}`,
    },
    {
      name,
      place,
      clause,
      demand: requiredMm2,
      capacity: providedMm2,
      unit: 'mm²',
      working: () =>
        `${opening(where)}: ${steelWorking()} ${sign(requiredMm2 <= providedMm2)} ${figure(providedMm2, 0)} mm² provided`,
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
  where: Where,
  zone: TensionZone,
  concreteMm2: number,
  providedMm2: number,
): Finding[] {
  const [least, most] = [basis.leastSteelMm2(zone), basis.mostSteelMm2(concreteMm2)]
  const provided = () => `${figure(providedMm2, 0)} mm² provided`
  return [
    {
      name: 'steel.least',
      place: where.place,
      clause: least.clause,
      demand: least.value,
      capacity: providedMm2,
      unit: 'mm²',
      working: () => `${opening(where)}: ${least.working()}; ${provided()}`,
    },
    {
      name: 'steel.most',
      place: where.place,
      clause: most.clause,
      demand: providedMm2,
      capacity: most.value,
      unit: 'mm²',
      working: () => `${opening(where)}: ${most.working()}; ${provided()}`,
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
  where: Where,
  input: Parameters<CodeBasis['spanDepthLimit']>[0] & { readonly section: BendingSection },
): Finding {
  const limit = basis.spanDepthLimit(input)
  const { spanMm, section } = input
  const actual = spanMm / section.depthMm
  return {
    name: 'deflection',
    place: where.place,
    clause: limit.clause,
    demand: actual,
    capacity: limit.value,
    unit: '-',
    working: () =>
      `${opening(where)}: l/d = ${figure(spanMm, 0)}/${figure(section.depthMm)} = ${figure(actual)}; ${limit.working()}`,
  }
}
