import type { Measurement } from '../contracts/measurement'
import type { MeasurementRules } from './measurementRules'
import { comparingRules } from './rules/comparingRules'
import { compositeRules } from './rules/compositeRules'
import { kilogramRules } from './rules/kilogramRules'
import { nrm2Rules } from './rules/nrm2Rules'

/** Every set of measurement rules by its code. Another one is a file in `rules/`, its code in the contract and a line here. */
export const RULE_SETS: Readonly<Record<Measurement, MeasurementRules>> = {
  comparing: comparingRules,
  nrm2: nrm2Rules,
  kilograms: kilogramRules,
  composite: compositeRules,
}
