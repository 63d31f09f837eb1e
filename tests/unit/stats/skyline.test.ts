import { describe, expect, it } from 'vitest'
import { factorise, halfLogDeterminant, makeSkyline, solve } from '#shared/stats/skyline'
import { inverseWithin } from '#shared/stats/skylineInverse'
import { invert } from '#shared/stats/smallMatrix'
import { randomNumbers } from '../../factories/randomNumbers'

/** Two blocks of three and a border of two: the arrow that seabeds and designs make. */
const first = Int32Array.from([0, 0, 0, 3, 3, 3, 0, 0])

function arrow() {
  const random = randomNumbers(4)
  const matrix = makeSkyline(first)
  const dense = Array.from(first, () => new Float64Array(first.length))
  first.forEach((from, i) => {
    for (let j = from; j <= i; j++) {
      const value = i === j ? 6 : random.normal()
      matrix.values[matrix.base[i]! + j] = value
      dense[i]![j] = value
      dense[j]![i] = value
    }
  })
  return { matrix, dense }
}

/** Rows below each column that the factor can fill. */
const columns = Array.from(first, (_, j) => Int32Array.from(first.keys()).filter(i => i > j && first[i]! <= j))

describe('a skyline matrix', () => {
  it('solves as its dense twin does', () => {
    const { matrix, dense } = arrow()
    const right = Float64Array.from(first, (_, i) => i - 2.5)
    expect(factorise(matrix)).toBe(true)
    const x = right.slice()
    solve(matrix, x)
    dense.forEach((row, i) => expect(row.reduce((sum, value, j) => sum + value * x[j]!, 0)).toBeCloseTo(right[i]!, 12))
  })

  it('gives the inverse within the skyline', () => {
    const { matrix, dense } = arrow()
    factorise(matrix)
    const inverse = inverseWithin(matrix, columns)
    const expected = invert(dense)!
    first.forEach((from, i) => {
      for (let j = from; j <= i; j++) expect(inverse.values[inverse.base[i]! + j]).toBeCloseTo(expected[i]![j]!, 13)
    })
  })

  it('gives log determinants of leading blocks', () => {
    const matrix = makeSkyline(Int32Array.from([0, 0]))
    matrix.values.set([4, 2, 10])
    factorise(matrix)
    expect(halfLogDeterminant(matrix)).toBeCloseTo(0.5 * Math.log(36), 14)
    expect(halfLogDeterminant(matrix, 1)).toBeCloseTo(0.5 * Math.log(4), 14)
  })

  it('says when a matrix is not positive definite', () => {
    const matrix = makeSkyline(Int32Array.from([0, 0]))
    matrix.values.set([1, 2, 1])
    expect(factorise(matrix)).toBe(false)
  })

  it('refuses a row that starts past its diagonal', () => {
    expect(() => makeSkyline(Int32Array.from([0, 2]))).toThrow(/first column of row 1 must be between 0 and 1, got 2/)
  })
})
