import { describe, expect, it } from 'vitest'
import { eliminationOrder } from '#shared/stats/eliminationOrder'
import { invert } from '#shared/stats/smallMatrix'
import { factorise, halfLogDeterminant, makeSparse, solve } from '#shared/stats/sparseCholesky'
import { inverseWithin } from '#shared/stats/sparseInverse'
import { randomNumbers } from '../../factories/randomNumbers'

/** Effects of two seabeds that share two designs (6, 7): an arrow. */
const meetings = [[0, 1, 6], [1, 2, 7], [3, 4, 7], [4, 5, 6]]
const size = 8

function example() {
  const random = randomNumbers(4)
  const dense = Array.from({ length: size }, (_, i) => new Float64Array(size).map((_, j) => (i === j ? 6 : 0)))
  const { position, columns } = eliminationOrder(size, meetings, new Array<boolean>(size).fill(false))
  for (const list of meetings) {
    for (const a of list) {
      for (const b of list) {
        const value = random.normal()
        if (a !== b) dense[position[a]!]![position[b]!] = dense[position[b]!]![position[a]!] = value
      }
    }
  }
  const matrix = makeSparse(columns)
  dense.forEach((row, i) => row.forEach((value, j) => {
    if (j <= i) matrix.values[i * size + j] = value
  }))
  return { matrix, dense, columns }
}

describe('a sparse Cholesky factor', () => {
  it('solves as its dense twin does', () => {
    const { matrix, dense } = example()
    const right = Float64Array.from({ length: size }, (_, i) => i - 2.5)
    expect(factorise(matrix)).toBe(true)
    const x = right.slice()
    solve(matrix, x)
    dense.forEach((row, i) => expect(row.reduce((sum, value, j) => sum + value * x[j]!, 0)).toBeCloseTo(right[i]!, 12))
  })

  it('gives the inverse at the places it fills', () => {
    const { matrix, dense, columns } = example()
    factorise(matrix)
    const inverse = inverseWithin(matrix)
    const expected = invert(dense)!
    columns.forEach((rows, j) => [j, ...rows].forEach(i => expect(inverse[i * size + j]).toBeCloseTo(expected[i]![j]!, 13)))
  })

  it('gives log determinants of leading blocks, and says when a matrix is not positive definite', () => {
    const matrix = makeSparse([Int32Array.of(1), new Int32Array(0)])
    matrix.values.set([4, 0, 2, 10])
    expect(factorise(matrix)).toBe(true)
    expect(halfLogDeterminant(matrix)).toBeCloseTo(0.5 * Math.log(36), 14)
    expect(halfLogDeterminant(matrix, 1)).toBeCloseTo(0.5 * Math.log(4), 14)
    matrix.values.set([1, 0, 2, 1])
    expect(factorise(matrix)).toBe(false)
  })

  it('refuses places above the diagonal', () => {
    expect(() => makeSparse([Int32Array.of(0)])).toThrow(/rows of column 0 must be between 1 and 0, got 0/)
  })
})

describe('the order of elimination', () => {
  it('takes a star from its points, so that nothing fills in', () => {
    const star = [[0, 1], [0, 2], [0, 3], [0, 4]]
    const { position, columns } = eliminationOrder(5, star, new Array<boolean>(5).fill(false))
    expect(position[0]).toBeGreaterThanOrEqual(3)
    expect(columns.reduce((sum, rows) => sum + rows.length, 0)).toBe(4)
  })

  it('keeps some for the end', () => {
    const { position } = eliminationOrder(3, [[0, 1], [1, 2]], [true, false, false])
    expect([...position]).toEqual([2, 1, 0])
  })
})
