/** Values that a country chooses within a code of practice; what is left out is the code's own, or the one the engine states. */
import { z } from 'zod'

/** Nationally chosen values of EN 1990 and EN 1992-1-1, each with the range that national annexes stay in. */
export const europeanValues = z.strictObject({
  gammaPermanent: z.number().min(1).max(1.5).optional(), // γG of (6.10), 1.35
  gammaVariable: z.number().min(1).max(1.8).optional(), // γQ of (6.10), 1.5
  gammaConcrete: z.number().min(1.2).max(1.8).optional(), // γC, 1.5
  gammaSteel: z.number().min(1).max(1.3).optional(), // γS, 1.15
  alphaCc: z.number().min(0.7).max(1).optional(), // αcc of fcd, 0.85
  redistributionK1: z.number().min(0.3).max(0.7).optional(), // k1 of x/d ≤ (δ − k1)/k2, 0.44
  redistributionK2: z.number().min(0.6).max(1.5).optional(), // k2, 1.25
  vMinCoefficient: z.number().min(0).max(0.06).optional(), // of vmin, 0.035
  greatestSteelFactor: z.number().min(1).max(2).optional(), // 500·As,prov/(fyk·As,req) of 7.4.2(2), 1.5
  greatestSpanDepth: z.number().min(15).max(80).optional(), // l/d ≤ K times this; none
})

/** Nationally chosen values of BS 8110-1:1997. */
export const britishValues = z.strictObject({
  gammaSteel: z.literal([1.05, 1.15]).optional(), // γm of reinforcement, 1.05; 1.15 by the 1985 edition and the amendment of 2005
})

export type EuropeanValues = z.infer<typeof europeanValues>
export type BritishValues = z.infer<typeof britishValues>
