/** Which end of a span. */
export type EndOfSpan = 'start' | 'end'

/** Moment, N·mm, hogging positive, and shear, N, at one section under one load case, per metre of width. */
export interface SectionForces {
  readonly hoggingNmm: number
  readonly shearN: number
}

/** Design forces of one span per metre of width: N·mm and N, envelopes over all load cases, all ≥ 0. */
export interface SpanForces {
  readonly method: 'coefficients' | 'elastic'
  /** Share of the support moments that redistribution took off in the values, 0 to 0.3. */
  readonly redistributedShare: number
  /** The same for forces that are the same all along the span. */
  readonly key: string
  readonly saggingNmm: number
  readonly hoggingNmm: (end: EndOfSpan, fromSupportMm: number) => number
  /** Over the support, before it was raised to that of the floor behind; absent where none is raised. */
  readonly ownHoggingNmm?: (end: EndOfSpan) => number
  readonly shearN: (end: EndOfSpan, fromSupportMm: number) => number
  /** The same section under each load case by itself; shear positive upwards on the side of `end`. */
  readonly casesAt: (end: EndOfSpan, fromSupportMm: number) => readonly SectionForces[]
}

/**
 * Ends of a span that are not continuous and off which some load case lifts it.
 *
 * Source: statics, the reaction there is negative
 */
export function liftedEnds(forces: SpanForces, isContinuous: Readonly<Record<EndOfSpan, boolean>>): EndOfSpan[] {
  return (['start', 'end'] as const).filter(
    (end) => !isContinuous[end] && forces.casesAt(end, 0).some(({ shearN }) => shearN < 0),
  )
}

/**
 * Forces of a single span on simple supports under an even load.
 *
 * Source: statics, w·l²/8 and w·(l/2 − x)
 * @param load - N/mm per metre of width, which is kN/m²
 */
export function simpleSpanForces(load: number, spanMm: number): SpanForces {
  return {
    method: 'elastic',
    redistributedShare: 0,
    key: forcesKey([load, spanMm]),
    saggingNmm: (load * spanMm * spanMm) / 8,
    hoggingNmm: () => 0,
    shearN: (_end, fromSupportMm) => load * Math.max(0, spanMm / 2 - fromSupportMm),
    casesAt: (_end, fromSupportMm) => [
      { hoggingNmm: (-load * fromSupportMm * (spanMm - fromSupportMm)) / 2, shearN: load * (spanMm / 2 - fromSupportMm) },
    ],
  }
}

/**
 * Key of forces that follow from some numbers.
 *
 * Source: project rule, ten significant digits tell load cases apart
 */
export function forcesKey(numbers: readonly number[]): string {
  return numbers.map((number) => number.toPrecision(10)).join()
}
