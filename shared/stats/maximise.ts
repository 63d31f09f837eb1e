/** Quasi-Newton search for the maximum of a smooth function of a few variables inside a box. */

export interface Box { lower: Float64Array, upper: Float64Array }

export type SmoothFunction = (at: Float64Array) => number
export type Gradient = (at: Float64Array) => Float64Array

const difference = 1e-3
const mostSteps = 200

function clamp(at: Float64Array, box: Box): Float64Array {
  return at.map((value, k) => Math.min(Math.max(value, box.lower[k]!), box.upper[k]!))
}

/** Gradient by central differences. */
export function numericGradient(f: SmoothFunction): Gradient {
  return at => at.map((value, k) => {
    const up = at.slice()
    const down = at.slice()
    up[k] = value + difference
    down[k] = value - difference
    return (f(up) - f(down)) / (2 * difference)
  })
}

/** Gradient with zero along an axis that pushes out of the box where the point stands on its wall. */
function inside(gradient: Gradient, box: Box): Gradient {
  return at => gradient(at).map((slope, k) => {
    const pushesOut = (at[k]! <= box.lower[k]! && slope < 0) || (at[k]! >= box.upper[k]! && slope > 0)
    return pushesOut ? 0 : slope
  })
}

function identity(size: number): Float64Array[] {
  return Array.from({ length: size }, (_, i) => new Float64Array(size).map((_, j) => (i === j ? 1 : 0)))
}

function dot(a: Float64Array, b: Float64Array): number {
  return a.reduce((sum, value, k) => sum + value * b[k]!, 0)
}

/** BFGS update of the inverse Hessian of -f, given step s and change y of the gradient of -f. */
function update(inverse: Float64Array[], s: Float64Array, y: Float64Array): void {
  const sy = dot(s, y)
  if (!(sy > 1e-12 * Math.sqrt(dot(s, s) * dot(y, y)))) return
  const hy = Float64Array.from(inverse, row => dot(row, y))
  const scale = (1 + dot(y, hy) / sy) / sy
  inverse.forEach((row, i) => {
    for (let j = 0; j < row.length; j++) row[j]! += scale * s[i]! * s[j]! - (hy[i]! * s[j]! + s[i]! * hy[j]!) / sy
  })
}

function lineSearch(f: SmoothFunction, at: Float64Array, value: number, direction: Float64Array, slope: number, box: Box) {
  for (let length = 1; length > 1e-6; length /= 2) {
    const next = clamp(at.map((here, k) => here + length * direction[k]!), box)
    const nextValue = f(next)
    if (nextValue >= value + 1e-4 * length * slope) return { next, nextValue }
  }
  return null
}

/** Steps are kept to one unit: the variables are logarithms. */
function shorten(direction: Float64Array): Float64Array {
  const longest = direction.reduce((most, value) => Math.max(most, Math.abs(value)), 0)
  return longest > 1 ? direction.map(value => value / longest) : direction
}

/**
 * The point of the box where f is greatest near the start, by BFGS.
 *
 * @param gradient called only at the point where f was called last
 * @param tolerance greatest slope, per unit of any variable, at which the search stops
 */
export function maximise(f: SmoothFunction, gradient: Gradient, start: Float64Array, box: Box, tolerance = 1e-4) {
  const slopes = inside(gradient, box)
  let at = clamp(start, box)
  let value = f(at)
  let slope = slopes(at)
  let inverse = identity(at.length)
  for (let step = 0; step < mostSteps && slope.some(one => Math.abs(one) > tolerance); step++) {
    let direction = shorten(Float64Array.from(inverse, row => dot(row, slope)))
    if (!(dot(direction, slope) > 0)) {
      inverse = identity(at.length)
      direction = shorten(slope.slice())
    }
    const found = lineSearch(f, at, value, direction, dot(direction, slope), box)
    if (found === null) break
    const next = slopes(found.next)
    update(inverse, found.next.map((here, k) => here - at[k]!), slope.map((one, k) => one - next[k]!))
    at = found.next
    value = found.nextValue
    slope = next
  }
  return { at, value }
}
