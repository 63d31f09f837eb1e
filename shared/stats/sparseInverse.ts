import { dotRange } from '#shared/stats/dotRange'
import type { SparseMatrix } from '#shared/stats/sparseCholesky'

/**
 * The entries of A^-1 at the places that A's Cholesky factor fills, without forming the rest.
 * Source: K. Takahashi, J. Fagan, M.-S. Chin, Formation of a sparse bus impedance matrix, 1973.
 *
 * @returns values laid out as the factor's, both halves filled; places that it does not fill are 0 and mean nothing
 */
export function inverseWithin(factor: SparseMatrix): Float64Array {
  const { size, columns, fullFrom, values } = factor
  const out = new Float64Array(size * size)
  const column = new Float64Array(size)
  for (let j = size - 1; j >= 0; j--) {
    const rows = columns[j]!
    const diagonal = values[j * size + j]!
    let corner = 1 / diagonal
    for (let a = 0; a < rows.length; a++) column[a] = values[rows[a]! * size + j]!
    for (let a = 0; a < rows.length; a++) {
      const base = rows[a]! * size
      let sum = 0
      if (j >= fullFrom) sum = dotRange(out, base + j + 1, column, 0, rows.length)
      else for (let c = 0; c < rows.length; c++) sum += out[base + rows[c]!]! * column[c]!
      const entry = -sum / diagonal
      out[base + j] = entry
      out[j * size + rows[a]!] = entry
      corner -= entry * column[a]!
    }
    out[j * size + j] = corner / diagonal
  }
  return out
}
