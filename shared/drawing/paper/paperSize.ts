/** A sheet of paper, landscape: its longer and shorter side, mm. */
export interface PaperSize {
  readonly longMm: number
  readonly shortMm: number
}

/**
 * Sheets that a layout is printed on.
 *
 * Source: ISO 216:2007, main series A (from memory)
 */
export const PAPER_SIZES = {
  A4: { longMm: 297, shortMm: 210 },
  A3: { longMm: 420, shortMm: 297 },
} as const satisfies Record<string, PaperSize>

export type PaperName = keyof typeof PAPER_SIZES

/** CSS pixels of a millimetre on paper. Source: CSS Values and Units Level 3, absolute lengths (96 px an inch) */
export const PX_PER_PAPER_MM = 96 / 25.4
