import type { UseCategory } from '#shared/contracts/project'

export interface UseOfFloor {
  readonly category: UseCategory
  readonly name: string
  /** Imposed load that the standard recommends, kN/m². */
  readonly recommendedKnPerM2: number
  /** Range it leaves to the national annexes, kN/m². */
  readonly range: string
}

/**
 * Uses of floors with their imposed loads: range and recommended value. The national annex may choose another, so the load stays editable.
 *
 * Source: EN 1991-1-1:2002, Tables 6.1, 6.2 and 6.4; the recommended value of B as the standard underlines it
 */
export const USES: readonly UseOfFloor[] = [
  { category: 'A', name: 'A, homes', recommendedKnPerM2: 2, range: '1.5 to 2.0' },
  { category: 'B', name: 'B, offices', recommendedKnPerM2: 3, range: '2.0 to 3.0' },
  { category: 'C1', name: 'C1, rooms with tables', recommendedKnPerM2: 3, range: '2.0 to 3.0' },
  { category: 'C2', name: 'C2, fixed seats', recommendedKnPerM2: 4, range: '3.0 to 4.0' },
  { category: 'C3', name: 'C3, people moving freely', recommendedKnPerM2: 5, range: '3.0 to 5.0' },
  { category: 'C4', name: 'C4, dancing, gymnastics', recommendedKnPerM2: 5, range: '4.5 to 5.0' },
  { category: 'C5', name: 'C5, crowds', recommendedKnPerM2: 5, range: '5.0 to 7.5' },
  { category: 'D1', name: 'D1, shops', recommendedKnPerM2: 4, range: '4.0 to 5.0' },
  { category: 'D2', name: 'D2, department stores', recommendedKnPerM2: 5, range: '4.0 to 5.0' },
  { category: 'E1', name: 'E1, storage', recommendedKnPerM2: 7.5, range: '7.5 or more' },
]

/** @throws when the category is not of the table */
export function useOf(category: UseCategory): UseOfFloor {
  const use = USES.find((row) => row.category === category)
  if (use === undefined) throw new Error(`no use of floors ${category} in EN 1991-1-1, Table 6.1`)
  return use
}
