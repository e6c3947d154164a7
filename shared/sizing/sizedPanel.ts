import type { BarDiameter, Check, PanelResult } from '../contracts/appraisal'
import type { PanelAreas, PanelLayout } from '../layout/panelLayout'

/** Bars of one kind in one panel, repeats not counted. Total length = count × length, laps and anchorages in. */
export interface BarRun {
  /** As 'bottom, along ribs' or 'top, edge 2'. */
  readonly position: string
  readonly diameter: BarDiameter
  readonly count: number
  /** Of one bar as scheduled, mm, laps in. */
  readonly lengthMm: number
  /** How count and length came about, for the reader: 'ribs 12, 2 in each' and 'clear 5 750 + 2 × 120'. */
  readonly countWorking: string
  readonly lengthWorking: string
  readonly clause: string
}

/** A panel of one scheme, sized: what the take-off measures and the checks show. */
export interface SizedPanel {
  readonly level: string
  readonly mark: string
  readonly depth: number
  readonly areas: PanelAreas
  /** Ribbed panels only. */
  readonly layout: PanelLayout | null
  readonly checks: readonly Check[]
  readonly moments: PanelResult['moments']
  readonly steel: PanelResult['steel']
  readonly bars: readonly BarRun[]
  /** Stated assumptions and approximations of this panel ('sized on its enclosing rectangle'). */
  readonly flags: readonly string[]
}

/** A scheme sized over all levels, in the order levels and panels were given. */
export interface SizedScheme {
  readonly mark: string
  readonly kind: 'ribbed' | 'solid'
  /** The one depth of the scheme, mm: its worst panel's. */
  readonly depth: number
  readonly passes: boolean
  readonly panels: readonly SizedPanel[]
}
