/**
 * A fit is forgiven this much, mm, so that an exact fit still counts after a rotation.
 *
 * Source: project rule, one hundredth of what a tape can read
 */
export const FIT_TOLERANCE_MM = 0.001

/**
 * Outlines that ought to meet may miss each other by this much, mm: coordinates are typed to the millimetre.
 *
 * Source: project rule, common practice of dimensioning in whole millimetres, no source
 */
export const DRAWN_TOLERANCE_MM = 1
