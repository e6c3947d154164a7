import type { Ring } from '../contracts/appraisal'
import type { Point } from '../geometry/point'
import { clipped } from '../geometry/polygonClipping'
import { boundsOf } from '../geometry/ring'
import type { PanelField } from './panelField'
import type { SolidRegion } from './panelLayout'
import type { KindWindow } from './solidWindows'

/** Full-depth concrete of a panel for the drawing, one region a kind that occurs, level coordinates, mm. */
export function solidRegions(field: PanelField, windows: readonly KindWindow[]): SolidRegion[] {
  const holes = [...field.voidRings, ...field.grownRings]
  const { minX, maxX } = boundsOf(field.outlineRing)
  const toLevel = (rings: readonly (readonly Point[])[]): Ring[] =>
    rings.map((ring) => ring.map((point): [number, number] => [...field.frame.toLevel(point)]))
  const kinds = ['edgeStrips', 'solidZones', 'crossRibs', 'fillers'] as const
  const regions = kinds.map((kind): SolidRegion => {
    const own = windows.filter((window) => window.kind === kind)
    const rectangles = (isWhole: boolean) =>
      own
        .filter((window) => window.isWhole === isWhole)
        .map(({ left, right, bottom, top }) => rectangle(Math.max(left, minX), Math.min(right, maxX), bottom, top))
    const partly = rectangles(false)
    const cut = partly.length === 0 ? [] : clipped(partly, [field.outlineRing], holes)
    return { kind, rings: toLevel([...rectangles(true), ...cut]) }
  })
  const trimmers: SolidRegion = {
    kind: 'trimmers',
    rings: holes.length === 0 ? [] : toLevel(clipped(field.grownRings, [field.outlineRing], field.voidRings)),
  }
  return [...regions, trimmers].filter(({ rings }) => rings.length > 0)
}

function rectangle(left: number, right: number, bottom: number, top: number): Point[] {
  return [
    [left, bottom],
    [right, bottom],
    [right, top],
    [left, top],
  ]
}
