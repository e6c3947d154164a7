/**
 * Hogging moments over the supports of a continuous beam by the direct stiffness method: rotations of the knots are solved from the
 * whole matrix by elimination with pivots. Written apart from the engine's three-moment equation to check it.
 *
 * @param spans - lengths
 * @param loads - even load on each span
 * @param outer - hogging moments put on the first and the last knot, as overhangs do
 */
export function stiffnessMoments(
  spans: readonly number[],
  loads: readonly number[],
  outer: readonly [number, number] = [0, 0],
): number[] {
  const knots = spans.length + 1
  const matrix = Array.from({ length: knots }, () => new Array<number>(knots + 1).fill(0))
  spans.forEach((length, i) => {
    const fixed = (loads[i]! * length ** 2) / 12
    matrix[i]![i]! += 4 / length
    matrix[i]![i + 1]! += 2 / length
    matrix[i + 1]![i]! += 2 / length
    matrix[i + 1]![i + 1]! += 4 / length
    matrix[i]![knots]! -= fixed
    matrix[i + 1]![knots]! += fixed
  })
  matrix[0]![knots]! += outer[0]
  matrix[knots - 1]![knots]! -= outer[1]
  const rotations = eliminate(matrix)
  return Array.from({ length: knots }, (_, knot) => {
    if (knot === knots - 1) return outer[1]
    const length = spans[knot]!
    const atStart = (4 / length) * rotations[knot]! + (2 / length) * rotations[knot + 1]! + (loads[knot]! * length ** 2) / 12
    return Math.abs(atStart) < 1e-9 ? 0 : atStart
  })
}

function eliminate(matrix: number[][]): number[] {
  const size = matrix.length
  for (let column = 0; column < size; column += 1) {
    const pivot = matrix
      .slice(column)
      .reduce((best, row, i) => (Math.abs(row[column]!) > Math.abs(matrix[best]![column]!) ? column + i : best), column)
    ;[matrix[column], matrix[pivot]] = [matrix[pivot]!, matrix[column]!]
    for (let row = 0; row < size; row += 1) {
      if (row === column) continue
      const factor = matrix[row]![column]! / matrix[column]![column]!
      for (let k = column; k <= size; k += 1) matrix[row]![k]! -= factor * matrix[column]![k]!
    }
  }
  return matrix.map((row, i) => row[size]! / row[i]!)
}
