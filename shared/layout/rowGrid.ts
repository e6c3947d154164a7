import type { RibbedScheme } from '../contracts/appraisal'
import { FIT_TOLERANCE_MM } from '../geometry/tolerance'

/** A panel that may take its rows from a grid it has in common with others. Heights across the ribs, one frame for all, mm. */
export interface GridPanel {
  readonly bottom: number
  readonly top: number
  /** How much a row counts: the panel's mean clear length along the ribs, mm. */
  readonly meanLengthMm: number
}

type RowMeasures = Pick<RibbedScheme, 'block' | 'ribWidth' | 'edgeStrip'>

/** Heights at which a panel keeps as many rows as it has room for: the first row's least and greatest, mm. */
interface Arc {
  readonly from: number
  readonly width: number
  readonly weight: number
}

/**
 * Where a grid of rows, one every block and rib, stands so that panels that have it in common keep the most block rows, each row
 * counted at its panel's mean clear length; in the middle of the widest range of places that are as good (the nearest to the first
 * panel's own where several are as wide). A panel alone gets its
 * rows as it has them without a grid: both edge strips equal.
 *
 * Source: project rule, geometry of rows with a rib between neighbours and an edge strip on each side
 * @param panels - at least one with room for a row
 * @returns the start of one row's band, mm; other rows start whole spacings from it
 */
export function rowGrid(panels: readonly GridPanel[], scheme: RowMeasures): number {
  const pitch = scheme.block.width + scheme.ribWidth
  const arcs = panels.flatMap((panel) => arcOf(panel, scheme) ?? [])
  const first = arcs[0]!
  const origin = first.from + first.width / 2
  const places = arcs.map(({ from, width, weight }) => ({ from: modulo(from - origin, pitch), width, weight }))
  const best = widestBest(stretches(places, pitch), pitch)
  return best === null ? origin : origin + modulo(best, pitch)
}

/** Rows of a panel on a grid: starts of their bands, mm, lowest first. */
export function rowsOnGrid(panel: Pick<GridPanel, 'bottom' | 'top'>, gridMm: number, scheme: RowMeasures): number[] {
  const { block, ribWidth, edgeStrip } = scheme
  const pitch = block.width + ribWidth
  const least = panel.bottom + edgeStrip - FIT_TOLERANCE_MM
  const first = Math.ceil((least - gridMm) / pitch)
  const last = Math.floor((panel.top - edgeStrip + FIT_TOLERANCE_MM - block.width - gridMm) / pitch)
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, i) => gridMm + (first + i) * pitch)
}

function arcOf({ bottom, top, meanLengthMm }: GridPanel, { block, ribWidth, edgeStrip }: RowMeasures): Arc | null {
  const pitch = block.width + ribWidth
  const room = top - bottom - 2 * edgeStrip + ribWidth
  const count = Math.floor((room + FIT_TOLERANCE_MM) / pitch)
  if (count < 1) return null
  const forgiven = FIT_TOLERANCE_MM / 2
  return { from: bottom + edgeStrip - forgiven, width: Math.max(0, room - count * pitch) + 2 * forgiven, weight: meanLengthMm }
}

interface Place {
  readonly from: number
  readonly to: number
  readonly weight: number
}

/** One spacing of the grid divided where the rows of a panel begin or cease to have room, with what each stretch is worth. */
function stretches(arcs: readonly Arc[], pitch: number): Place[] {
  const bounds = [0, ...arcs.flatMap(({ from, width }) => [from, modulo(from + width, pitch)])].sort((a, b) => a - b)
  return bounds.flatMap((from, i): Place[] => {
    const to = bounds[i + 1] ?? pitch
    if (to <= from) return []
    const middle = (from + to) / 2
    const isIn = (arc: Arc) => modulo(middle - arc.from, pitch) <= arc.width
    return [{ from, to, weight: arcs.reduce((sum, arc) => sum + (isIn(arc) ? arc.weight : 0), 0) }]
  })
}

/** Middle of the widest range that is worth most (of the one nearest to 0 where several are as wide), across the end of the spacing where it goes on there; null where all is as good. */
function widestBest(places: readonly Place[], pitch: number): number | null {
  const most = places.reduce((best, { weight }) => Math.max(best, weight), 0)
  const isBest = places.map(({ weight }) => weight >= most * (1 - 1e-9))
  const start = isBest.indexOf(false)
  if (start < 0) return null
  const turned = [
    ...places.slice(start),
    ...places.slice(0, start).map((each) => ({ ...each, from: each.from + pitch, to: each.to + pitch })),
  ]
  const ranges: { from: number; to: number }[] = []
  turned.forEach(({ from, to }, i) => {
    if (!isBest[(start + i) % places.length]) return
    const last = ranges.at(-1)
    if (last?.to === from) last.to = to
    else ranges.push({ from, to })
  })
  const widest = Math.max(...ranges.map(({ from, to }) => to - from))
  const middles = ranges.filter(({ from, to }) => to - from >= widest - FIT_TOLERANCE_MM).map(({ from, to }) => (from + to) / 2)
  const away = (middle: number) => Math.min(modulo(middle, pitch), modulo(-middle, pitch))
  return middles.reduce((best, each) => (away(each) < away(best) ? each : best))
}

function modulo(value: number, by: number): number {
  const rest = value % by
  return rest < 0 ? rest + by : rest
}
