import type { RibbedScheme, Scheme } from '../contracts/appraisal'
import type { ConcreteSplit } from '../contracts/appraisalResult'
import type { PanelAreas } from '../layout/panelLayout'
import { toM, toM2, toM3 } from '../units'
import { type Expression, figure, less, plus, times } from './expression'
import type { MeasuredPanel } from './measuredPanel'
import { repeatsOf } from './measuredPanel'
import type { MeasurementRules } from './measurementRules'
import { clearAreaOf } from './planAreas'
import { deductedVoids } from './voidsOf'

/**
 * Concrete of one panel, m³: plan area between beams and over walls, less voids, times the depth, less the blocks.
 *
 * Source: engine design 2.5, gross volume − voids − gross block volume; threshold of voids by the rules
 */
export function concreteOf(measured: MeasuredPanel, scheme: Scheme, rules: MeasurementRules): Expression {
  const { sized } = measured
  const wallStrips = sized.areas.wallStrips > 0 ? [figure(toM2(sized.areas.wallStrips))] : []
  const plan = less(plus(clearAreaOf(measured), ...wallStrips), ...deductedVoids(measured, voidThresholdM2(measured, rules)))
  const gross = times(plan, figure(toM(sized.depth)))
  const blocks = scheme.kind === 'ribbed' ? blockVolume(measured, scheme) : null
  return blocks ? less(gross, blocks) : gross
}

/** Gross volume of the blocks of one panel, m³: their ends are closed, so the hollows hold no concrete. */
function blockVolume({ sized: { layout } }: MeasuredPanel, { block }: RibbedScheme): Expression | null {
  if (!layout) return null
  const length = [
    ...(layout.blocksWhole > 0 ? [times(figure(layout.blocksWhole), figure(toM(block.length)))] : []),
    ...(layout.cutLength > 0 ? [figure(toM(layout.cutLength))] : []),
  ]
  return length.length === 0 ? null : times(plus(...length), figure(toM(block.width)), figure(toM(block.height)))
}

/**
 * Where the concrete of a scheme lies, m³, all panels with repeats; the members add up to the concrete measured.
 * A void too small to be deducted counts as trimmer, in a solid floor as slab.
 */
export function concreteSplit(panels: readonly MeasuredPanel[], scheme: Scheme, rules: MeasurementRules): ConcreteSplit {
  const perPanel = panels.map((measured) => ({ split: panelSplit(measured, scheme, rules), repeats: repeatsOf(measured) }))
  const total = (member: keyof ConcreteSplit) => perPanel.reduce((sum, { split, repeats }) => sum + split[member] * repeats, 0)
  return {
    topping: total('topping'),
    ribs: total('ribs'),
    edgeStrips: total('edgeStrips'),
    solidZones: total('solidZones'),
    crossRibs: total('crossRibs'),
    trimmers: total('trimmers'),
    fillers: total('fillers'),
    slab: total('slab'),
    wallStrips: total('wallStrips'),
  }
}

function panelSplit(measured: MeasuredPanel, scheme: Scheme, rules: MeasurementRules): ConcreteSplit {
  const { areas, depth } = measured.sized
  const deducted = deductedVoids(measured, voidThresholdM2(measured, rules)).reduce((sum, { value }) => sum + value, 0)
  const keptVoids = (toM2(areas.voids) - deducted) * toM(depth)
  const fullDepth = (areaMm2: number) => toM3(areaMm2 * depth)
  const split =
    scheme.kind === 'ribbed' ? ribbedSplit(areas, scheme, fullDepth) : { ...NOTHING, slab: fullDepth(areas.clear - areas.voids) }
  const keeper = scheme.kind === 'ribbed' ? 'trimmers' : 'slab'
  return { ...split, [keeper]: split[keeper] + keptVoids, wallStrips: fullDepth(areas.wallStrips) }
}

/** Area on plan over which a void is deducted from the concrete, m²: the rule speaks of its volume. */
function voidThresholdM2({ sized }: MeasuredPanel, rules: MeasurementRules): number {
  return rules.deductVoidsOver.concreteM3 / toM(sized.depth)
}

const NOTHING: ConcreteSplit = {
  topping: 0,
  ribs: 0,
  edgeStrips: 0,
  solidZones: 0,
  crossRibs: 0,
  trimmers: 0,
  fillers: 0,
  slab: 0,
  wallStrips: 0,
}

function ribbedSplit(areas: PanelAreas, { topping, block }: RibbedScheme, fullDepth: (areaMm2: number) => number): ConcreteSplit {
  return {
    ...NOTHING,
    topping: toM3((areas.blocks + areas.ribs) * topping),
    ribs: toM3(areas.ribs * block.height),
    edgeStrips: fullDepth(areas.edgeStrips),
    solidZones: fullDepth(areas.solidZones),
    crossRibs: fullDepth(areas.crossRibs),
    trimmers: fullDepth(areas.trimmers),
    fillers: fullDepth(areas.fillers),
  }
}
