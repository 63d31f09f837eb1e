/**
 * A symmetric positive definite matrix kept row by row from its first entry to the diagonal (its skyline), and its Cholesky
 * factor, which fills exactly the same places. Effects that never meet in a pull and stand in different blocks cost nothing.
 */
export interface Skyline {
  size: number
  /** column of the first kept entry of each row */
  first: Int32Array
  /** where column 0 of the row would stand: entry (i, j) is values[base[i] + j] */
  base: Int32Array
  values: Float64Array
}

/** An empty matrix with the given first columns. @throws RangeError where a row would start past its diagonal */
export function makeSkyline(first: Int32Array): Skyline {
  const size = first.length
  const base = new Int32Array(size)
  let total = 0
  for (let i = 0; i < size; i++) {
    const from = first[i]!
    if (from < 0 || from > i) throw new RangeError(`first column of row ${i} must be between 0 and ${i}, got ${from}`)
    base[i] = total - from
    total += i - from + 1
  }
  return { size, first, base, values: new Float64Array(total) }
}

/**
 * Replaces the matrix by its lower Cholesky factor, in place.
 *
 * @returns false when the matrix is not positive definite (the values are then spoilt)
 */
export function factorise(matrix: Skyline): boolean {
  const { size, first, base, values } = matrix
  for (let i = 0; i < size; i++) {
    const baseI = base[i]!
    const firstI = first[i]!
    for (let j = firstI; j < i; j++) {
      const baseJ = base[j]!
      let sum = values[baseI + j]!
      for (let k = Math.max(firstI, first[j]!); k < j; k++) sum -= values[baseI + k]! * values[baseJ + k]!
      values[baseI + j] = sum === 0 ? 0 : sum / values[baseJ + j]!
    }
    let diagonal = values[baseI + i]!
    for (let k = firstI; k < i; k++) diagonal -= values[baseI + k]! * values[baseI + k]!
    if (!(diagonal > 0)) return false
    values[baseI + i] = Math.sqrt(diagonal)
  }
  return true
}

/** Sum of the logarithms of the first `count` diagonal entries of a factor: half the log determinant of that leading block. */
export function halfLogDeterminant(factor: Skyline, count = factor.size): number {
  let sum = 0
  for (let i = 0; i < count; i++) sum += Math.log(factor.values[factor.base[i]! + i]!)
  return sum
}

/** Solves L y = x in place. */
export function solveForward(factor: Skyline, x: Float64Array): void {
  const { size, first, base, values } = factor
  let from = 0
  while (from < size && x[from] === 0) from++
  for (let i = from; i < size; i++) {
    const baseI = base[i]!
    let sum = x[i]!
    for (let k = Math.max(first[i]!, from); k < i; k++) sum -= values[baseI + k]! * x[k]!
    x[i] = sum / values[baseI + i]!
  }
}

/** Solves L' y = x in place. */
export function solveBackward(factor: Skyline, x: Float64Array): void {
  const { size, first, base, values } = factor
  for (let i = size - 1; i >= 0; i--) {
    const baseI = base[i]!
    const value = x[i]! / values[baseI + i]!
    x[i] = value
    for (let k = first[i]!; k < i; k++) x[k]! -= values[baseI + k]! * value
  }
}

/** Solves A y = x in place, given the Cholesky factor of A. */
export function solve(factor: Skyline, x: Float64Array): void {
  solveForward(factor, x)
  solveBackward(factor, x)
}
