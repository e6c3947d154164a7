import type { CodeBasis } from '../../codeBasis'
import { figure } from '../../figure'
import type { Finding } from '../../finding'
import type { RibAnalysis } from '../ribAnalysis'
import type { RibSection } from '../ribSection'

/**
 * What the checks find for the shape of the ribs: spacing and slenderness, topping, and sizes in fire.
 *
 * Source: by the basis, `ribProportions`, `leastToppingMm`, `slabFire`, `ribFire`
 */
export function shapeFindings(basis: CodeBasis, section: RibSection, analysis: RibAnalysis, fireMinutes: number): Finding[] {
  const topping = basis.leastToppingMm(section)
  return [
    ...basis.ribProportions(section).map((each): Finding => ({ name: 'ribs.proportions', place: () => 'ribs', ...each })),
    {
      name: 'topping',
      place: () => 'topping',
      clause: topping.clause,
      demand: topping.value,
      capacity: section.toppingMm,
      unit: 'mm',
      working: () => `${topping.working()}; topping ${figure(section.toppingMm)} mm`,
    },
    ...fireSizeFindings(basis, section, analysis, fireMinutes),
  ]
}

/**
 * Sizes of the topping and the rib in fire.
 *
 * Source: by the basis, `slabFire`, `ribFire`
 * @param minutes - 0: no fire period, nothing is found
 */
export function fireSizeFindings(
  basis: CodeBasis,
  { toppingMm, ribMm }: RibSection,
  analysis: RibAnalysis,
  minutes: number,
): Finding[] {
  if (minutes === 0) return []
  const flange = basis.slabFire(minutes, 'twoWayLong', true).size
  const rib = basis.ribFire(minutes, ribMm, analysis.position !== 'simple', analysis.forces.redistributedShare).size
  return [
    {
      name: 'fire.size',
      place: () => 'topping',
      clause: flange.clause,
      demand: flange.value,
      capacity: toppingMm,
      unit: 'mm',
      working: () => `flange, ${flange.working()}; topping ${figure(toppingMm)} mm`,
    },
    {
      name: 'fire.size',
      place: () => 'rib',
      clause: rib.clause,
      demand: rib.value,
      capacity: ribMm,
      unit: 'mm',
      working: () => `rib, ${rib.working()}; rib ${figure(ribMm)} mm`,
    },
  ]
}
