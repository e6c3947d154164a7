import { round } from './sectionFrame'
import { type SvgNode, svgNode } from './svgNode'

/** A stock bar cut into pieces, as it is drawn. */
export interface CutStock {
  readonly stockMm: number
  readonly pieces: readonly { readonly lengthMm: number; readonly count: number }[]
  readonly offcutMm: number
}

const HEIGHT = 24
/** Width that a figure of the drawing takes for each digit, px. */
const DIGIT = 7

/** A stock bar to scale: its pieces with their lengths where there is room, and what is left of it hatched. */
export function cuttingBarDrawing(
  { stockMm, pieces, offcutMm }: CutStock,
  { id, widthPx }: { id: string; widthPx: number },
): SvgNode {
  const scale = (widthPx - 2) / stockMm
  let at = 1
  const box = (lengthMm: number, fill: string): SvgNode[] => {
    const [x, width] = [at, lengthMm * scale]
    at += width
    const text = String(lengthMm)
    const label = { x: round(x + width / 2), y: HEIGHT / 2 + 4.5, 'font-size': 12, 'text-anchor': 'middle', fill: 'var(--ink)' }
    const frame = { x: round(x), y: 1, width: round(width), height: HEIGHT - 2, fill, stroke: 'var(--ink)', 'stroke-width': 1 }
    return [svgNode('rect', frame), ...(width > DIGIT * text.length + 6 ? [svgNode('text', label, [text])] : [])]
  }
  const parts = pieces.flatMap(({ lengthMm, count }) => Array.from({ length: count }, () => box(lengthMm, 'var(--paper)')).flat())
  const rest = offcutMm > 0 ? restOf(at, widthPx - 1 - at, id) : []
  return svgNode('svg', { viewBox: `0 0 ${widthPx} ${HEIGHT}`, width: widthPx, height: HEIGHT }, [
    svgNode('defs', {}, [
      svgNode(
        'pattern',
        { id: `${id}-offcut`, width: 6, height: 6, patternUnits: 'userSpaceOnUse', patternTransform: 'rotate(45)' },
        [
          svgNode('rect', { width: 6, height: 6, fill: 'var(--recess)' }),
          svgNode('rect', { width: 1, height: 6, fill: 'var(--rule)' }),
        ],
      ),
    ]),
    ...parts,
    ...rest,
  ])
}

/** The offcut, dashed: it is not of the floor. */
function restOf(x: number, width: number, id: string): SvgNode[] {
  const frame = { x: round(x), y: 1, width: round(Math.max(0, width)), height: HEIGHT - 2 }
  return [svgNode('rect', { ...frame, fill: `url(#${id}-offcut)`, stroke: 'var(--rule)', 'stroke-dasharray': '4 3' })]
}
