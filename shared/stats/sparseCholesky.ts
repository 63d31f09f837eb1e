/**
 * A symmetric positive definite matrix of which only some places below the diagonal can hold anything, and its Cholesky factor,
 * which fills no others. Kept row by row in full, so that any place is found at once; only the listed ones are worked on.
 */
export interface SparseMatrix {
  size: number
  /** for each column the rows below the diagonal that elimination can fill, rising */
  columns: readonly Int32Array[]
  /** entry (i, j), i >= j, is values[i * size + j] */
  values: Float64Array
}

/** An empty matrix with the given places. @throws RangeError where a row of a column is not below its diagonal */
export function makeSparse(columns: readonly Int32Array[]): SparseMatrix {
  const size = columns.length
  columns.forEach((rows, j) => rows.forEach((row) => {
    if (!(row > j && row < size)) throw new RangeError(`rows of column ${j} must be between ${j + 1} and ${size - 1}, got ${row}`)
  }))
  return { size, columns, values: new Float64Array(size * size) }
}

/**
 * Replaces the matrix by its lower Cholesky factor, in place.
 *
 * @returns false when the matrix is not positive definite (the values are then spoilt)
 */
export function factorise(matrix: SparseMatrix): boolean {
  const { size, columns, values } = matrix
  for (let j = 0; j < size; j++) {
    const diagonal = values[j * size + j]!
    if (!(diagonal > 0)) return false
    const root = Math.sqrt(diagonal)
    values[j * size + j] = root
    const rows = columns[j]!
    for (let a = 0; a < rows.length; a++) {
      const base = rows[a]! * size
      const value = values[base + j]! / root
      values[base + j] = value
      if (value === 0) continue
      for (let b = 0; b <= a; b++) values[base + rows[b]!]! -= value * values[rows[b]! * size + j]!
    }
  }
  return true
}

/** Sum of the logarithms of the first `count` diagonal entries of a factor: half the log determinant of that leading block. */
export function halfLogDeterminant(factor: SparseMatrix, count = factor.size): number {
  let sum = 0
  for (let i = 0; i < count; i++) sum += Math.log(factor.values[i * factor.size + i]!)
  return sum
}

/** Solves L y = x in place; costs nothing where x holds nothing. */
export function solveForward(factor: SparseMatrix, x: Float64Array): void {
  const { size, columns, values } = factor
  for (let j = 0; j < size; j++) {
    if (x[j] === 0) continue
    const value = x[j]! / values[j * size + j]!
    x[j] = value
    const rows = columns[j]!
    for (let a = 0; a < rows.length; a++) x[rows[a]!]! -= values[rows[a]! * size + j]! * value
  }
}

/** Solves L' y = x in place. */
export function solveBackward(factor: SparseMatrix, x: Float64Array): void {
  const { size, columns, values } = factor
  for (let j = size - 1; j >= 0; j--) {
    const rows = columns[j]!
    let sum = x[j]!
    for (let a = 0; a < rows.length; a++) sum -= values[rows[a]! * size + j]! * x[rows[a]!]!
    x[j] = sum / values[j * size + j]!
  }
}

/** Solves A y = x in place, given the Cholesky factor of A. */
export function solve(factor: SparseMatrix, x: Float64Array): void {
  solveForward(factor, x)
  solveBackward(factor, x)
}
