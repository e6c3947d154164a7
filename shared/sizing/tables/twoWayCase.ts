/** Aspect ratios ly/lx that head the columns of Tables 3.14 and 3.15. */
export const ASPECT_RATIOS = [1, 1.1, 1.2, 1.3, 1.4, 1.5, 1.75, 2] as const

/** The nine arrangements of continuous edges of a two-way panel, numbered as Table 3.14 lists them. */
export type TwoWayCase = 1 | 2 | 3 | 4 | 5 | 6 | 7 | 8 | 9

const CASES = [
  [1, 2, 5],
  [3, 4, 7],
  [6, 8, 9],
] as const satisfies readonly (readonly TwoWayCase[])[]

/**
 * Which of the nine cases a panel is.
 *
 * Source: BS 8110-1:1997, 3.5.3.4 and Table 3.14, list of panel types (from memory, agreed by two public encodings)
 * @param discontinuousLong - long edges that are discontinuous, 0 to 2
 * @param discontinuousShort - short edges that are discontinuous, 0 to 2
 */
export function twoWayCase(discontinuousLong: 0 | 1 | 2, discontinuousShort: 0 | 1 | 2): TwoWayCase {
  return CASES[discontinuousLong][discontinuousShort]
}
