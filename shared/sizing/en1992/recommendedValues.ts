import type { EuropeanValues } from '../../contracts/nationalValues'

/** The nationally chosen values of EN 1990 and EN 1992 that the engine uses; pass another set for another country. */
export interface NationalValues {
  readonly gammaPermanent: number
  readonly gammaVariable: number
  readonly gammaConcrete: number
  /** Design stress of steel as a share of fyk, 1/γs. */
  readonly steelShare: number
  /** Design stress of the concrete block as a share of fck, αcc/γc. */
  readonly concreteShare: number
  /** αct in fctd = αct·fctk,0.05/γc. */
  readonly alphaCt: number
  /** k1 and k2 of the limit x/d ≤ (δ − k1)/k2 on the neutral axis after redistribution. */
  readonly redistribution: { readonly k1: number; readonly k2: number }
  /** Greatest z/d. */
  readonly greatestLeverArm: number
  readonly shear: { readonly coefficient: number; readonly vMinCoefficient: number }
  readonly leastSteel: { readonly tensileShare: number; readonly share: number }
  readonly greatestSteelShare: number
  readonly greatestSteelStressFactor: number
  /** Greatest l/d over K; infinite where no annex limits it. */
  readonly greatestSpanDepth: number
  readonly flangedFactor: { readonly overWidthRatio: number; readonly factor: number }
  /** Spacing of bars: multiples of the depth, and mm, by where they lie. */
  readonly spacing: {
    readonly greatestMoment: { readonly depths: number; readonly mm: number }
    readonly principal: { readonly depths: number; readonly mm: number }
    readonly secondary: { readonly depths: number; readonly mm: number }
  }
  readonly secondaryShare: number
  /** Clear gap between bars: k1·φ, aggregate + k2, and a least, mm. */
  readonly gap: { readonly diameters: number; readonly overAggregateMm: number; readonly leastMm: number }
}

/** γS of reinforcement. Source: EN 1992-1-1:2004, 2.4.2.4, Table 2.1N */
const STEEL_FACTOR = 1.15

/** αcc of fcd. Source: EN 1992-1-1:2004, 3.1.6(1) leaves 0.8 to 1; 0.85 by the engine design, common practice in bending */
const ALPHA_CC = 0.85

/**
 * Recommended values of the standards' own notes, save αcc = 0.85, the lever arm and the steel stress factor. The shares of
 * strength are 1/1.15 and 0.85/1.5 as design aids print them, so that hand checks agree to the digit.
 *
 * Source: EN 1990:2002 Table A1.2(B) and EN 1992-1-1:2004 2.4.2.4, 3.1.6, 5.5, 6.2.2, 7.4.2, 8.2, 9.2.1.1, 9.3.1.1 (seen in part, see
 * the folder's formulas); αcc 0.85, 0.95d and the cap 1.5: engine design, common practice
 */
export const recommendedValues = {
  gammaPermanent: 1.35,
  gammaVariable: 1.5,
  gammaConcrete: 1.5,
  steelShare: 0.87,
  concreteShare: 0.567,
  alphaCt: 1,
  redistribution: { k1: 0.44, k2: 1.25 },
  greatestLeverArm: 0.95,
  shear: { coefficient: 0.18, vMinCoefficient: 0.035 },
  leastSteel: { tensileShare: 0.26, share: 0.0013 },
  greatestSteelShare: 0.04,
  greatestSteelStressFactor: 1.5,
  greatestSpanDepth: Infinity,
  flangedFactor: { overWidthRatio: 3, factor: 0.8 },
  spacing: {
    greatestMoment: { depths: 2, mm: 250 },
    principal: { depths: 3, mm: 400 },
    secondary: { depths: 3.5, mm: 450 },
  },
  secondaryShare: 0.2,
  gap: { diameters: 1, overAggregateMm: 5, leastMm: 20 },
} as const satisfies NationalValues

/** Three decimals, as design aids print 1/γS and αcc/γC: 0.87 and 0.567. */
const asPrinted = (share: number) => Math.round(share * 1000) / 1000

/**
 * The national values of one brief: those it states, else the recommended ones. Shares of strength follow from their partial factors,
 * rounded as design aids print them.
 *
 * Source: EN 1992-1-1:2004, 2.4.2.4, 3.1.6, Expressions (3.15), and the clauses of `recommendedValues`
 */
export function nationalValues(chosen: EuropeanValues): NationalValues {
  const values: NationalValues = recommendedValues
  const gammaConcrete = chosen.gammaConcrete ?? values.gammaConcrete
  return {
    ...values,
    gammaPermanent: chosen.gammaPermanent ?? values.gammaPermanent,
    gammaVariable: chosen.gammaVariable ?? values.gammaVariable,
    gammaConcrete,
    steelShare: asPrinted(1 / (chosen.gammaSteel ?? STEEL_FACTOR)),
    concreteShare: asPrinted((chosen.alphaCc ?? ALPHA_CC) / gammaConcrete),
    redistribution: {
      k1: chosen.redistributionK1 ?? values.redistribution.k1,
      k2: chosen.redistributionK2 ?? values.redistribution.k2,
    },
    shear: { ...values.shear, vMinCoefficient: chosen.vMinCoefficient ?? values.shear.vMinCoefficient },
    greatestSteelStressFactor: chosen.greatestSteelFactor ?? values.greatestSteelStressFactor,
    greatestSpanDepth: chosen.greatestSpanDepth ?? values.greatestSpanDepth,
  }
}
