import type { RibbedScheme } from '../contracts/appraisal'
import { FIT_TOLERANCE_MM } from '../geometry/tolerance'

/** A stretch along a row, local frame, mm. */
export interface Stretch {
  readonly start: number
  readonly end: number
}

/** One piece of block along a row. */
export interface Piece extends Stretch {
  readonly isCut: boolean
}

/** A usable length filled with blocks. */
export interface FilledLength {
  /** Blocks without a gap between them, one list for each run. */
  readonly runs: readonly (readonly Piece[])[]
  readonly crossRibs: readonly Stretch[]
  /** Solid remainders beside the runs. */
  readonly fillers: readonly Stretch[]
}

/**
 * A usable length divided equally by its cross ribs and filled: whole blocks `⌊segment / block length⌋`; the remainder is shared
 * by both ends, each half a cut block where cut blocks are allowed and the half is long enough, else solid.
 *
 * Source: project rule, whole blocks first and the remainder at both ends of a run
 */
export function fillLength(
  usable: Stretch,
  crossRibs: { readonly count: number; readonly widthMm: number },
  scheme: Pick<RibbedScheme, 'block' | 'cutBlocks' | 'leastPiece'>,
): FilledLength {
  const { count, widthMm } = crossRibs
  const segmentMm = (usable.end - usable.start - count * widthMm) / (count + 1)
  if (segmentMm <= 0) return { runs: [], crossRibs: [usable], fillers: [] }
  const segments = Array.from({ length: count + 1 }, (_, i) => {
    const start = usable.start + i * (segmentMm + widthMm)
    return { start, end: start + segmentMm }
  })
  const filled = segments.map((segment) => fillSegment(segment, scheme))
  return {
    runs: filled.map(({ pieces }) => pieces).filter((pieces) => pieces.length > 0),
    crossRibs: segments.slice(1).map(({ start }) => ({ start: start - widthMm, end: start })),
    fillers: filled.flatMap(({ fillers }) => fillers),
  }
}

function fillSegment(
  { start, end }: Stretch,
  { block, cutBlocks, leastPiece }: Pick<RibbedScheme, 'block' | 'cutBlocks' | 'leastPiece'>,
): { pieces: Piece[]; fillers: Stretch[] } {
  const whole = Math.floor((end - start + FIT_TOLERANCE_MM) / block.length)
  const half = (end - start - whole * block.length) / 2
  const isCut = cutBlocks && half >= leastPiece - FIT_TOLERANCE_MM
  const first = start + half
  const pieces: Piece[] = Array.from({ length: whole }, (_, i) => ({
    start: first + i * block.length,
    end: first + (i + 1) * block.length,
    isCut: false,
  }))
  const ends: readonly [Stretch, Stretch] = [
    { start, end: first },
    { start: end - half, end },
  ]
  if (isCut) return { pieces: [{ ...ends[0], isCut }, ...pieces, { ...ends[1], isCut }], fillers: [] }
  if (whole === 0) return { pieces, fillers: [{ start, end }] }
  return { pieces, fillers: half > FIT_TOLERANCE_MM ? [...ends] : [] }
}
