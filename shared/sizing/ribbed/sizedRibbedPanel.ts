import type { PanelLayout } from '../../layout/panelLayout'
import type { EndOfSpan } from '../analysis/spanForces'
import type { BarLines } from '../bars/barLines'
import { barRuns } from '../bars/barRuns'
import { areaOf, type BarSet, thickest } from '../bars/barSet'
import { exposureFindings } from '../exposureFindings'
import { givenFlags } from '../givenFlags'
import { fireStanding } from '../fireStanding'
import { checkRow } from '../finding'
import type { SizedPanel } from '../sizedPanel'
import { fireFindings, midspanBending } from './checks/bottomFindings'
import { bottomLines, topLines } from './ribBarLines'
import { ribTrimmerLines } from './ribTrimmers'
import { perRib, type RibContext } from './ribContext'
import type { RibDesign, RibTask } from './ribDesign'
import { ribFlags } from './ribFlags'
import { fireSizeFindings, shapeFindings } from './checks/shapeFindings'
import { supportBending } from './checks/topFindings'

const ENDS: readonly EndOfSpan[] = ['start', 'end']

/**
 * A designed ribbed panel as the take-off and the checks read it.
 *
 * Source: project rule, engine design section 9
 */
export function sizedRibbedPanel(
  task: RibTask,
  design: RibDesign,
  { level, mark }: { readonly level: string; readonly mark: string },
  layout: PanelLayout,
  lines: readonly BarLines[],
): SizedPanel {
  const { context } = task
  const { basis, section, analysis, fireMinutes } = context
  const outermost = { ...section, diameterMm: Math.max(...[design.bottom, design.tops.start, design.tops.end].map(thickest)) }
  const findings = [
    ...shapeFindings(basis, section, analysis, fireMinutes),
    ...design.findings,
    ...exposureFindings(basis, outermost),
  ]
  return {
    level,
    mark,
    depth: section.heightMm,
    areas: layout.areas,
    layout,
    checks: findings.map((finding) => checkRow(finding, level, mark)),
    places: findings.map(({ place }) => place()),
    moments: momentsOf(context),
    steel: steelOf(context, design),
    bars: lines.flatMap(barRuns),
    reinforcement: { kind: 'ribbed', ribBars: design.bottom, topBars: heavierTop(context, design) },
    fire: fireStanding((minutes) => [
      ...fireSizeFindings(basis, section, analysis, minutes),
      ...fireFindings({ ...context, fireMinutes: minutes }, design.bottom),
    ]),
    flags: [...ribFlags(task, findings), ...givenFlags(task.scheme, level, mark)],
  }
}

/** Top bars over the continuous end that has more of them. */
function heavierTop({ ends }: RibContext, { tops }: RibDesign): BarSet {
  const [start, end] = ENDS.map((each): BarSet => (ends[each].isContinuous ? tops[each] : []))
  return areaOf(start!) >= areaOf(end!) ? start! : end!
}

function momentsOf(context: RibContext): SizedPanel['moments'] {
  const { forces } = context.analysis
  const supports = ENDS.map((end) => (context.ends[end].isContinuous ? forces.hoggingNmm(end, 0) : 0))
  return { midspan: perRib(context, forces.saggingNmm) / 1e6, support: perRib(context, Math.max(...supports)) / 1e6 }
}

/** Steel at midspan, and at the continuous end that asks most; zeros without one. */
function steelOf(context: RibContext, { bottom, tops }: RibDesign): SizedPanel['steel'] {
  const supports = ENDS.filter((end) => context.ends[end].isContinuous).map((end) => ({
    required: supportBending(context, end, tops[end]).requiredMm2,
    provided: areaOf(tops[end]),
  }))
  const none = { required: 0, provided: 0 }
  const worst = supports.reduce((most, each) => (each.required > most.required ? each : most), supports[0] ?? none)
  return {
    midspanRequired: midspanBending(context, bottom).flexure.requiredMm2,
    midspanProvided: areaOf(bottom),
    supportRequired: worst.required,
    supportProvided: worst.provided,
  }
}

/**
 * All bars of a ribbed panel to be scheduled.
 *
 * Source: see `bottomLines`, `topLines` and `ribTrimmerLines`
 */
export function ribBarLines({ panel, context, rules }: RibTask, { bottom, tops }: RibDesign): BarLines[] {
  return [
    ...bottom.map(({ diameter, count }) => bottomLines(panel, diameter, count, rules)),
    ...ENDS.flatMap((end) => tops[end].flatMap(({ diameter, count }) => topLines(panel, end, diameter, count, context, rules))),
    ...ribTrimmerLines(panel, bottom, rules),
  ]
}
