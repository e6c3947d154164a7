/** Pieces to be cut from bars of one length, in whole steps: `sizes` falling, `counts` beside them, all above 0, none over the capacity. */
export interface CuttingJob {
  readonly capacity: number
  readonly sizes: readonly number[]
  readonly counts: readonly number[]
}

/** How many pieces of each size one bar is cut into, beside `sizes`. */
export type Pattern = readonly number[]

/** A pattern cut a number of times. */
export interface Cut {
  readonly pattern: Pattern
  readonly times: number
}

/** Steps that all pieces take together. */
export function totalOf({ sizes, counts }: CuttingJob): number {
  return sizes.reduce((sum, size, i) => sum + size * counts[i]!, 0)
}

/** The job that is left when some pieces are cut; `left` stands beside `sizes`. */
export function jobLeft({ capacity, sizes }: CuttingJob, left: readonly number[]): CuttingJob {
  const open = sizes.map((_, i) => i).filter((i) => left[i]! > 0)
  return { capacity, sizes: open.map((i) => sizes[i]!), counts: open.map((i) => left[i]!) }
}

/** A pattern over some of the sizes as one over all of them; `left` says which were open. */
export function widened(pattern: Pattern, left: readonly number[]): number[] {
  let at = 0
  return left.map((count) => (count > 0 ? pattern[at++]! : 0))
}
