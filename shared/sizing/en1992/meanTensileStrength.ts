/**
 * Mean tensile strength fctm as printed for the classes up to C50/60, MPa; `meanTensileStrength` must round to these.
 *
 * Source: EN 1992-1-1:2004, Table 3.1 (C20 to C50 seen in a public encoding; C12 and C16 from memory)
 */
export const PRINTED_TENSILE_STRENGTH_MPA = {
  12: 1.6,
  16: 1.9,
  20: 2.2,
  25: 2.6,
  30: 2.9,
  35: 3.2,
  40: 3.5,
  45: 3.8,
  50: 4.1,
} as const

/**
 * Mean axial tensile strength fctm of concrete, MPa, unrounded.
 *
 * Source: EN 1992-1-1:2004, Table 3.1, analytical relation fctm = 0.30·fck^(2/3) up to C50/60 (from memory, agrees with the printed row)
 * @param fckMpa - cylinder strength, 12 to 50
 */
export function meanTensileStrength(fckMpa: number): number {
  return 0.3 * fckMpa ** (2 / 3)
}
