import type { DeadLoad } from '../contracts/appraisalResult'
import { figure } from '../sizing/figure'
import { REINFORCED_CONCRETE_KN_PER_M3 } from '../takeoff/deadLoad'
import type { SchemeMeasures } from '../takeoff/schemeMeasures'
import { GRAVITY_M_PER_S2 } from '../units'
import type { AlsoFigure } from './alsoFigure'

const LOAD_SOURCE = 'EN 1991-1-1:2002, Table A.1, reinforced concrete 25 kN/m³; blocks by their mass'
const STEEL_SOURCE = 'Nominal masses of BS 4449 and BS 4483; laps and hooks of bars in, laps of mesh not'

/**
 * Dead load of concrete and blocks over the gross area, kN/m², and in all, kN; steel over the gross area, kg/m², and in the concrete,
 * kg/m³.
 *
 * Source: EN 1991-1-1:2002, Table A.1; BS 4449 and BS 4483, nominal masses
 */
export function weightFigures(measures: SchemeMeasures, { perArea, total }: DeadLoad): AlsoFigure[] {
  const { concreteM3, blocksKg, grossAreaM2, meshKg } = measures
  const barsKg = Object.values(measures.barsKg).reduce((sum, kg) => sum + kg, 0)
  const steelKg = barsKg + meshKg
  const blocks = blocksKg > 0 ? ` + ${figure(blocksKg, 0)} kg × ${GRAVITY_M_PER_S2} / 1000` : ''
  const weight = `${figure(concreteM3, 2)} m³ × ${REINFORCED_CONCRETE_KN_PER_M3}${blocks}`
  const steel = meshKg > 0 ? `(bars ${figure(barsKg, 0)} + mesh ${figure(meshKg, 0)})` : figure(barsKg, 0)
  const area = `${figure(grossAreaM2, 2)} m²`
  return [
    found('deadLoadArea', perArea, `(${weight}) / ${area} = ${figure(perArea, 2)} kN/m²`, LOAD_SOURCE),
    found('deadLoadTotal', total, `${weight} = ${figure(total, 0)} kN`, LOAD_SOURCE),
    found('steelArea', steelKg / grossAreaM2, `${steel} kg / ${area} = ${figure(steelKg / grossAreaM2, 2)} kg/m²`, STEEL_SOURCE),
    found(
      'steelVolume',
      steelKg / concreteM3,
      `${steel} kg / ${figure(concreteM3, 2)} m³ = ${figure(steelKg / concreteM3, 1)} kg/m³`,
      STEEL_SOURCE,
    ),
  ]
}

const found = (key: AlsoFigure['key'], value: number, working: string, source: string): AlsoFigure => ({
  key,
  value,
  working,
  source,
  lacks: [],
})
