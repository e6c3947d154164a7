import { figure } from '../sizing/figure'
import type { SchemeMeasures } from '../takeoff/schemeMeasures'
import type { AlsoFigure } from './alsoFigure'
import { airborneIndexDb, GREATEST_IMPACT, impactLevelDb, LEAST_AIRBORNE, LEAST_IMPACT } from './soundByMass'

/** Normal weight concrete, kg/m³. Source: EN 1991-1-1:2002, Table A.1, 24 kN/m³ */
const CONCRETE_KG_PER_M3 = 2400

const SCREENING = 'homogeneous bare floor, no credit for cavities; the floor’s own figure and not a building’s; screening only'

/**
 * Mass of a floor over its own area, kg/m²: concrete and blocks between and over supports, the mean of all floors.
 *
 * Source: EN 1991-1-1:2002, Table A.1; blocks by their mass
 */
export function floorMassKgPerM2({ concreteM3, blocksKg, ownAreaM2 }: SchemeMeasures): number {
  return (concreteM3 * CONCRETE_KG_PER_M3 + blocksKg) / ownAreaM2
}

/**
 * Airborne and impact sound by mass, dB; outside the range of a formula no figure, and why.
 *
 * Source: EN 12354-1:2000 and EN 12354-2:2000, Annexes B
 */
export function soundFigures(measures: SchemeMeasures): AlsoFigure[] {
  const mass = floorMassKgPerM2(measures)
  const { concreteM3, blocksKg, ownAreaM2 } = measures
  const blocks = blocksKg > 0 ? ` + ${figure(blocksKg, 0)}` : ''
  const ofMass = `m′ = (${figure(concreteM3, 2)} × ${CONCRETE_KG_PER_M3}${blocks}) / ${figure(ownAreaM2, 2)} = ${figure(mass, 0)} kg/m²`
  const [air, impact] = [airborneIndexDb(mass), impactLevelDb(mass)]
  const shown = figure(mass, 0)
  return [
    {
      key: 'soundAir',
      value: air,
      working:
        air === null
          ? `${ofMass}; no figure: the formula holds above ${LEAST_AIRBORNE} kg/m²`
          : `${ofMass}; Rw = 37.5 lg ${shown} − 42 = ${figure(air)} dB`,
      source: `EN 12354-1:2000, Annex B; ${SCREENING}`,
      lacks: [],
    },
    {
      key: 'soundImpact',
      value: impact,
      working:
        impact === null
          ? `${ofMass}; no figure: the formula holds from ${LEAST_IMPACT} to ${GREATEST_IMPACT} kg/m²`
          : `${ofMass}; Ln,w,eq = 164 − 35 lg ${shown} = ${figure(impact)} dB`,
      source: `EN 12354-2:2000, Annex B; ${SCREENING}`,
      lacks: [],
    },
  ]
}
