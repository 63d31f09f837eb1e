export type Point = readonly [x: number, y: number]

/** Path data through points, in drawing units, to a tenth of a unit. */
export const pathThrough = (points: readonly Point[]): string =>
  points.map(([x, y], index) => `${index === 0 ? 'M' : 'L'}${x.toFixed(1)} ${y.toFixed(1)}`).join('')

/** Length of a polyline in its own units. */
export function lengthOf(points: readonly Point[]): number {
  let length = 0
  for (let index = 1; index < points.length; index++) {
    const [from, to] = [points[index - 1], points[index]]
    if (from && to) length += Math.hypot(to[0] - from[0], to[1] - from[1])
  }
  return length
}

/**
 * Cuts a polyline at a distance along it; both halves share the cut point.
 *
 * @param distance along the line from its first point, same unit as the points; outside the line one half is empty
 */
export function splitAt(points: readonly Point[], distance: number): [Point[], Point[]] {
  if (distance <= 0) return [[], [...points]]
  let travelled = 0
  for (let index = 1; index < points.length; index++) {
    const [from, to] = [points[index - 1], points[index]]
    if (!from || !to) break
    const step = Math.hypot(to[0] - from[0], to[1] - from[1])
    if (travelled + step >= distance && step > 0) {
      const share = (distance - travelled) / step
      const cut: Point = [from[0] + (to[0] - from[0]) * share, from[1] + (to[1] - from[1]) * share]
      return [[...points.slice(0, index), cut], [cut, ...points.slice(index)]]
    }
    travelled += step
  }
  return [[...points], []]
}

/** The same line as a fixed number of points at equal distances along it, so that one drawing can turn smoothly into the next. */
export function resample(points: readonly Point[], count: number): Point[] {
  const [first, last] = [points[0], points[points.length - 1]]
  if (!first || !last || points.length < 2) return [...points]
  const step = lengthOf(points) / (count - 1)
  const inner: Point[] = []
  let travelled = 0
  for (let index = 1; index < points.length; index++) {
    const [from, to] = [points[index - 1], points[index]]
    if (!from || !to) break
    const piece = Math.hypot(to[0] - from[0], to[1] - from[1])
    while (inner.length < count - 2 && travelled + piece >= step * (inner.length + 1) && piece > 0) {
      const share = (step * (inner.length + 1) - travelled) / piece
      inner.push([from[0] + (to[0] - from[0]) * share, from[1] + (to[1] - from[1]) * share])
    }
    travelled += piece
  }
  return [first, ...inner, last]
}
