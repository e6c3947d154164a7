import type { AppraisalFile, Brief, RibbedScheme, Scheme, SolidScheme } from '../contracts/appraisal'
import { codeBasisOf } from '../sizing/codeBases'
import { figure } from '../sizing/figure'
import { levelSites } from '../sizing/panelSite'
import { ribTasks } from '../sizing/ribbed/ribTasks'
import type { SizedPanel } from '../sizing/sizedPanel'
import { sizeScheme } from '../sizing/sizeScheme'
import { solidContexts } from '../sizing/solid/solidContexts'
import { CALCULATION_TITLES, type CalculationEntry, type PanelCalculation } from './calculation'
import { checkEntries } from './checkEntries'
import { ribbedDepthEntries, solidDepthEntries } from './depthEntries'
import { ribbedForceEntries, solidForceEntries } from './forceEntries'
import { ribbedLoadEntries, solidLoadEntries } from './loadEntries'
import { ribbedSpanEntries, solidSpanEntries } from './spanEntries'

type Floor = Pick<AppraisalFile, 'brief' | 'levels' | 'schemes'>

/** Which panel of which scheme, by their marks. */
export interface CalculationTarget {
  readonly scheme: string
  readonly level: string
  readonly panel: string
}

/**
 * The readable calculation of one panel: loads, spans, forces and every check, each with clause, formula, numbers and result. It sizes the
 * floor again and takes its figures from there; asked only when somebody looks.
 *
 * Source: project rule, every result carries its working
 * @throws RangeError where there is no such scheme, level or panel, OutOfScopeError as `sizeScheme`
 */
export function calculationOf({ brief, levels, schemes }: Floor, target: CalculationTarget): PanelCalculation {
  const scheme = schemes.find(({ mark }) => mark === target.scheme)
  if (!scheme) throw new RangeError(`expected the mark of a scheme, got ${target.scheme}`)
  const sized = sizeScheme(scheme, { brief, levels })
  const panel = sized.panels.find(({ level, mark }) => level === target.level && mark === target.panel)
  if (!panel) throw new RangeError(`expected a panel of the floor, got ${target.level} ${target.panel}`)
  const opening =
    scheme.kind === 'solid' ? solidOpening(scheme, brief, levels, target) : ribbedOpening(scheme, brief, levels, target)
  const sections = CALCULATION_TITLES.map((title, i) => ({ title, entries: opening[i] ?? checkEntries(panel, title) }))
  return {
    ...target,
    kind: scheme.kind,
    basis: codeBasisOf(brief).title,
    depthMm: panel.depth,
    inputs: inputsOf(scheme, brief, panel),
    assumptions: panel.flags,
    sections: sections.filter(({ entries }) => entries.length > 0),
  }
}

/** Loads, spans, forces: the first three steps. */
type Opening = readonly CalculationEntry[][]

function solidOpening(scheme: SolidScheme, brief: Brief, levels: Floor['levels'], { level, panel }: CalculationTarget): Opening {
  const found = solidContexts(levelSites(levels), scheme, brief, codeBasisOf(brief)).find(({ site }) => site.mark === level)
  const context = found?.contexts.find(({ plan }) => plan.site.panel.mark === panel)
  if (!context) throw new RangeError(`expected a panel of the floor, got ${level} ${panel}`)
  return [solidLoadEntries(context), [...solidSpanEntries(context), ...solidDepthEntries(context)], solidForceEntries(context)]
}

function ribbedOpening(
  scheme: RibbedScheme,
  brief: Brief,
  levels: Floor['levels'],
  { level, panel }: CalculationTarget,
): Opening {
  const site = levelSites(levels).find(({ mark }) => mark === level)
  const index = site?.panels.findIndex((each) => each.panel.mark === panel) ?? -1
  const task = site && ribTasks(site, scheme, brief, codeBasisOf(brief)).tasks[index]
  if (!task) throw new RangeError(`expected a panel of the floor, got ${level} ${panel}`)
  return [ribbedLoadEntries(task, brief), [...ribbedSpanEntries(task), ...ribbedDepthEntries(task)], ribbedForceEntries(task)]
}

function inputsOf(scheme: Scheme, brief: Brief, { depth }: SizedPanel): PanelCalculation['inputs'] {
  const strengths =
    brief.basis === 'EN1992'
      ? [`fck ${figure(brief.fck)} MPa`, `fyk ${figure(brief.fyk)} MPa`]
      : [`fcu ${figure(brief.fcu)} MPa`, `fy ${figure(brief.fy)} MPa`]
  const shape =
    scheme.kind === 'solid'
      ? `${scheme.thickness === 'least' ? 'least that passes' : 'given'}, ${figure(depth)} mm`
      : `block ${scheme.block.length} × ${scheme.block.width} × ${scheme.block.height} mm, ${scheme.block.mass} kg; rib ${scheme.ribWidth} mm; ` +
        `topping ${scheme.topping} mm; overall ${figure(depth)} mm`
  return [
    { name: 'Concrete and steel', value: strengths.join(', ') },
    { name: scheme.kind === 'solid' ? 'Thickness' : 'Section', value: shape },
    { name: 'Cover, to the outermost bar', value: `${figure(brief.cover)} mm` },
    { name: 'Fire period', value: brief.fireMinutes === 0 ? 'none asked' : `${brief.fireMinutes} minutes` },
    ...(brief.exposure ? [{ name: 'Exposure', value: brief.exposure }] : []),
  ]
}
