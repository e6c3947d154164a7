import type { BarDiameter, Level, Scheme } from '../contracts/appraisal'
import { BAR_MASS_KG_PER_M } from '../sizing/tables/bars'
import { FABRIC } from '../sizing/tables/fabric'
import { toM, toM2 } from '../units'
import { concreteSplit } from './concrete'
import { blockMassKg, grossAreaM2 } from './deadLoad'
import { edgesOf, soffitOf } from './formwork'
import { type MeasuredPanel, repeatsOf } from './measuredPanel'
import { comparingRules } from './rules/comparingRules'

/** What a scheme is made of, unrounded, repeats in, net and the same whatever rules the bill is measured by. */
export interface SchemeMeasures {
  /** To support centre-lines. */
  readonly grossAreaM2: number
  /** On plan, of the floor's own concrete and blocks: between supports and over walls, less voids. */
  readonly ownAreaM2: number
  /** Floors with repeats. */
  readonly floorCount: number
  readonly concreteM3: number
  /** Whole and cut ones. */
  readonly blockCount: number
  readonly blocksKg: number
  readonly barsKg: Readonly<Partial<Record<BarDiameter, number>>>
  readonly meshM2: number
  readonly meshKg: number
  readonly soffitM2: number
  /** Free edges of the floor and edges of voids. */
  readonly edgeM: number
}

/**
 * A scheme measured for what is compared beside the cost.
 *
 * Source: engine design section 5; masses BS 4449 and BS 4483, as in the tables of `sizing`
 * @param panels - of one scheme, over all levels
 */
export function schemeMeasures(panels: readonly MeasuredPanel[], scheme: Scheme, levels: readonly Level[]): SchemeMeasures {
  const sum = (measure: (measured: MeasuredPanel) => number) =>
    panels.reduce((total, measured) => total + measure(measured) * repeatsOf(measured), 0)
  const ownAreaM2 = sum(ownArea)
  const mesh = scheme.kind === 'ribbed' ? scheme.mesh : 'none'
  const meshM2 = mesh === 'none' ? 0 : ownAreaM2
  return {
    grossAreaM2: grossAreaM2(panels),
    ownAreaM2,
    floorCount: levels.reduce((count, { repeat }) => count + repeat, 0),
    concreteM3: Object.values(concreteSplit(panels, scheme, comparingRules)).reduce((total, volume) => total + volume, 0),
    blockCount: sum(({ sized: { layout } }) => (layout ? layout.blocksWhole + layout.blocksCut : 0)),
    blocksKg: sum((measured) => blockMassKg(measured, scheme)),
    barsKg: barMasses(panels),
    meshM2,
    meshKg: meshM2 * FABRIC[mesh].massKgPerM2,
    soffitM2: sum((measured) => soffitOf(measured, comparingRules).value),
    edgeM: sum((measured) => edgesOf(measured)?.value ?? 0),
  }
}

function ownArea({ sized: { areas } }: MeasuredPanel): number {
  return toM2(areas.clear - areas.voids + areas.wallStrips)
}

function barMasses(panels: readonly MeasuredPanel[]): Partial<Record<BarDiameter, number>> {
  const masses: Partial<Record<BarDiameter, number>> = {}
  for (const measured of panels) {
    for (const { diameter, count, lengthMm } of measured.sized.bars) {
      const kg = count * toM(lengthMm) * BAR_MASS_KG_PER_M[diameter] * repeatsOf(measured)
      if (kg > 0) masses[diameter] = (masses[diameter] ?? 0) + kg
    }
  }
  return masses
}
