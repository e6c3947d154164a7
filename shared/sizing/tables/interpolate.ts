/**
 * Value of a printed row between two of its columns, in a straight line; beyond either end the end value holds.
 *
 * Source: project rule, linear interpolation as BS 8110-1:1997 and EN 1992-1-2:2004 permit in their tables
 * @param columns - ascending, as many as `row`
 */
export function interpolate(columns: readonly number[], row: readonly number[], at: number): number {
  const next = columns.findIndex((column) => column >= at)
  if (next === 0) return row[0]!
  if (next < 0) return row.at(-1)!
  const share = (at - columns[next - 1]!) / (columns[next]! - columns[next - 1]!)
  return row[next - 1]! + share * (row[next]! - row[next - 1]!)
}
