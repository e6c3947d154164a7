import type { RibbedScheme } from '../contracts/appraisal'
import { FIT_TOLERANCE_MM } from '../geometry/tolerance'

/** A stretch along a row, local frame, mm. */
export interface Stretch {
  readonly start: number
  readonly end: number
}

/** A line of blocks without a gap: whole ones, and at both ends a cut one of `cutMm` each (0: none). */
export interface FilledRun extends Stretch {
  readonly whole: number
  readonly cutMm: number
}

/** A usable length filled with blocks. */
export interface FilledLength {
  readonly runs: readonly FilledRun[]
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
    runs: filled.flatMap(({ run }) => run ?? []),
    crossRibs: segments.slice(1).map(({ start }) => ({ start: start - widthMm, end: start })),
    fillers: filled.flatMap(({ fillers }) => fillers),
  }
}

function fillSegment(
  { start, end }: Stretch,
  { block, cutBlocks, leastPiece }: Pick<RibbedScheme, 'block' | 'cutBlocks' | 'leastPiece'>,
): { readonly run: FilledRun | null; readonly fillers: readonly Stretch[] } {
  const whole = Math.floor((end - start + FIT_TOLERANCE_MM) / block.length)
  const half = (end - start - whole * block.length) / 2
  if (cutBlocks && half >= leastPiece - FIT_TOLERANCE_MM) return { run: { start, end, whole, cutMm: half }, fillers: [] }
  if (whole === 0) return { run: null, fillers: [{ start, end }] }
  const run = { start: start + half, end: end - half, whole, cutMm: 0 }
  const fillers = [
    { start, end: run.start },
    { start: run.end, end },
  ]
  return { run, fillers: half > FIT_TOLERANCE_MM ? fillers : [] }
}
