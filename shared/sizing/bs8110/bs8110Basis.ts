import type { Brief } from '../../contracts/appraisal'
import type { CodeBasis } from '../codeBasis'
import { anchorageMm, bottomEnd, lapMm } from './anchorage'
import { greatestSpacingMm } from './barSpacing'
import { effectiveSpanMm } from './effectiveSpan'
import { exposureCover } from './exposure'
import { ribFire, slabFire } from './fire'
import { ribFlangeWidth } from './flangeWidth'
import { flexure } from './flexure'
import { leastToppingMm, ribProportions } from './ribProportions'
import { shearResistanceN } from './shear'
import { GREATEST_TABULATED, spanDepthLimit } from './spanDepthLimit'
import { leastGapMm, leastSteelMm2, mostSteelMm2, toppingMeshMm2 } from './steelLimits'
import { STEEL_FACTOR, STEEL_SHARE, type Strengths } from './strengths'

type BritishBrief = Pick<Extract<Brief, { basis: 'BS8110' }>, 'fcu' | 'fy' | 'cover' | 'nationalValues' | 'exposure'>

/**
 * Ultimate factors; a span that a pattern leaves unloaded keeps its characteristic permanent load.
 *
 * Source: BS 8110-1:1997, 2.4.3.1, Table 2.1 and 3.2.1.2.2 (seen in several worked examples)
 */
const LOAD_FACTORS = { permanent: 1.4, variable: 1.6, unloaded: 1, clause: 'BS 8110-1 2.4.3.1' } as const

/**
 * Top steel at edges designed as simple: half the midspan steel of slabs, no less than their least, over 0.1 of the span; a quarter of that
 * of ribs over 0.15 of it.
 *
 * Source: BS 8110-1:1997, 3.12.10.3.2 (0.1 and half by the engine design, the least from memory) and 3.6.2 (from memory)
 */
const SIMPLE_EDGE = {
  slab: { share: 0.5, of: 'steel', isAtLeastLeast: true, reach: 0.1, clause: 'BS 8110-1 3.12.10.3.2' },
  rib: { share: 0.25, of: 'steel', isAtLeastLeast: false, reach: 0.15, clause: 'BS 8110-1 3.6.2' },
} as const satisfies CodeBasis['simpleEdge']

/**
 * BS 8110-1 answering for one brief's strengths and cover. It has no rule for cross ribs, and asks of the steel across the principal bars
 * the least of any slab.
 *
 * Source: BS 8110-1:1997, by the clauses named in this folder; 3.2.2.1 for redistribution (30 %, from memory)
 */
export function bs8110Basis({ fcu, fy, cover, nationalValues, exposure }: BritishBrief): CodeBasis {
  const steelShare = STEEL_SHARE[nationalValues.gammaSteel ?? STEEL_FACTOR]
  const strengths: Strengths = { fcuMpa: fcu, fyMpa: fy, steelShare, coverMm: cover }
  return {
    title: 'BS 8110-1:1997',
    loadFactors: LOAD_FACTORS,
    redistribution: { greatestShare: 0.3, greatestSpanRatio: null, leastElasticShare: 0.7, clause: 'BS 8110-1 3.2.2.1' },
    greatestTabulatedSpanDepth: GREATEST_TABULATED,
    simpleEdge: SIMPLE_EDGE,
    effectiveSpanClause: 'BS 8110-1 3.4.1.2, 3.4.1.3',
    effectiveSpanMm: (clear, _height, depth, ends) => effectiveSpanMm(clear, depth, ends),
    flangeWidthMm: ribFlangeWidth,
    flexure: (section, moment, redistributedShare) => flexure(section, moment, redistributedShare, strengths),
    shearResistanceN: (section) => shearResistanceN(section, strengths),
    spanDepthLimit: (input) => spanDepthLimit(input, strengths),
    leastSteelMm2: (zone) => leastSteelMm2(zone, strengths),
    mostSteelMm2,
    secondarySteelMm2: (_principal, zone) => leastSteelMm2(zone, strengths),
    toppingMeshMm2,
    greatestSpacingMm: (bars) => greatestSpacingMm(bars, strengths),
    leastGapMm,
    anchorageMm: (diameter, _bond, stressShare) => anchorageMm(diameter, stressShare, strengths),
    lapMm: (diameter, bond) => lapMm(diameter, bond, strengths),
    bottomEnd,
    ribProportions,
    leastToppingMm,
    crossRibSpacingMm: () => null,
    exposureCover: (bars) => (exposure ? exposureCover(exposure, bars, fcu) : []),
    slabFire: (minutes, _action, isContinuous) => slabFire(minutes, isContinuous),
    ribFire: (minutes, _ribMm, isContinuous) => ribFire(minutes, isContinuous),
  }
}
