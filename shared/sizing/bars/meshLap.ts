import type { Brief, Mesh } from '../../contracts/appraisal'

/** Between wires of square mesh, both ways, mm. Source: BS 4483:2005, Table 1 */
const WIRE_PITCH_MM = 200

/** Diameter of the wires of square mesh, mm. Source: BS 4483:2005, Table 1 (from memory, confirmed by evaluating the areas) */
const WIRE_MM = { A98: 5, A142: 6, A193: 7, A252: 8, A393: 10 } as const satisfies Record<Exclude<Mesh, 'none'>, number>

/** Least laps of secondary wires: up to a diameter, a length and a number of wire pitches. */
const SECONDARY_LAPS = [
  { upToMm: 6, lengthMm: 150, pitches: 1 },
  { upToMm: 8.5, lengthMm: 250, pitches: 2 },
  { upToMm: 12, lengthMm: 350, pitches: 2 },
] as const

/** How far sheets of mesh lie over one another, mm, and where it stands. */
export interface MeshLap {
  readonly lapMm: number
  readonly clause: string
}

/**
 * Lap of the mesh in a topping, where it is secondary steel and not counted in bending.
 *
 * Source: EN 1992-1-1:2004, 8.7.5.2, Table 8.4; BS 8110-1:1997, 3.12.8.11, least lap of fabric 250 mm (both from memory)
 */
export function meshLap(mesh: Exclude<Mesh, 'none'>, basis: Brief['basis']): MeshLap {
  if (basis === 'BS8110') return { lapMm: 250, clause: 'BS 8110-1 3.12.8.11' }
  const { lengthMm, pitches } = SECONDARY_LAPS.find(({ upToMm }) => WIRE_MM[mesh] <= upToMm)!
  return { lapMm: Math.max(lengthMm, pitches * WIRE_PITCH_MM), clause: 'EN 1992-1-1 8.7.5.2' }
}
