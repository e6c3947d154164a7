import type { Check } from '#shared/contracts/appraisalResult'

const NAMES: Record<Check['name'], string> = {
  'flexure.midspan': 'Bending, midspan',
  'flexure.support': 'Bending, at the support',
  shear: 'Shear',
  deflection: 'Span over depth',
  'steel.least': 'Least steel',
  'steel.most': 'Most steel',
  'bars.spacing': 'Spacing of bars',
  'bars.fit': 'Bars fit the rib',
  'ribs.proportions': 'Proportions of ribs',
  topping: 'Topping',
  'fire.size': 'Fire, size',
  'fire.cover': 'Fire, cover to bars',
  'cover.exposure': 'Cover for exposure',
}

/** A check in the words of the trade. */
export function checkInWords(name: Check['name']): string {
  return NAMES[name]
}
