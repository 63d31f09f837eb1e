import { dotRange } from '#shared/stats/dotRange'

/**
 * A symmetric positive definite matrix of which only some places below the diagonal can hold anything, and its Cholesky factor,
 * which fills no others. Kept row by row in full, so that any place is found at once; only the listed ones are worked on.
 */
export interface SparseMatrix {
  size: number
  /** for each column the rows below the diagonal that elimination can fill, rising */
  columns: readonly Int32Array[]
  /** from this column on every place below the diagonal can be filled */
  fullFrom: number
  /** entry (i, j), i >= j, is values[i * size + j] */
  values: Float64Array
}

/** An empty matrix with the given places. @throws RangeError where a row of a column is not below its diagonal */
export function makeSparse(columns: readonly Int32Array[]): SparseMatrix {
  const size = columns.length
  columns.forEach((rows, j) => rows.forEach((row) => {
    if (!(row > j && row < size)) throw new RangeError(`rows of column ${j} must be between ${j + 1} and ${size - 1}, got ${row}`)
  }))
  let fullFrom = size
  while (fullFrom > 0 && columns[fullFrom - 1]!.length === size - fullFrom) fullFrom--
  return { size, columns, fullFrom, values: new Float64Array(size * size) }
}

/** Takes one eliminated column off everything it joins. */
function eliminate(matrix: SparseMatrix, j: number, column: Float64Array): void {
  const { size, columns, values } = matrix
  const rows = columns[j]!
  for (let a = 0; a < rows.length; a++) {
    const base = rows[a]! * size
    const value = values[base + j]! / values[j * size + j]!
    values[base + j] = value
    column[a] = value
    if (value === 0) continue
    for (let b = 0; b <= a; b++) values[base + rows[b]!]! -= value * column[b]!
  }
}

/** Factors what is left from a column on where every place holds something, row by row. */
function factoriseFull(matrix: SparseMatrix, from: number): boolean {
  const { size, values } = matrix
  for (let i = from; i < size; i++) {
    const row = i * size
    for (let j = from; j < i; j++) {
      values[row + j] = (values[row + j]! - dotRange(values, row + from, values, j * size + from, j - from)) / values[j * size + j]!
    }
    const diagonal = values[row + i]! - dotRange(values, row + from, values, row + from, i - from)
    if (!(diagonal > 0)) return false
    values[row + i] = Math.sqrt(diagonal)
  }
  return true
}

/**
 * Replaces the matrix by its lower Cholesky factor, in place.
 *
 * @returns false when the matrix is not positive definite (the values are then spoilt)
 */
export function factorise(matrix: SparseMatrix): boolean {
  const { size, fullFrom, values } = matrix
  const column = new Float64Array(size)
  for (let j = 0; j < fullFrom; j++) {
    const diagonal = values[j * size + j]!
    if (!(diagonal > 0)) return false
    values[j * size + j] = Math.sqrt(diagonal)
    eliminate(matrix, j, column)
  }
  return factoriseFull(matrix, fullFrom)
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
