import type { SparseMatrix } from '#shared/stats/sparseCholesky'

/**
 * The entries of A^-1 at the places that A's Cholesky factor fills, without forming the rest.
 * Source: K. Takahashi, J. Fagan, M.-S. Chin, Formation of a sparse bus impedance matrix, 1973.
 *
 * @returns values laid out as the factor's; places that it does not fill are 0 and mean nothing
 */
export function inverseWithin(factor: SparseMatrix): Float64Array {
  const { size, columns, values } = factor
  const out = new Float64Array(size * size)
  for (let j = size - 1; j >= 0; j--) {
    const rows = columns[j]!
    const diagonal = values[j * size + j]!
    let corner = 1 / diagonal
    for (let a = 0; a < rows.length; a++) {
      const i = rows[a]!
      let sum = 0
      for (let c = 0; c < rows.length; c++) {
        const k = rows[c]!
        sum += (k > i ? out[k * size + i]! : out[i * size + k]!) * values[k * size + j]!
      }
      const entry = -sum / diagonal
      out[i * size + j] = entry
      corner -= entry * values[i * size + j]!
    }
    out[j * size + j] = corner / diagonal
  }
  return out
}
