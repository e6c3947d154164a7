import { restrainedMoments } from '../tables/restrainedMoments'
import { restrainedShear } from '../tables/restrainedShears'
import { type TwoWayCase, twoWayCase } from '../tables/twoWayCase'

/** A two-way panel: ultimate load, kN/m², effective spans, mm, and which ends of each span are continuous. */
export interface TwoWayPanel {
  readonly load: number
  readonly shortMm: number
  readonly longMm: number
  /** Ends of the short span, which are the long edges. */
  readonly shortEnds: readonly [boolean, boolean]
  readonly longEnds: readonly [boolean, boolean]
}

/** Moments, N·mm per metre, and shears, N per metre, of one direction; per end as given, hogging 0 at discontinuous ends. */
export interface TwoWayDirection {
  readonly saggingNmm: number
  readonly hoggingNmm: readonly [number, number]
  readonly shearN: readonly [number, number]
}

/** Forces of a two-way panel in both directions. */
export interface TwoWayForces {
  /** Null where the corners may lift. */
  readonly panelCase: TwoWayCase | null
  readonly aspect: number
  readonly short: TwoWayDirection
  readonly long: TwoWayDirection
}

const discontinuous = (ends: readonly [boolean, boolean]) => ends.filter((isContinuous) => !isContinuous).length as 0 | 1 | 2

/**
 * Moments and shears of a two-way panel on four sides with corners held down.
 *
 * Source: BS 8110-1:1997, 3.5.3.4 and 3.5.3.7, equations 14, 15, 19, 20, Tables 3.14 and 3.15; used under any basis, stated in flags
 */
export function twoWayForces({ load, shortMm, longMm, shortEnds, longEnds }: TwoWayPanel): TwoWayForces {
  const panelCase = twoWayCase(discontinuous(shortEnds), discontinuous(longEnds))
  const aspect = Math.max(1, longMm / shortMm)
  const beta = restrainedMoments(panelCase, aspect)
  const moment = load * shortMm ** 2
  const direction = (
    edge: 'long' | 'short',
    ends: readonly [boolean, boolean],
    span: number,
    support: number,
  ): TwoWayDirection => {
    const shear = (isContinuous: boolean) => (restrainedShear(panelCase, edge, isContinuous, aspect) ?? 0) * load * shortMm
    return {
      saggingNmm: span * moment,
      hoggingNmm: [ends[0] ? support * moment : 0, ends[1] ? support * moment : 0],
      shearN: [shear(ends[0]), shear(ends[1])],
    }
  }
  return {
    panelCase,
    aspect,
    short: direction('long', shortEnds, beta.shortSpan, beta.shortSupport),
    long: direction('short', longEnds, beta.longSpan, beta.longSupport),
  }
}
