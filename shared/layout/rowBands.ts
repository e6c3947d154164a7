import type { RibbedScheme } from '../contracts/appraisal'
import { FIT_TOLERANCE_MM } from '../geometry/tolerance'

/** Bands of block rows across a clear width, mm. */
export interface RowBands {
  readonly count: number
  /** Width of each of the two edge strips: what was asked for and half of what is left over. */
  readonly edgeStripMm: number
  /** Start of each band, from the start of the clear width. */
  readonly starts: readonly number[]
}

/**
 * Block rows that fit a clear width: `n = ⌊(W − 2·edge + rib) / (block width + rib)⌋`; what is left is shared equally by the two
 * edge strips. A fit is forgiven 0.001 mm.
 *
 * Source: project rule, geometry of rows with a rib between neighbours and an edge strip on each side
 * @param clearWidthMm - across the ribs
 */
export function rowBands(clearWidthMm: number, { block, ribWidth, edgeStrip }: RowMeasures): RowBands {
  const pitch = block.width + ribWidth
  const count = Math.max(0, Math.floor((clearWidthMm + FIT_TOLERANCE_MM - 2 * edgeStrip + ribWidth) / pitch))
  if (count === 0) return { count, edgeStripMm: clearWidthMm / 2, starts: [] }
  const edgeStripMm = (clearWidthMm - (count * pitch - ribWidth)) / 2
  return { count, edgeStripMm, starts: Array.from({ length: count }, (_, i) => edgeStripMm + i * pitch) }
}

type RowMeasures = Pick<RibbedScheme, 'block' | 'ribWidth' | 'edgeStrip'>
