/**
 * Hogging moments over the supports of a continuous beam of constant stiffness on knife edges, each span loaded evenly. Its ends are
 * simple, or carry a moment that is known: that of an overhang.
 *
 * Source: three-moment equation (Clapeyron 1857), M(i−1)·l(i) + 2·M(i)·(l(i) + l(i+1)) + M(i+1)·l(i+1) = (w(i)·l(i)³ + w(i+1)·l(i+1)³)/4
 * @param spansMm - one or more, any lengths > 0
 * @param loads - on each span, N/mm
 * @param outer - moments over the first and the last support, N·mm, hogging positive
 * @returns one moment a support, N·mm, hogging positive; the first and the last are `outer`
 */
export function supportMoments(
  spansMm: readonly number[],
  loads: readonly number[],
  outer: readonly [number, number] = [0, 0],
): number[] {
  const inner = spansMm.length - 1
  const reduced: number[] = []
  const moments = new Array<number>(spansMm.length + 1).fill(0)
  moments[0] = outer[0]
  moments[inner + 1] = outer[1]
  for (let i = 0; i < inner; i += 1) {
    const [left, right] = [spansMm[i]!, spansMm[i + 1]!]
    const last = i === inner - 1 ? right * outer[1] : 0
    const load = (loads[i]! * left ** 3 + loads[i + 1]! * right ** 3) / 4 - last
    const pivot = 2 * (left + right) - (i > 0 ? left * reduced[i - 1]! : 0)
    reduced.push(right / pivot)
    moments[i + 1] = (load - left * moments[i]!) / pivot
  }
  for (let i = inner - 1; i > 0; i -= 1) moments[i]! -= reduced[i - 1]! * moments[i + 1]!
  return moments
}

/** One load case of one span: its load, N/mm, and the hogging moments at its ends, N·mm. */
export interface SpanCase {
  readonly load: number
  readonly startMoment: number
  readonly endMoment: number
}

/**
 * Moment at a distance from the start of a span, sagging positive, N·mm.
 *
 * Source: statics of a simple span with end moments
 */
export function momentAt({ load, startMoment, endMoment }: SpanCase, spanMm: number, fromStartMm: number): number {
  const simple = (load * fromStartMm * (spanMm - fromStartMm)) / 2
  return simple - startMoment - ((endMoment - startMoment) * fromStartMm) / spanMm
}

/**
 * Shear at a distance from the start of a span, N, positive upwards on the start side.
 *
 * Source: statics of a simple span with end moments
 */
export function shearAt({ load, startMoment, endMoment }: SpanCase, spanMm: number, fromStartMm: number): number {
  return load * (spanMm / 2 - fromStartMm) + (startMoment - endMoment) / spanMm
}

/**
 * Greatest sagging moment of a span, N·mm, 0 where it hogs all along; exactly w·l²/8 between simple ends.
 *
 * Source: statics, the moment is greatest where the shear is 0
 */
export function greatestSagging(spanCase: SpanCase, spanMm: number): number {
  const { load, startMoment, endMoment } = spanCase
  if (startMoment === 0 && endMoment === 0) return (load * spanMm * spanMm) / 8
  const peakMm = shearAt(spanCase, spanMm, 0) / load
  return peakMm > 0 && peakMm < spanMm ? Math.max(0, momentAt(spanCase, spanMm, peakMm)) : 0
}
