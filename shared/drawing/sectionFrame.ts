/** Where a section stands on the drawing: x to the right, y down, px; the soffit is its base line. */
export interface SectionFrame {
  /** Unique in the page: prefix of the hatches. */
  readonly id: string
  readonly leftPx: number
  readonly widthPx: number
  readonly soffitPx: number
  readonly pxPerMm: number
}

/** y of a height above the soffit, px. */
export function heightPx(frame: SectionFrame, heightMm: number): number {
  return round(frame.soffitPx - heightMm * frame.pxPerMm)
}

/** Rounded to a hundredth of a pixel, so that a drawing is small and the same everywhere. */
export function round(value: number): number {
  return Math.round(value * 100) / 100
}
