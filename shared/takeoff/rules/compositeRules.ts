import type { MeasurementRules } from '../measurementRules'
import { comparingRules } from './comparingRules'

/**
 * Floors by the square metre, by their overall depth: the ribbed one with its blocks, closed ends, concrete and mesh, the solid one
 * with its concrete, so that the two stand side by side. Bars, formwork, curing and propping stay items of their own.
 *
 * Source: common practice, no source (the composite item as the simple alternative for hollow-block floors); what is in it: project rule
 */
export const compositeRules: MeasurementRules = {
  ...comparingRules,
  code: 'composite',
  name: 'Floors by the square metre',
  apart: 'one item for the floor, analysed',
  source:
    'common practice, no source, for floors by the square metre; what is in the item: project rule; other items as for comparing',
  composites: {
    ribbed: { item: 'floor.ribbed', of: ['concrete.slab', 'blocks', 'steel.mesh'] },
    solid: { item: 'floor.solid', of: ['concrete.slab'] },
  },
  notes: {
    ...comparingRules.notes,
    'floor.ribbed': {
      text: 'Floor between supports and over walls less voids, by overall depth; in it the concrete, the blocks, their closed ends and the mesh, as analysed.',
      source: 'practice',
    },
    'floor.solid': {
      text: 'Floor between supports and over walls less voids, by thickness; in it the concrete, as analysed.',
      source: 'project',
    },
  },
}
