import type { BarDiameter } from '../contracts/appraisal'
import { toM } from '../units'
import { BAR_MASS_KG_PER_M } from '../sizing/tables/bars'
import { type Expression, figure, inTonnes, times } from './expression'
import type { MeasuredPanel } from './measuredPanel'
import type { MeasurementRules } from './measurementRules'
import { floorAreaOf } from './planAreas'

/** Bars of one diameter in one panel, t: one expression for each run, number × length × mass per metre. */
export function barsOf({ sized }: MeasuredPanel, diameter: BarDiameter): Expression[] {
  return sized.bars
    .filter((run) => run.diameter === diameter && run.count > 0)
    .map((run) => inTonnes(times(figure(run.count), figure(toM(run.lengthMm)), figure(BAR_MASS_KG_PER_M[diameter]))))
}

/** Mesh of one panel, m²: the floor's own concrete on plan; laps are in the rate. */
export function meshOf(measured: MeasuredPanel, rules: MeasurementRules): Expression {
  return floorAreaOf(measured, rules.deductVoidsOver.meshM2)
}
