import { normalQuantile } from '#shared/stats/normal'
import type { SplitNormal } from '#shared/stats/hyperposterior'

/** One point of an integration over the log sds, and the log density there of the stand-in that spread it, about 0 at its mode. */
export interface DesignPoint { at: Float64Array, logDensity: number }

/** Root of t^(d+1) = t + 1: the golden ratio in d dimensions. */
function goldenRatio(dimensions: number): number {
  let t = 1.5
  for (let i = 0; i < 60; i++) t = (1 + t) ** (1 / (dimensions + 1))
  return t
}

/**
 * Evenly spread points of the unit cube, the same every time: the additive recurrence on the golden ratio in d dimensions
 * (M. Roberts, 2018), each point followed by its mirror image so that odd errors cancel.
 */
export function evenPoints(count: number, dimensions: number): Float64Array[] {
  const ratio = goldenRatio(dimensions)
  return Array.from({ length: count }, (_, n) => {
    const index = (n >> 1) + 1
    return Float64Array.from({ length: dimensions }, (_, k) => {
      const u = (0.5 + index / ratio ** (k + 1)) % 1
      return n % 2 === 0 ? u : 1 - u
    })
  })
}

/** Points spread by the stand-in density over the log sds. */
export function designPoints(shape: SplitNormal, count: number): DesignPoint[] {
  const size = shape.mode.length
  return evenPoints(count, size).map((cube) => {
    const raw = cube.map(u => normalQuantile(Math.min(Math.max(u, 1e-6), 1 - 1e-6)))
    const at = shape.mode.slice()
    let logDensity = 0
    for (let i = 0; i < size; i++) {
      let z = 0
      for (let j = 0; j <= i; j++) z += shape.factor[i]![j]! * raw[j]!
      const scale = z < 0 ? shape.below[i]! : shape.above[i]!
      at[i]! += scale * z
      logDensity -= 0.5 * raw[i]! ** 2 + Math.log(scale / (0.5 * (shape.below[i]! + shape.above[i]!)))
    }
    return { at, logDensity }
  })
}
