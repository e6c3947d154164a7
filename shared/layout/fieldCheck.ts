import type { RibbedScheme } from '../contracts/appraisal'

/** What one square metre of a ribbed floor takes away from its edges. */
export interface FieldCheck {
  /** Blocks, nr/m². */
  readonly blocksPerM2: number
  /** Concrete, topping in, m³/m². */
  readonly concretePerM2: number
}

/**
 * Blocks and concrete per square metre in the field: no edge strips, solid zones, cross ribs or cut blocks.
 *
 * Source: geometry of one pitch: `1 / ((block width + rib) · block length)` and `topping + rib · block height / (block width + rib)`
 */
export function fieldCheck({ block, ribWidth, topping }: Pick<RibbedScheme, 'block' | 'ribWidth' | 'topping'>): FieldCheck {
  const pitch = block.width + ribWidth
  return {
    blocksPerM2: 1e6 / (pitch * block.length),
    concretePerM2: (topping + (ribWidth * block.height) / pitch) / 1000,
  }
}
