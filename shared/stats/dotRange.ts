/**
 * Sum of products of two runs of numbers, in four partial sums, which keeps the processor busy.
 *
 * @param a first array, read from `fromA`
 * @param b second array, read from `fromB`
 * @param count how many
 */
export function dotRange(a: Float64Array, fromA: number, b: Float64Array, fromB: number, count: number): number {
  let s0 = 0
  let s1 = 0
  let s2 = 0
  let s3 = 0
  let k = 0
  for (; k + 3 < count; k += 4) {
    s0 += a[fromA + k]! * b[fromB + k]!
    s1 += a[fromA + k + 1]! * b[fromB + k + 1]!
    s2 += a[fromA + k + 2]! * b[fromB + k + 2]!
    s3 += a[fromA + k + 3]! * b[fromB + k + 3]!
  }
  for (; k < count; k++) s0 += a[fromA + k]! * b[fromB + k]!
  return s0 + s1 + (s2 + s3)
}
