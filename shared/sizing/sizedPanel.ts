import type { Bar, BarDiameter, SlabLayers } from '../contracts/appraisal'
import type { Check, PanelResult } from '../contracts/appraisalResult'
import type { PanelAreas, PanelLayout } from '../layout/panelLayout'
import type { BarShape } from './bars/barShape'
import type { FireStanding } from './fireStanding'

/** Bars of one kind in one panel that are cut and bent alike, repeats not counted. Total length = count × length. */
export interface BarRun {
  /** As 'bottom, along ribs' or 'top, edge 2'. */
  readonly position: string
  readonly diameter: BarDiameter
  readonly count: number
  /** Of one bar as it is cut, mm, by the formula of its shape. */
  readonly lengthMm: number
  readonly shape: BarShape
  /** Of the layer that the bars make, mm; null for bars that are counted in ribs. */
  readonly spacingMm: number | null
  /** How count and length came about, for the reader: 'ribs 12, 2 in each' and 'clear 5 750 + 2 × 120'. */
  readonly countWorking: string
  readonly lengthWorking: string
  readonly clause: string
}

/** A panel's bars in the shapes in which a scheme gives them: bottom and heavier top bars of a rib, or layers of a slab. */
export type Reinforcement =
  | { readonly kind: 'ribbed'; readonly ribBars: readonly Bar[]; readonly topBars: readonly Bar[] }
  | { readonly kind: 'solid'; readonly bars: SlabLayers }

/** A panel of one scheme, sized: what the take-off measures and the checks show. */
export interface SizedPanel {
  readonly level: string
  readonly mark: string
  readonly depth: number
  readonly areas: PanelAreas
  /** Ribbed panels only. */
  readonly layout: PanelLayout | null
  readonly checks: readonly Check[]
  /** Where in the panel each check is made, beside `checks`: 'midspan', 'edge 2, rib'. */
  readonly places: readonly string[]
  readonly moments: PanelResult['moments']
  readonly steel: PanelResult['steel']
  readonly bars: readonly BarRun[]
  readonly reinforcement: Reinforcement
  readonly fire: FireStanding
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
