import type { MeasurementRules } from '../measurementRules'
import { comparingRules } from './comparingRules'

/** Slabs up to this thickness and above it are different items, mm. */
const SLAB_THICKNESS = { boundsMm: [300] }
/** Up to 3.0 m, up to 4.5 m, then in stages of 1.5 m. */
const PROPPING_HEIGHT = { boundsMm: [3000, 4500], thenEveryMm: 1500 }

/**
 * As a bill after NRM2 has it: small voids stay in the concrete, slabs by thickness, soffits by thickness and propping height, edges
 * by depth, whole units.
 *
 * Source: RICS New Rules of Measurement 2 (2012), general rules and work section 11, from memory
 */
export const nrm2Rules: MeasurementRules = {
  ...comparingRules,
  code: 'nrm2',
  name: 'NRM2 section 11, as billed',
  apart: 'by stages, small voids left in, whole units',
  source: 'RICS New Rules of Measurement 2 (2012), general rules and work section 11, from memory',
  decimals: { 'm³': 0, 'm²': 0, m: 0, t: 2, kg: 0, nr: 0 },
  isOneAtLeast: true,
  deductVoidsOver: { ...comparingRules.deductVoidsOver, concreteM3: 0.05 },
  stages: {
    'concrete.slab': { thickness: SLAB_THICKNESS },
    'formwork.soffit': { thickness: SLAB_THICKNESS, proppingHeight: PROPPING_HEIGHT },
    'formwork.edge': { edgeDepth: { boundsMm: [500] } },
    'propping.area': { proppingHeight: PROPPING_HEIGHT },
  },
  edgesByLengthUpToMm: 500,
  notes: {
    ...comparingRules.notes,
    'concrete.slab': {
      text: 'Net, by thickness up to 300 mm and above; reinforcement not deducted; voids up to 0.05 m³ not deducted, those of blocks always. Strips over walls in, over beams not.',
      source: 'memory',
    },
    'formwork.soffit': {
      text: 'Full deck between supports, by thickness of the slab and height to soffit; voids up to 5 m² not deducted.',
      source: 'memory',
    },
    'formwork.edge': { text: 'Free edges and edges of voids up to 500 mm deep, by length.', source: 'memory' },
    'formwork.edgeDeep': { text: 'Free edges and edges of voids over 500 mm deep, by area.', source: 'memory' },
    'propping.area': {
      text: 'As soffit formwork, by height to soffit; an item of its own, so that it can be priced.',
      source: 'project',
    },
  },
}
