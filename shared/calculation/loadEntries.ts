import type { Brief } from '../contracts/appraisal'
import { REINFORCED_CONCRETE_KN_PER_M3, ultimateLoad } from '../sizing/actions'
import type { CodeBasis } from '../sizing/codeBasis'
import { figure } from '../sizing/figure'
import type { RibTask } from '../sizing/ribbed/ribDesign'
import type { SlabContext } from '../sizing/solid/slabContext'
import { GRAVITY_M_PER_S2 } from '../units'
import type { CalculationEntry } from './calculation'
import { reckoned, worked } from './line'

const WEIGHTS = 'EN 1991-1-1 Table A.1'

/** Loads of a solid panel, kN/m². */
export function solidLoadEntries({ basis, brief, heightMm, analysis }: SlabContext): CalculationEntry[] {
  const [depth, weight] = [figure(heightMm / 1000, 4), REINFORCED_CONCRETE_KN_PER_M3]
  const own = (heightMm / 1000) * weight
  return [
    worked('Self-weight', WEIGHTS, reckoned('g0', 'h·γc', `${depth}·${weight}`, own, 'kN/m²')),
    ...actionEntries(own, analysis.loads, brief, basis),
  ]
}

/** Loads of a ribbed panel, kN/m²: concrete and blocks inside the clear outline over its net area. */
export function ribbedLoadEntries({ panel, scheme, context }: RibTask, brief: Brief): CalculationEntry[] {
  const { areas, blocksWhole, cutLength } = panel.layout
  const { length, width, height, mass } = scheme.block
  const areaM2 = (areas.clear - areas.voids) / 1e6
  const longMm = blocksWhole * length + cutLength
  const blocksM3 = (longMm * width * height) / 1e9
  const blocksKn = ((longMm / length) * mass * GRAVITY_M_PER_S2) / 1000
  const depthM = context.section.heightMm / 1000
  const own = ((areaM2 * depthM - blocksM3) * REINFORCED_CONCRETE_KN_PER_M3 + blocksKn) / areaM2
  const [a, h, v, w] = [figure(areaM2, 3), figure(depthM, 4), figure(blocksM3, 4), figure(blocksKn, 3)]
  return [
    worked(
      'Self-weight',
      WEIGHTS,
      reckoned(
        'Vb',
        'blocks·length·width·height',
        `${figure(longMm / 1000, 3)}·${width / 1000}·${height / 1000}`,
        blocksM3,
        'm³',
        3,
      ),
      reckoned('Wb', 'blocks·mass·g', `${figure(longMm / length, 3)}·${mass}·${GRAVITY_M_PER_S2}/1000`, blocksKn, 'kN'),
      reckoned('g0', '((A·h − Vb)·γc + Wb)/A', `((${a}·${h} − ${v})·${REINFORCED_CONCRETE_KN_PER_M3} + ${w})/${a}`, own, 'kN/m²'),
    ),
    ...actionEntries(own, panel.loads, brief, context.basis),
  ]
}

function actionEntries(own: number, loads: SlabContext['analysis']['loads'], brief: Brief, basis: CodeBasis): CalculationEntry[] {
  const { permanentKnPerM2: permanent, variableKnPerM2: variable } = loads
  const { permanent: onPermanent, variable: onVariable, clause } = basis.loadFactors
  const sum = [own, brief.finishesLoad, brief.servicesLoad].map((each) => figure(each, 3)).join(' + ')
  const [g, q] = [figure(permanent, 3), figure(variable, 3)]
  return [
    worked('Permanent load', 'brief', reckoned('gk', 'g0 + finishes + services', sum, permanent, 'kN/m²')),
    worked(
      'Variable load',
      'brief; EN 1991-1-1 6.3.1.2(8)',
      reckoned('qk', 'imposed + partitions', `${brief.imposedLoad} + ${brief.partitionsLoad}`, variable, 'kN/m²'),
    ),
    worked(
      'Ultimate load',
      clause,
      reckoned('n', 'γG·gk + γQ·qk', `${onPermanent}·${g} + ${onVariable}·${q}`, ultimateLoad(loads, basis.loadFactors), 'kN/m²'),
    ),
  ]
}
