import type { Frame } from '../geometry/frame'
import type { FilledRun, Stretch } from './fillLength'
import type { LaidRow } from './laidRow'
import type { PlacedBlock } from './panelLayout'

/** Every block of a panel as it lies, row by row, in level coordinates. */
export function placedBlocks(frame: Frame, rows: readonly LaidRow[], blockLengthMm: number): PlacedBlock[] {
  return rows.flatMap(({ bandStart, bandEnd, filled }, row) => {
    const corner = (x: number, y: number): [number, number] => [...frame.toLevel([x, y])]
    const placed = ({ start, end }: Stretch, isCut: boolean): PlacedBlock => ({
      ring: [corner(start, bandStart), corner(end, bandStart), corner(end, bandEnd), corner(start, bandEnd)],
      length: isCut ? end - start : blockLengthMm,
      isCut,
      row,
    })
    return filled
      .flatMap(({ runs }) => runs)
      .flatMap((run) => pieces(run, blockLengthMm).map(([piece, isCut]) => placed(piece, isCut)))
  })
}

/** Blocks of a run from its start to its end, and whether each is cut. */
function pieces({ start, end, whole, cutMm }: FilledRun, blockLengthMm: number): (readonly [Stretch, boolean])[] {
  const first = start + cutMm
  const wholes = Array.from({ length: whole }, (_, i): readonly [Stretch, boolean] => [
    { start: first + i * blockLengthMm, end: first + (i + 1) * blockLengthMm },
    false,
  ])
  if (cutMm === 0) return wholes
  return [[{ start, end: first }, true], ...wholes, [{ start: end - cutMm, end }, true]]
}
