import { z } from 'zod'

/** Exposure classes of EN 206-1 as EN 1992-1-1 Table 4.1 lists them, those of corrosion. */
export const europeanExposure = z.enum(['X0', 'XC1', 'XC2', 'XC3', 'XC4', 'XD1', 'XD2', 'XD3', 'XS1', 'XS2', 'XS3'])

/** Conditions of exposure of BS 8110-1 Table 3.2. */
export const britishExposure = z.enum(['mild', 'moderate', 'severe', 'verySevere', 'mostSevere'])

export type EuropeanExposure = z.infer<typeof europeanExposure>
export type BritishExposure = z.infer<typeof britishExposure>
