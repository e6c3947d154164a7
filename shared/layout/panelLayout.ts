import type { Ring } from '../contracts/appraisal'
import type { Point } from '../geometry/point'

/** Where a usable length of a row ends: it decides whether a solid zone stands there. */
export type RunEnd = 'support' | 'trimmer' | 'free'

/**
 * A line of blocks without a gap, closed at both ends. `start` and `end` along the rib direction, mm, in the panel's local frame;
 * `blocks` counts whole and cut ones.
 */
export interface BlockRun {
  readonly start: number
  readonly end: number
  readonly blocks: number
}

/** One block as it lies: four corners, anticlockwise, in level coordinates, mm. */
export interface PlacedBlock {
  readonly ring: Ring
  /** Along the rib, mm; less than the catalogue length where `isCut`. */
  readonly length: number
  readonly isCut: boolean
  /** Row number from 0, in order across the rib direction. */
  readonly row: number
}

/** A row of blocks: its band across the ribs and its usable lengths, each already less solid zones. Local frame, mm. */
export interface BlockRow {
  readonly bandStart: number
  readonly bandEnd: number
  readonly lengths: readonly {
    readonly start: number
    readonly end: number
    readonly startsAt: RunEnd
    readonly endsAt: RunEnd
  }[]
  readonly runs: readonly BlockRun[]
}

/** A line of rib bars (n rows have n + 1): centre-line within the clear outline, level coordinates, mm. */
export interface RibLine {
  readonly start: Point
  readonly end: Point
  readonly length: number
}

/** Plan areas, mm², one panel without repeats. gross = strips + clear; clear = the rest added up, voids included. */
export interface PanelAreas {
  readonly gross: number
  readonly strips: number
  /** What stands over walls and so belongs to the floor; the outer half of unshared walls, outside `gross` and `strips`, included. */
  readonly wallStrips: number
  readonly clear: number
  readonly blocks: number
  readonly ribs: number
  readonly edgeStrips: number
  readonly solidZones: number
  readonly crossRibs: number
  readonly trimmers: number
  readonly fillers: number
  readonly voids: number
}

/** A full-depth concrete region for the drawing; rings in level coordinates, holes clockwise. */
export interface SolidRegion {
  readonly kind: 'edgeStrips' | 'solidZones' | 'crossRibs' | 'trimmers' | 'fillers'
  readonly rings: readonly Ring[]
}

/** A ribbed panel laid out for real: what is drawn is what is counted. */
export interface PanelLayout {
  readonly clear: Ring
  readonly rows: readonly BlockRow[]
  readonly blocks: readonly PlacedBlock[]
  readonly ribLines: readonly RibLine[]
  readonly regions: readonly SolidRegion[]
  readonly areas: PanelAreas
  /** Clear area less voids, mm². */
  readonly netArea: number
  readonly blocksWhole: number
  readonly blocksCut: number
  readonly closedEnds: number
  /** Total length of cut pieces, mm: with whole blocks it gives the gross block volume. */
  readonly cutLength: number
  /** Longest clear rib, support face to support face, mm. */
  readonly longestRib: number
  /** Solid zone laid, mm. */
  readonly solidZone: number
}
