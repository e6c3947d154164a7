import type { Mesh } from '../../contracts/appraisal'

/**
 * Welded square mesh: area of wires each way, mm²/m, and mass as printed, kg/m².
 *
 * Source: BS 4483:2005, Table 1 (A252 and A393 seen in several copies, the rest from memory and recalculated)
 */
export const FABRIC = {
  none: { areaMm2PerM: 0, massKgPerM2: 0 },
  A98: { areaMm2PerM: 98.2, massKgPerM2: 1.54 },
  A142: { areaMm2PerM: 141.4, massKgPerM2: 2.22 },
  A193: { areaMm2PerM: 192.4, massKgPerM2: 3.02 },
  A252: { areaMm2PerM: 251.3, massKgPerM2: 3.95 },
  A393: { areaMm2PerM: 392.7, massKgPerM2: 6.16 },
} as const satisfies Record<Mesh, { areaMm2PerM: number; massKgPerM2: number }>
