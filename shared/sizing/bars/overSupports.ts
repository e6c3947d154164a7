import { distance, edgeOfRing } from '../../geometry/ring'
import type { LevelSite } from '../panelSite'
import { BAR_MASS_KG_PER_M } from '../tables/bars'
import type { BarLines, BarPiece } from './barLines'
import { planMm } from './cutBars'

/** Bars of a whole level, beside its panels. */
type LevelBars = readonly (readonly BarLines[])[]

/** What of a panel's top bars runs over one of its edges. */
interface Strand {
  readonly panel: number
  readonly edge: number
  readonly lines: readonly BarLines[]
}

/** Strands whose masses are this close, relative, are equal. */
const SAME = 1e-9

const STRAIGHT = [0, 0] as const

/**
 * The bars of a level with those over supports made whole: the half of a panel and the half of the floor behind it are one bar. Of two
 * panels that meet the heavier set of bars runs over the support, and each panel counts every second bar. Where no panel of the level
 * meets it, the floor behind is taken as its mirror image and half the bars are counted.
 *
 * Source: project rule, engine design section 4 (each panel counts its half of a shared top bar)
 */
export function overSupports(level: LevelSite, all: LevelBars): BarLines[][] {
  return all.map((own, panel) => {
    const edges = [...new Set(own.flatMap(({ pieces }) => pieces.flatMap(({ over }) => over ?? [])))].sort((a, b) => a - b)
    const within = own.filter(({ pieces }) => pieces.every(({ over }) => over === undefined))
    return [...within, ...edges.flatMap((edge) => wholeBars(level, all, { panel, edge, lines: linesOver(own, edge) }))]
  })
}

function linesOver(bars: readonly BarLines[], edge: number): BarLines[] {
  return bars
    .map((lines) => ({ ...lines, pieces: lines.pieces.filter(({ over }) => over === edge) }))
    .filter(({ pieces }) => pieces.length > 0)
}

/** The strand of the panel that has the longest part of an edge in common, of those whose bars run over it. */
function strandBehind({ neighbours }: LevelSite, all: LevelBars, { panel, edge }: Strand): Strand | null {
  return (
    neighbours
      .filter((each) => each.panel === panel && each.edge === edge)
      .sort((a, b) => b.overlap - a.overlap)
      .map(({ neighbour, neighbourEdge }): Strand => ({
        panel: neighbour,
        edge: neighbourEdge,
        lines: linesOver(all[neighbour]!, neighbourEdge),
      }))
      .find(({ lines }) => lines.length > 0) ?? null
  )
}

function edgeLengthMm({ panels }: LevelSite, { panel, edge }: Strand): number {
  return distance(...edgeOfRing(panels[panel]!.panel.outline, edge))
}

/** Mass of a strand per metre of its bars and of its edge. */
function weightOf(level: LevelSite, strand: Strand): number {
  const mass = strand.lines.reduce(
    (sum, { each, diameter, pieces }) => sum + each * pieces.length * BAR_MASS_KG_PER_M[diameter],
    0,
  )
  return mass / edgeLengthMm(level, strand)
}

function wholeBars(level: LevelSite, all: LevelBars, own: Strand): BarLines[] {
  const behind = strandBehind(level, all, own)
  if (!behind)
    return own.lines.flatMap((lines) =>
      halfOf(
        lines,
        lines.pieces.map((piece) => joined(piece, piece)),
        0,
      ),
    )
  const isLighter = weightOf(level, own) < weightOf(level, behind) * (1 - SAME)
  const scale = edgeLengthMm(level, own) / edgeLengthMm(level, behind)
  const [ownPieces, piecesBehind] = [own, behind].map(({ lines }) => lines.flatMap(({ pieces }) => pieces))
  const first = own.panel < behind.panel ? 0 : 1
  return (isLighter ? behind : own).lines.flatMap((lines) => {
    const count = isLighter ? Math.max(1, Math.round(lines.pieces.length * scale)) : lines.pieces.length
    const pieces = Array.from({ length: count }, (_, i) => {
      const share = (i + 0.5) / count
      return joined(isLighter ? at(ownPieces!, share) : lines.pieces[i]!, at(isLighter ? lines.pieces : piecesBehind!, share))
    })
    return halfOf({ ...lines, position: own.lines[0]!.position }, pieces, first)
  })
}

const at = (pieces: readonly BarPiece[], share: number) => pieces[Math.min(pieces.length - 1, Math.floor(share * pieces.length))]!

/** One bar from the half on this side and the half on the other. */
function joined({ parts: [half, reach] }: BarPiece, { parts: [halfBehind, reachBehind] }: BarPiece): BarPiece {
  return { parts: [reach!, half! + halfBehind!, reachBehind!], legs: STRAIGHT }
}

/** Every second bar, in order of length, from the first or the second on. */
function halfOf(lines: BarLines, pieces: readonly BarPiece[], first: 0 | 1): BarLines[] {
  const ordered = [...pieces].sort((a, b) => planMm(b) - planMm(a))
  const half = ordered.filter((_, i) => i % 2 === first)
  return half.length === 0 ? [] : [{ ...lines, lines: `of ${pieces.length} ${lines.lines}`, pieces: half }]
}
