import type { FloorLoads } from '../actions'

/** One span of a continuous strip: effective span, mm, its loads and the area of its bay, mm². */
export interface StripSpan {
  readonly spanMm: number
  readonly loads: FloorLoads
  readonly bayMm2: number
  /** Held at one end only; such a span is the first or the last of its strip. */
  readonly isCantilever?: boolean
  /** An overhang along a part of the support only: it does not relieve the span behind it. */
  readonly isPartOfWidth?: boolean
}

/** A line of spans from one simple or free end to the other, and which of them is looked at. */
export interface Strip {
  readonly spans: readonly StripSpan[]
  readonly index: number
  /** How each span is called: by its panel's mark, or by what was typed or assumed. */
  readonly names: readonly string[]
  /** Ends of the looked-at span beyond which an equal span was assumed for want of a neighbour. */
  readonly assumedEnds: number
}

/**
 * A strip in words, as `P1 – P2 – (6.0 m typed)`.
 *
 * Source: project rule, the reader sees which spans a panel was analysed with
 */
export function stripText({ names }: Pick<Strip, 'names'>): string {
  return names.join(' – ')
}
