import type { FloorLoads } from '../actions'

/** One span of a continuous strip: effective span, mm, its loads and the area of its bay, mm². */
export interface StripSpan {
  readonly spanMm: number
  readonly loads: FloorLoads
  readonly bayMm2: number
}

/** A line of spans from one simple end to the other, and which of them is looked at. */
export interface Strip {
  readonly spans: readonly StripSpan[]
  readonly index: number
  /** Ends of the looked-at span beyond which an equal span was assumed for want of a neighbour. */
  readonly assumedEnds: number
}
