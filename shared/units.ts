/** The only conversions between the engine's inner units (mm, N, kg) and those of quantities (m, m², m³, t, kN). */

/** Acceleration of free fall, m/s²: turns the mass of blocks into a load. Source: project rule, engine design section 4. */
export const GRAVITY_M_PER_S2 = 9.81

/** Metres of a length in millimetres. */
export const toM = (lengthMm: number): number => lengthMm / 1000

/** Square metres of an area in square millimetres. */
export const toM2 = (areaMm2: number): number => areaMm2 / 1_000_000

/** Cubic metres of a volume in cubic millimetres. */
export const toM3 = (volumeMm3: number): number => volumeMm3 / 1_000_000_000

/** Tonnes of a mass in kilograms. */
export const toT = (massKg: number): number => massKg / 1000

/** Kilonewtons that a mass in kilograms weighs. */
export const toKn = (massKg: number): number => (massKg * GRAVITY_M_PER_S2) / 1000
