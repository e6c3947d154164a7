import type { MeasurementRules } from '../measurementRules'

/**
 * The project's own rules, for setting schemes against each other: net quantities, full deck, laps of mesh in the rate, no bands.
 * Every void comes off the concrete, however small, so that a thin and a thick floor deduct the same voids (NRM2 leaves voids up to
 * 0.05 m³ in), and quantities keep their decimals, so that small differences are not rounded away.
 *
 * Source: RICS New Rules of Measurement 2 (2012), work section 11, from memory; decimals and voids in concrete: project rule
 */
export const comparingRules: MeasurementRules = {
  code: 'comparing',
  name: 'Net quantities after NRM2 section 11',
  apart: 'for comparing schemes',
  source: 'RICS New Rules of Measurement 2 (2012), work section 11, from memory; decimals and voids in concrete: project rule',
  decimals: { 'm³': 2, 'm²': 2, m: 2, t: 3, kg: 0, nr: 0 },
  isOneAtLeast: false,
  deductVoidsOver: { concreteM3: 0, soffitM2: 5, meshM2: 0, curingM2: 0, floorM2: 0 },
  barUnit: 't',
  meshLaps: null,
  stages: {},
  edgesByLengthUpToMm: null,
  composites: {},
  notes: {
    'concrete.slab': {
      text: 'Net; reinforcement not deducted; voids and blocks deducted. Strips over walls in, over beams not.',
      source: 'project',
    },
    'blocks.whole': { text: 'Whole blocks as laid; breakage is in the rate.', source: 'project' },
    'blocks.cut': { text: 'Cut blocks as laid; breakage is in the rate.', source: 'project' },
    'blocks.closedEnds': { text: 'Two for each run of blocks, closed before concreting.', source: 'project' },
    'steel.bar': {
      text: 'By diameter, nominal mass; laps and hooks in; rolling margin, tying wire and chairs in the rate.',
      source: 'memory',
    },
    'steel.mesh': { text: 'Net area of the floor; laps in the rate.', source: 'memory' },
    'formwork.soffit': { text: 'Full deck between supports; voids up to 5 m² not deducted.', source: 'memory' },
    'formwork.edge': { text: 'Free edges of the level and edges of voids, by length.', source: 'memory' },
    'curing.area': { text: 'Upper surface of the floor.', source: 'project' },
    'propping.area': { text: 'As soffit formwork.', source: 'project' },
  },
}
