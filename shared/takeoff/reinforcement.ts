import type { BarDiameter, Brief, Mesh } from '../contracts/appraisal'
import { meshLap } from '../sizing/bars/meshLap'
import { BAR_MASS_KG_PER_M } from '../sizing/tables/bars'
import { toM } from '../units'
import { dividedBy, type Expression, figure, inTonnes, less, times } from './expression'
import type { MeasuredPanel } from './measuredPanel'
import type { MeasurementRules } from './measurementRules'
import { floorAreaOf } from './planAreas'

/** Bars of one diameter in one panel, t or kg: one expression for each run, number × length × mass per metre. */
export function barsOf({ sized }: MeasuredPanel, diameter: BarDiameter, { barUnit }: MeasurementRules): Expression[] {
  return sized.bars
    .filter((run) => run.diameter === diameter && run.count > 0)
    .map((run) => times(figure(run.count), figure(toM(run.lengthMm)), figure(BAR_MASS_KG_PER_M[diameter])))
    .map((massKg) => (barUnit === 't' ? inTonnes(massKg) : massKg))
}

/**
 * Mesh of one panel, m²: the floor's own concrete on plan; with laps where the rules have them in the quantity, as the area of whole
 * sheets to what each of them covers.
 *
 * Source: project rule, sheet ÷ (sheet − lap) both ways; laps by the basis, see `meshLap`
 */
export function meshOf(
  measured: MeasuredPanel,
  mesh: Exclude<Mesh, 'none'>,
  rules: MeasurementRules,
  basis: Brief['basis'],
): Expression {
  const net = floorAreaOf(measured, rules.deductVoidsOver.meshM2)
  if (rules.meshLaps === null) return net
  const { sheetLengthMm, sheetWidthMm } = rules.meshLaps
  const lap = figure(toM(meshLap(mesh, basis).lapMm))
  const [length, width] = [figure(toM(sheetLengthMm)), figure(toM(sheetWidthMm))]
  return dividedBy(times(net, length, width), times(less(length, lap), less(width, lap)))
}
