/** Dense matrices of a few rows, as arrays of rows. */

/**
 * Lower Cholesky factor of a small symmetric matrix, or null when it is not positive definite.
 */
export function cholesky(matrix: readonly Float64Array[]): Float64Array[] | null {
  const factor = matrix.map(row => row.slice())
  for (let i = 0; i < factor.length; i++) {
    const rowI = factor[i]!
    for (let j = 0; j <= i; j++) {
      const rowJ = factor[j]!
      let sum = matrix[i]![j]!
      for (let k = 0; k < j; k++) sum -= rowI[k]! * rowJ[k]!
      if (i > j) {
        rowI[j] = sum / rowJ[j]!
      }
      else {
        if (!(sum > 0)) return null
        rowI[i] = Math.sqrt(sum)
      }
    }
    rowI.fill(0, i + 1)
  }
  return factor
}

/** Inverse of a small symmetric positive definite matrix, or null when it is not positive definite. */
export function invert(matrix: readonly Float64Array[]): Float64Array[] | null {
  const factor = cholesky(matrix)
  if (factor === null) return null
  return matrix.map((_, column) => {
    const x = new Float64Array(matrix.length)
    x[column] = 1
    for (let i = 0; i < x.length; i++) {
      for (let k = 0; k < i; k++) x[i]! -= factor[i]![k]! * x[k]!
      x[i]! /= factor[i]![i]!
    }
    for (let i = x.length - 1; i >= 0; i--) {
      for (let k = i + 1; k < x.length; k++) x[i]! -= factor[k]![i]! * x[k]!
      x[i]! /= factor[i]![i]!
    }
    return x
  })
}
