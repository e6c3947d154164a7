import type { MeasurementRules } from '../measurementRules'
import { comparingRules } from './comparingRules'

/**
 * As bills after the Standard Method of Measurement of June 2008 have the steel: bars in kilograms, mesh with its laps. All else as
 * for comparing.
 *
 * Source: bills after the Standard Method of Measurement (June 2008), seen: bars in kg, mesh often with its laps; sheet BS 4483:2005;
 * small voids in mesh SMM7 E30, from memory
 */
export const kilogramRules: MeasurementRules = {
  ...comparingRules,
  code: 'kilograms',
  name: 'Standard Method of Measurement, June 2008',
  apart: 'bars in kg, mesh with laps',
  source:
    'bills after the Standard Method of Measurement (June 2008), seen: bars in kg, mesh often with its laps; small voids in mesh after SMM7 E30, from memory; all else as for comparing',
  deductVoidsOver: { ...comparingRules.deductVoidsOver, meshM2: 1 },
  barUnit: 'kg',
  meshLaps: { lap: 'basis', sheetLengthMm: 4800, sheetWidthMm: 2400 },
  notes: {
    ...comparingRules.notes,
    'steel.bar': {
      text: 'In kilograms by diameter, nominal mass; laps and hooks in; rolling margin, tying wire and chairs in the rate.',
      source: 'seen',
    },
    'steel.mesh': {
      text: 'Area of the floor with the laps of sheets of 4.8 by 2.4 m in the quantity, laps by the code of the brief; voids up to 1 m² not deducted.',
      source: 'seen',
    },
  },
}
