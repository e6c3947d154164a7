import type { BarDiameter } from '../../contracts/appraisal'
import { type CuttingPlan, cuttingPlan, type WantedLength } from './cuttingPlan'

/** Bars of one diameter to be cut. */
export interface WantedBars {
  readonly diameter: BarDiameter
  readonly lengths: readonly WantedLength[]
}

export interface CuttingQuestion {
  readonly wanted: readonly WantedBars[]
  readonly stockMm: number
  readonly sawCutMm: number
}

/** How the bars of one diameter are cut. */
export interface DiameterPlan {
  readonly diameter: BarDiameter
  readonly plan: CuttingPlan
}

/** The plans one by one, so that each can be shown when it is done. */
export function* plansOf({ wanted, stockMm, sawCutMm }: CuttingQuestion): Generator<DiameterPlan> {
  for (const { diameter, lengths } of wanted) yield { diameter, plan: cuttingPlan(lengths, stockMm, sawCutMm) }
}
