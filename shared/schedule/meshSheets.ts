import type { Brief, Level, Mesh } from '../contracts/appraisal'
import { frameAt } from '../geometry/frame'
import type { Point } from '../geometry/point'
import { boundsOf, edgeOfRing } from '../geometry/ring'
import { FIT_TOLERANCE_MM } from '../geometry/tolerance'
import { type MeshLap, meshLap } from '../sizing/bars/meshLap'
import type { SizedScheme } from '../sizing/sizedPanel'
import { FABRIC } from '../sizing/tables/fabric'
import { toM2 } from '../units'
import { buildsOf } from './buildsOf'

/** Sheet of mesh as it is sold, mm. Source: BS 4483:2005 (seen: sheets of 4.8 × 2.4 m) */
export const SHEET_MM = { length: 4800, width: 2400 } as const

/** Sheets over the topping of one panel, repeats not counted; `laidM2` is what of them is laid, laps in. */
export interface PanelSheets {
  readonly level: string
  readonly panel: string
  readonly members: number
  readonly whole: number
  readonly cut: number
  readonly laidM2: number
  /** Whether the long side of a sheet lies along the ribs. */
  readonly isAlongRibs: boolean
}

/** Sheets of a ribbed scheme over all levels, repeats in the sums. */
export interface MeshSheets extends MeshLap {
  readonly mesh: Exclude<Mesh, 'none'>
  readonly panels: readonly PanelSheets[]
  readonly whole: number
  readonly cut: number
  readonly laidM2: number
  /** Of what is laid, laps in, and of the sheets ordered for it. */
  readonly laidKg: number
  readonly orderedKg: number
}

type Laid = Pick<PanelSheets, 'whole' | 'cut' | 'laidM2'>

/**
 * Sheets of mesh over each panel's topping: rows of sheets from face to face of the supports, each row over the greatest extent of the
 * clear outline in it, lapped both ways; laid along or across the ribs, whichever takes fewer sheets. Voids are cut out of sheets laid
 * through; what is cut off a sheet is not used again.
 *
 * Source: project rule, common practice, no source; laps by the basis, see `meshLap`
 * @param sized - ribbed, sized over the same levels
 * @throws RangeError when `sized` belongs to other levels or is solid
 */
export function meshSheets(
  sized: SizedScheme,
  mesh: Exclude<Mesh, 'none'>,
  levels: readonly Level[],
  basis: Brief['basis'],
): MeshSheets {
  const lap = meshLap(mesh, basis)
  const panels = sized.panels.map(({ level, mark, layout }): PanelSheets => {
    if (layout === null) throw new RangeError(`expected a ribbed panel, got ${level} ${mark} solid`)
    const { panel, members } = buildsOf(levels, level, mark)
    const laid = (degrees: number) => sheetsOver(layout.clear.map(frameAt([0, 0], degrees).toLocal), lap.lapMm)
    const [along, across] = [laid(panel.ribDirection), laid((panel.ribDirection + 90) % 180)]
    const isAlongRibs = along.whole + along.cut <= across.whole + across.cut
    return { level, panel: mark, members, ...(isAlongRibs ? along : across), isAlongRibs }
  })
  const sum = (valueOf: (panel: PanelSheets) => number) => panels.reduce((total, each) => total + each.members * valueOf(each), 0)
  const [whole, cut, laidM2] = [sum((each) => each.whole), sum((each) => each.cut), sum((each) => each.laidM2)]
  const { massKgPerM2 } = FABRIC[mesh]
  const orderedKg = (whole + cut) * toM2(SHEET_MM.length * SHEET_MM.width) * massKgPerM2
  return { ...lap, mesh, panels, whole, cut, laidM2, laidKg: laidM2 * massKgPerM2, orderedKg }
}

/** Sheets over a ring in the local frame, long side along x. */
function sheetsOver(ring: readonly Point[], lapMm: number): Laid {
  const { minY, maxY } = boundsOf(ring)
  const sum = { whole: 0, cut: 0, laidM2: 0 }
  const depths = lengthsIn(maxY - minY, SHEET_MM.width, lapMm)
  depths.forEach((depth, row) => {
    const bottom = minY + row * (SHEET_MM.width - lapMm)
    for (const length of lengthsIn(extentBetween(ring, bottom, bottom + depth), SHEET_MM.length, lapMm)) {
      const isWhole = depth >= SHEET_MM.width - FIT_TOLERANCE_MM && length >= SHEET_MM.length - FIT_TOLERANCE_MM
      sum[isWhole ? 'whole' : 'cut'] += 1
      sum.laidM2 += toM2(depth * length)
    }
  })
  return sum
}

/** Pieces that cover a length: whole ones and what is left for the last. */
function lengthsIn(totalMm: number, pieceMm: number, lapMm: number): number[] {
  const count = Math.max(1, Math.ceil((totalMm - lapMm - FIT_TOLERANCE_MM) / (pieceMm - lapMm)))
  return Array.from({ length: count }, (_, i) => (i < count - 1 ? pieceMm : totalMm - i * (pieceMm - lapMm)))
}

/** Greatest extent in x of a ring between two levels, mm. */
function extentBetween(ring: readonly Point[], bottom: number, top: number): number {
  const xs = ring.flatMap((_, i) => {
    const [[ax, ay], [bx, by]] = edgeOfRing(ring, i)
    if (Math.max(ay, by) < bottom || Math.min(ay, by) > top) return []
    const at = (y: number) => (ay === by ? ax : ax + ((bx - ax) * (y - ay)) / (by - ay))
    const within = [ay, by].map((y) => Math.min(top, Math.max(bottom, y)))
    return ay === by ? [ax, bx] : within.map(at)
  })
  return Math.max(...xs) - Math.min(...xs)
}
