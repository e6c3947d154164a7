/** Standard fire periods of the tables, minutes. */
export type FirePeriod = 30 | 60 | 90 | 120 | 180 | 240

/** Least thickness of a slab, and least axis distance of its bars by how it carries, mm. */
interface SlabFireRow {
  readonly thicknessMm: number
  readonly oneWay: number
  /** Two-way, ly/lx ≤ 1.5. */
  readonly twoWay: number
  /** Two-way, 1.5 < ly/lx ≤ 2. */
  readonly twoWayLong: number
}

/**
 * Solid slabs and flanges of ribbed slabs in fire.
 *
 * Source: EN 1992-1-2:2004, Table 5.8 (one-way column seen in several encodings, two-way columns from memory)
 */
export const SLAB_FIRE_SIZES = {
  30: { thicknessMm: 60, oneWay: 10, twoWay: 10, twoWayLong: 10 },
  60: { thicknessMm: 80, oneWay: 20, twoWay: 10, twoWayLong: 15 },
  90: { thicknessMm: 100, oneWay: 30, twoWay: 15, twoWayLong: 20 },
  120: { thicknessMm: 120, oneWay: 40, twoWay: 20, twoWayLong: 25 },
  180: { thicknessMm: 150, oneWay: 55, twoWay: 30, twoWayLong: 40 },
  240: { thicknessMm: 175, oneWay: 65, twoWay: 40, twoWayLong: 50 },
} as const satisfies Record<FirePeriod, SlabFireRow>
