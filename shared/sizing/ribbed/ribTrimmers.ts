import type { Point } from '../../geometry/point'
import { boundsOf } from '../../geometry/ring'
import { DRAWN_TOLERANCE_MM } from '../../geometry/tolerance'
import { type PanelField, panelField } from '../../layout/panelField'
import type { BarLines, BarPiece } from '../bars/barLines'
import type { BarSet } from '../bars/barSet'
import { eitherSide } from '../bars/eitherSide'
import { bottomPiece, type RibBarRules } from './ribBarLines'
import type { RibLineEnds } from './ribEnds'
import type { RibbedPanel } from './ribbedPanel'

/** A line of rib bars in the panel's own frame, mm: its level and where it starts and ends. */
interface PlacedRib {
  readonly rib: RibLineEnds
  readonly y: number
  readonly from: number
  readonly to: number
}

/** Ribs around one void: those it cuts, and the nearest whole one below and above. */
interface Around {
  readonly cut: number
  readonly beside: readonly [PlacedRib | null, PlacedRib | null]
  /** Strips across the ribs on which cut ribs end: none, one or two. */
  readonly headers: number
}

/**
 * Bars around the voids of a ribbed panel: those of the ribs that a void cuts again in the ribs beside it, half on each side and over
 * their whole length, since these ribs carry what the cut ones did; and those of one rib in each solid strip across, on which cut ribs
 * end, anchored past the ribs beside.
 *
 * Source: common practice of trimming openings, no source; anchorage by the basis
 */
export function ribTrimmerLines(panel: RibbedPanel, bottom: BarSet, rules: RibBarRules): BarLines[] {
  const { site, layout, ribs } = panel
  if (site.panel.voids.length === 0) return []
  const field = panelField(site.panel, site.clear, rules.trimmerMm)
  const placed = layout.ribLines.map(({ start, end }, i): PlacedRib => {
    const [[from, y], [to]] = [field.frame.toLocal(start), field.frame.toLocal(end)]
    return { rib: ribs[i]!, y, from, to }
  })
  return field.grownRings.flatMap((ring, i) => {
    const around = ribsAround(placed, ring)
    if (around.cut === 0) return []
    const name = `void ${i + 1}`
    return [...besideLines(panel, bottom, rules, around, name), ...acrossLines(field, bottom, rules, around, name)]
  })
}

function ribsAround(placed: readonly PlacedRib[], ring: readonly Point[]): Around {
  const { minX, maxX, minY, maxY } = boundsOf(ring)
  const levels = new Set<number>()
  const headers = new Set<'start' | 'end'>()
  for (const { y, from, to, rib } of placed) {
    if (y <= minY || y >= maxY) continue
    if (rib.end.edge === null && to <= maxX && to >= minX - DRAWN_TOLERANCE_MM) headers.add('start')
    else if (rib.start.edge === null && from >= minX && from <= maxX + DRAWN_TOLERANCE_MM) headers.add('end')
    else continue
    levels.add(Math.round(y))
  }
  const whole = placed.filter(({ rib, from, to }) => rib.start.edge !== null && rib.end.edge !== null && from < maxX && to > minX)
  const nearest = (ribs: readonly PlacedRib[]) =>
    ribs.reduce<PlacedRib | null>(
      (best, each) => (!best || offOf(each, minY, maxY) < offOf(best, minY, maxY) ? each : best),
      null,
    )
  const beside: Around['beside'] = [nearest(whole.filter(({ y }) => y <= minY)), nearest(whole.filter(({ y }) => y >= maxY))]
  return { cut: levels.size, beside, headers: headers.size }
}

const offOf = ({ y }: PlacedRib, minY: number, maxY: number) => Math.max(minY - y, y - maxY)

function besideLines(panel: RibbedPanel, bottom: BarSet, rules: RibBarRules, { cut, beside }: Around, name: string): BarLines[] {
  const numbers = eitherSide(cut, [beside[0] !== null, beside[1] !== null])
  return bottom.flatMap(({ diameter, count }) => {
    const pieces = beside.flatMap((each, i) =>
      each ? new Array<BarPiece>(numbers[i]! * count).fill(bottomPiece(panel, each.rib, diameter, rules)) : [],
    )
    const lines = `bars in the ribs beside, for ${count} in each of ${cut} cut`
    return pieces.length === 0 ? [] : [made({ position: `trimmers, along ribs, ${name}`, diameter, lines, pieces }, rules)]
  })
}

function acrossLines(
  { bottom: lowest, top: highest }: PanelField,
  bottom: BarSet,
  rules: RibBarRules,
  { beside: [below, above], headers }: Around,
  name: string,
): BarLines[] {
  const { basis, coverMm, heightMm } = rules
  return bottom.map(({ diameter, count }) => {
    const anchorageMm = basis.anchorageMm(diameter, { isTop: false, sectionMm: heightMm, isCorner: true }, 1).value
    const from = Math.max(lowest + coverMm, (below?.y ?? lowest) - anchorageMm)
    const to = Math.min(highest - coverMm, (above?.y ?? highest) + anchorageMm)
    const pieces = new Array<BarPiece>(headers * count).fill({ parts: [to - from], legs: [0, 0] })
    return made({ position: `trimmers, across ribs, ${name}`, diameter, lines: 'bars in the strips across', pieces }, rules)
  })
}

function made(
  bars: Pick<BarLines, 'position' | 'diameter' | 'lines' | 'pieces'>,
  { basis, heightMm, stockMm }: RibBarRules,
): BarLines {
  const lapMm = () => basis.lapMm(bars.diameter, { isTop: false, sectionMm: heightMm, isCorner: true }).value
  return { ...bars, each: 1, spacingMm: null, stockMm, lapMm, clause: 'common practice' }
}
