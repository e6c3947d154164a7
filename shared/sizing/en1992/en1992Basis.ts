import type { Brief } from '../../contracts/appraisal'
import type { CodeBasis } from '../codeBasis'
import { anchorageMm, bottomEnd, lapMm } from './anchorage'
import { effectiveSpanMm } from './effectiveSpan'
import { exposureCover } from './exposure'
import { ribFire, slabFire } from './fire'
import { ribFlangeWidth } from './flangeWidth'
import { flexure } from './flexure'
import { nationalValues } from './recommendedValues'
import { crossRibSpacingMm, leastToppingMm, ribProportions } from './ribProportions'
import { shearResistanceN } from './shear'
import { GREATEST_TABULATED, spanDepthLimit } from './spanDepthLimit'
import { greatestSpacingMm, leastGapMm, leastSteelMm2, mostSteelMm2, secondarySteelMm2, toppingMeshMm2 } from './steelLimits'
import type { Strengths } from './strengths'

type EuropeanBrief = Pick<Extract<Brief, { basis: 'EN1992' }>, 'fck' | 'fyk' | 'nationalValues' | 'exposure'>

/** Source: EN 1992-1-1:2004, 9.3.1.2(2) (from memory) */
const SIMPLE_EDGE = { share: 0.25, of: 'moment', isAtLeastLeast: false, reach: 0.2, clause: 'EN 1992-1-1 9.3.1.2(2)' } as const

/**
 * EN 1992-1-1 and EN 1992-1-2 answering for one brief's strengths.
 *
 * Source: EN 1990:2002, EN 1992-1-1:2004, EN 1992-1-2:2004, by the clauses named in this folder; EN 9.3.1.2(2) for simple edges
 */
export function en1992Basis({ fck, fyk, nationalValues: chosen, exposure }: EuropeanBrief): CodeBasis {
  const values = nationalValues(chosen)
  const strengths: Strengths = { fckMpa: fck, fykMpa: fyk, values }
  return {
    title: 'EN 1992-1-1:2004',
    loadFactors: {
      permanent: values.gammaPermanent,
      variable: values.gammaVariable,
      unloaded: values.gammaPermanent,
      clause: 'EN 1990 6.10',
    },
    redistribution: { greatestShare: 0.3, greatestSpanRatio: 2, leastElasticShare: 0, clause: 'EN 1992-1-1 5.5(4)' },
    greatestTabulatedSpanDepth: GREATEST_TABULATED * values.greatestSteelStressFactor,
    simpleEdge: { slab: SIMPLE_EDGE, rib: SIMPLE_EDGE },
    effectiveSpanClause: 'EN 1992-1-1 5.3.2.2(1)',
    effectiveSpanMm: (clear, height, _depth, ends) => effectiveSpanMm(clear, height, ends),
    flangeWidthMm: ribFlangeWidth,
    flexure: (section, moment, redistributedShare) => flexure(section, moment, redistributedShare, strengths),
    shearResistanceN: (section) => shearResistanceN(section, strengths),
    spanDepthLimit: (input) => spanDepthLimit(input, strengths),
    leastSteelMm2: (zone) => leastSteelMm2(zone, strengths),
    mostSteelMm2: (concrete) => mostSteelMm2(concrete, strengths),
    secondarySteelMm2: (principal) => secondarySteelMm2(principal, strengths),
    toppingMeshMm2: (topping) => toppingMeshMm2(topping, strengths),
    greatestSpacingMm: (bars) => greatestSpacingMm(bars, strengths),
    leastGapMm: (diameter, aggregate) => leastGapMm(diameter, aggregate, strengths),
    anchorageMm: (diameter, bond, stressShare) => anchorageMm(diameter, bond, stressShare, strengths),
    lapMm: (diameter, bond) => lapMm(diameter, bond, strengths),
    bottomEnd,
    ribProportions,
    leastToppingMm,
    crossRibSpacingMm,
    exposureCover: (bars) => (exposure ? exposureCover(exposure, bars) : []),
    slabFire,
    ribFire,
  }
}
