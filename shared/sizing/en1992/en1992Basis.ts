import type { Brief } from '../../contracts/appraisal'
import type { CodeBasis } from '../codeBasis'
import { anchorageMm, lapMm } from './anchorage'
import { effectiveSpanMm } from './effectiveSpan'
import { ribFire, slabFire } from './fire'
import { ribFlangeWidth } from './flangeWidth'
import { flexure } from './flexure'
import { type NationalValues, recommendedValues } from './recommendedValues'
import { crossRibSpacingMm, leastToppingMm, ribProportions } from './ribProportions'
import { shearResistanceN } from './shear'
import { spanDepthLimit } from './spanDepthLimit'
import { greatestSpacingMm, leastGapMm, leastSteelMm2, mostSteelMm2 } from './steelLimits'
import type { Strengths } from './strengths'

type EuropeanBrief = Extract<Brief, { basis: 'EN1992' }>

/**
 * EN 1992-1-1 and EN 1992-1-2 answering for one brief's strengths.
 *
 * Source: EN 1990:2002, EN 1992-1-1:2004, EN 1992-1-2:2004, by the clauses named in this folder; EN 9.3.1.2(2) for simple edges
 * @param values - nationally chosen values; the recommended ones unless given
 */
export function en1992Basis({ fck, fyk }: EuropeanBrief, values: NationalValues = recommendedValues): CodeBasis {
  const strengths: Strengths = { fckMpa: fck, fykMpa: fyk, values }
  return {
    title: 'EN 1992-1-1:2004',
    loadFactors: {
      permanent: values.gammaPermanent,
      variable: values.gammaVariable,
      unloaded: values.gammaPermanent,
      clause: 'EN 1990 6.10',
    },
    simpleEdge: { share: 0.25, reach: 0.2, clause: 'EN 1992-1-1 9.3.1.2(2)' },
    secondary: { share: values.secondaryShare, clause: 'EN 1992-1-1 9.3.1.1(2)' },
    effectiveSpanMm: (clear, height, _depth, ends) => effectiveSpanMm(clear, height, ends),
    flangeWidthMm: ribFlangeWidth,
    flexure: (section, moment, redistributedShare) => flexure(section, moment, redistributedShare, strengths),
    shearResistanceN: (section) => shearResistanceN(section, strengths),
    spanDepthLimit: (input) => spanDepthLimit(input, strengths),
    leastSteelMm2: (zone) => leastSteelMm2(zone, strengths),
    mostSteelMm2: (concrete) => mostSteelMm2(concrete, strengths),
    greatestSpacingMm: (place, height) => greatestSpacingMm(place, height, strengths),
    leastGapMm: (diameter, aggregate) => leastGapMm(diameter, aggregate, strengths),
    anchorageMm: (diameter, isPoor, stressShare) => anchorageMm(diameter, isPoor, stressShare, strengths),
    lapMm: (diameter, isPoor) => lapMm(diameter, isPoor, strengths),
    ribProportions,
    leastToppingMm,
    crossRibSpacingMm,
    slabFire,
    ribFire,
  }
}
