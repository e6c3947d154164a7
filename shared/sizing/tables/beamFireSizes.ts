import type { FirePeriod } from './slabFireSizes'

/** Pairs of width and axis distance, mm, ascending in width: any of them will do, and lines between them. */
type Pairs = readonly (readonly [widthMm: number, axisMm: number])[]

/**
 * Simply supported beams in fire; ribs spanning one way are checked as such.
 *
 * Source: EN 1992-1-2:2004, Table 5.5 (seen in a public encoding)
 */
export const SIMPLE_BEAM_FIRE_SIZES = {
  30: [
    [80, 25],
    [120, 20],
    [160, 15],
    [200, 15],
  ],
  60: [
    [120, 40],
    [160, 35],
    [200, 30],
    [300, 25],
  ],
  90: [
    [150, 55],
    [200, 45],
    [300, 40],
    [400, 35],
  ],
  120: [
    [200, 65],
    [240, 60],
    [300, 55],
    [500, 50],
  ],
  180: [
    [240, 80],
    [300, 70],
    [400, 65],
    [600, 60],
  ],
  240: [
    [280, 90],
    [350, 80],
    [500, 75],
    [700, 70],
  ],
} as const satisfies Record<FirePeriod, Pairs>

/**
 * Continuous beams in fire whose support moments were redistributed by 15 % at most.
 *
 * Source: EN 1992-1-2:2004, Table 5.6 (R60, R90, R120, R240 seen in a public encoding; R30, R180 from memory)
 */
export const CONTINUOUS_BEAM_FIRE_SIZES = {
  30: [
    [80, 15],
    [160, 12],
  ],
  60: [
    [120, 25],
    [200, 12],
  ],
  90: [
    [150, 35],
    [250, 25],
  ],
  120: [
    [200, 45],
    [300, 35],
    [450, 35],
    [500, 30],
  ],
  180: [
    [240, 60],
    [400, 50],
    [550, 50],
    [600, 40],
  ],
  240: [
    [280, 75],
    [500, 60],
    [650, 60],
    [700, 50],
  ],
} as const satisfies Record<FirePeriod, Pairs>

/**
 * What bars in one layer need to the side face over the table's axis distance, mm, in widths up to the second of the row.
 *
 * Source: EN 1992-1-2:2004, notes to Tables 5.5 and 5.6 (from memory)
 */
export const SIDE_AXIS_ADDITION_MM = 10
