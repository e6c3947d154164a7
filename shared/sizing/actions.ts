import type { Brief } from '../contracts/appraisal'
import { GRAVITY_M_PER_S2 } from '../units'
import type { LoadFactors } from './codeBasis'

/**
 * Weight of reinforced concrete, kN/m³.
 *
 * Source: EN 1991-1-1:2002, Table A.1, normal weight 24 plus 1 for reinforcement (seen)
 */
export const REINFORCED_CONCRETE_KN_PER_M3 = 25

/** Characteristic loads of a floor, kN/m². */
export interface FloorLoads {
  /** Self-weight, finishes and services. */
  readonly permanentKnPerM2: number
  /** Imposed load and partitions. */
  readonly variableKnPerM2: number
  readonly imposedKnPerM2: number
  readonly partitionsKnPerM2: number
}

/**
 * Self-weight of concrete and blocks inside the clear outline over its net area, kN/m².
 *
 * Source: EN 1991-1-1:2002, Table A.1 (concrete); project rule, engine design section 4 (blocks from their mass, net area)
 * @param netAreaMm2 - clear outline less voids
 * @param blocksMm3 - gross volume of the blocks, which is not concrete
 */
export function selfWeightKnPerM2(netAreaMm2: number, depthMm: number, blocksMm3: number, blocksKg: number): number {
  const concreteKn = ((netAreaMm2 * depthMm - blocksMm3) / 1e9) * REINFORCED_CONCRETE_KN_PER_M3
  return (concreteKn + (blocksKg * GRAVITY_M_PER_S2) / 1000) / (netAreaMm2 / 1e6)
}

/**
 * Characteristic loads of a floor of a given self-weight under a brief.
 *
 * Source: EN 1991-1-1:2002, 6.3.1.2(8), movable partitions added to the imposed load; finishes and services permanent
 */
export function floorLoads(selfWeight: number, brief: Brief): FloorLoads {
  return {
    permanentKnPerM2: selfWeight + brief.finishesLoad + brief.servicesLoad,
    variableKnPerM2: brief.imposedLoad + brief.partitionsLoad,
    imposedKnPerM2: brief.imposedLoad,
    partitionsKnPerM2: brief.partitionsLoad,
  }
}

/**
 * Ultimate load of a loaded span, kN/m².
 *
 * Source: EN 1990:2002, 6.4.3.2, Expression (6.10), with the factors of the basis
 */
export function ultimateLoad({ permanentKnPerM2, variableKnPerM2 }: FloorLoads, factors: LoadFactors): number {
  return factors.permanent * permanentKnPerM2 + factors.variable * variableKnPerM2
}
