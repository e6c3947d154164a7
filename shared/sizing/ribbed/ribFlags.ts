import type { EndOfSpan } from '../analysis/spanForces'
import { idleBeyondFlags, type StripAnalysis, stripFlags } from '../analysis/stripFlags'
import { figure } from '../figure'
import { fireFlags } from '../fireFlags'
import { slenderFlags } from '../slenderFlags'
import { type Finding, isMet } from '../finding'
import { FABRIC } from '../tables/fabric'
import { endName } from './ribContext'
import { isMixedEnd, type RibbedPanel } from './ribbedPanel'
import type { RibTask } from './ribDesign'
import { zoneFlags } from './zoneFlags'

/**
 * Assumptions and approximations of one ribbed panel, in sentences.
 *
 * Source: project rule, what was assumed is stated (engine design sections 1 and 4)
 */
export function ribFlags(task: RibTask, findings: readonly Finding[]): string[] {
  const { panel, context } = task
  const lengths = panel.ribs.map(({ clearMm }) => clearMm)
  const varies = Math.max(...lengths) - Math.min(...lengths) > 1
  return [
    ...stripFlags(stripAnalysisOf(task), context.basis.redistribution),
    ...idleBeyondFlags(panel.site.edges, [...panel.ends.start.edges, ...panel.ends.end.edges]),
    ...(['start', 'end'] as const).filter((end) => isMixedEnd(panel, end)).map((end) => mixedFlag(panel, end)),
    ...(varies ? [`ribs differ in length: sized on the longest clear rib, ${figure(panel.clearMm, 0)} mm`] : []),
    ...(panel.site.panel.voids.length > 0
      ? [
          'ribs that end at a void hang on its trimmers; their bars are made up in the ribs beside and in the strips across (common practice), and not checked',
        ]
      : []),
    ...rowFlags(task),
    ...zoneFlags(task, findings),
    ...crossRibFlag(task),
    ...meshFlag(task),
    ...fireFlags(findings),
    ...slenderFlags(findings, context.basis),
  ]
}

function stripAnalysisOf({ panel, context: { analysis } }: RibTask): StripAnalysis {
  const { strip, position, forces, askedShare, lifted } = analysis
  const { method, redistributedShare } = forces
  const liftedEdges = lifted.flatMap((end) => panel.ends[end].edges)
  return { strip, position, method, redistributedShare, askedShare, liftedEdges }
}

function mixedFlag(panel: RibbedPanel, end: EndOfSpan): string {
  return `${endName(panel, end)}: continuous in part only, taken as discontinuous`
}

function rowFlags({ panel: { rows } }: RibTask): string[] {
  if (rows === null) return []
  const count = rows.fewer === 0 ? 'as many as alone' : `${rows.fewer} fewer than alone`
  return [
    `rows stand on one grid with those of neighbours whose ribs run on into this panel: ${rows.starts.length} rows, ${count}`,
  ]
}

function crossRibFlag({ panel: { layout }, scheme, context: { basis, section } }: RibTask): string[] {
  const most = basis.crossRibSpacingMm(section.heightMm)
  if (!most && scheme.crossRibs === 'rule') return [`cross ribs by rule: ${basis.title} has none, so no cross rib is laid`]
  const longest = Math.max(0, ...layout.rows.flatMap(({ runs }) => runs.map(({ start, end }) => end - start)))
  if (!most || isMet(longest, most.value)) return []
  return [
    `clear length of ribs ${figure(longest, 0)} mm exceeds ${most.working()} (${most.clause}): ribs are analysed one way as discrete members`,
  ]
}

function meshFlag({ scheme: { mesh }, context: { basis, section } }: RibTask): string[] {
  const { toppingMm } = section
  if (toppingMm === 0) return []
  const least = basis.toppingMeshMm2(toppingMm)
  const { areaMm2PerM } = FABRIC[mesh]
  if (isMet(least.value, areaMm2PerM)) return []
  return [
    `topping: ${mesh === 'none' ? 'no mesh' : `${mesh} mesh, ${figure(areaMm2PerM, 0)} mm²/m`}, against ${figure(least.value, 0)} mm²/m asked each way (${least.clause})`,
  ]
}
