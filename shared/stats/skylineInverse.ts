import { makeSkyline } from '#shared/stats/skyline'
import type { Skyline } from '#shared/stats/skyline'

/**
 * The entries of A^-1 that lie within A's skyline, from the Cholesky factor of A, without forming the rest.
 * Source: K. Takahashi, J. Fagan, M.-S. Chin, Formation of a sparse bus impedance matrix, 1973.
 *
 * @param columns for each column the rows below it that the factor can fill, rising
 * @returns a matrix with the same skyline that holds the inverse at those places and on the diagonal; other entries are 0 and mean nothing
 */
export function inverseWithin(factor: Skyline, columns: readonly Int32Array[]): Skyline {
  const inverse = makeSkyline(factor.first)
  const { base, values } = factor
  const out = inverse.values
  for (let j = factor.size - 1; j >= 0; j--) {
    const rows = columns[j]!
    const diagonal = values[base[j]! + j]!
    let corner = 1 / diagonal
    for (let a = 0; a < rows.length; a++) {
      const i = rows[a]!
      let sum = 0
      for (let c = 0; c < rows.length; c++) {
        const k = rows[c]!
        sum += (k > i ? out[base[k]! + i]! : out[base[i]! + k]!) * values[base[k]! + j]!
      }
      const entry = -sum / diagonal
      out[base[i]! + j] = entry
      corner -= entry * values[base[i]! + j]!
    }
    out[base[j]! + j] = corner / diagonal
  }
  return inverse
}
