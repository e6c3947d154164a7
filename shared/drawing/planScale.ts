import type { Bounds } from '../geometry/ring'
import type { Point } from '../geometry/point'

/** How level coordinates (mm, y up) lie on a drawing (px, y down). */
export interface PlanScale {
  readonly pxPerMm: number
  /** Where the floor's corner of least x and y stands, px. */
  readonly originPx: Point
  readonly originMm: Point
}

/** Space around the drawn floor for dimensions and bubbles, px. */
export interface PlanMargins {
  readonly left: number
  readonly right: number
  readonly top: number
  readonly bottom: number
}

/** What a floor is drawn to: a width and a greatest height it is fitted into, or a scale that is stated. */
export type PlanFit = { readonly widthPx: number; readonly mostHeightPx: number } | { readonly pxPerMm: number }

/** A floor placed on its drawing: the scale, and the size that the drawing comes to, px. */
export function placePlan(
  box: Bounds,
  margins: PlanMargins,
  fit: PlanFit,
): { readonly scale: PlanScale; readonly widthPx: number; readonly heightPx: number } {
  const lengthX = Math.max(box.maxX - box.minX, 1)
  const lengthY = Math.max(box.maxY - box.minY, 1)
  const pxPerMm = 'pxPerMm' in fit ? fit.pxPerMm : fittedPxPerMm([lengthX, lengthY], margins, fit)
  const widthPx = 'pxPerMm' in fit ? Math.ceil(margins.left + lengthX * pxPerMm + margins.right) : fit.widthPx
  const floorHeightPx = lengthY * pxPerMm
  const scale = {
    pxPerMm,
    originPx: [margins.left, margins.top + floorHeightPx] as const,
    originMm: [box.minX, box.minY] as const,
  }
  return { scale, widthPx, heightPx: Math.ceil(margins.top + floorHeightPx + margins.bottom) }
}

function fittedPxPerMm(
  [lengthX, lengthY]: readonly [number, number],
  margins: PlanMargins,
  { widthPx, mostHeightPx }: { readonly widthPx: number; readonly mostHeightPx: number },
): number {
  const roomX = Math.max(widthPx - margins.left - margins.right, 40)
  const roomY = Math.max(mostHeightPx - margins.top - margins.bottom, 40)
  return Math.min(roomX / lengthX, roomY / lengthY)
}

/** Place of a level point on the drawing, px, to a hundredth. */
export function toPx({ pxPerMm, originPx, originMm }: PlanScale, [x, y]: Point): Point {
  return [hundredth(originPx[0] + (x - originMm[0]) * pxPerMm), hundredth(originPx[1] - (y - originMm[1]) * pxPerMm)]
}

/** Level point under a place of the drawing, mm. */
export function toMm({ pxPerMm, originPx, originMm }: PlanScale, [x, y]: Point): Point {
  return [originMm[0] + (x - originPx[0]) / pxPerMm, originMm[1] + (originPx[1] - y) / pxPerMm]
}

/** The `points` of a polygon, px. */
export function pointsText(scale: PlanScale, ring: readonly Point[]): string {
  return ring.map((point) => toPx(scale, point).join(',')).join(' ')
}

/** The `d` of closed rings, px; with `fill-rule` evenodd inner rings are holes. */
export function ringsText(scale: PlanScale, rings: readonly (readonly Point[])[]): string {
  return rings.map((ring) => `M${ring.map((point) => toPx(scale, point).join(' ')).join('L')}Z`).join('')
}

function hundredth(value: number): number {
  return Math.round(value * 100) / 100
}
