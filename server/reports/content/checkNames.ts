import type { Check } from '#shared/contracts/appraisalResult'

/** Kinds of checks in the words of the report. */
export const CHECK_NAMES = {
  'flexure.midspan': 'Bending at midspan',
  'flexure.support': 'Bending over supports',
  shear: 'Shear',
  deflection: 'Deflection',
  'steel.least': 'Least steel',
  'steel.most': 'Most steel',
  'bars.spacing': 'Spacing of bars',
  'bars.fit': 'Bars fit the rib',
  'ribs.proportions': 'Proportions of ribs',
  topping: 'Topping',
  'fire.size': 'Fire, sizes',
  'fire.cover': 'Fire, cover',
  'cover.exposure': 'Cover for exposure',
} as const satisfies Record<Check['name'], string>
