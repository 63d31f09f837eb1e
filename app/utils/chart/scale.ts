import { scaleLinear, scaleLog } from 'd3-scale'
import { roundValues } from '~/utils/scale'

/** An axis in per cent of the plot's length, so that one drawing serves every width. */
export interface ChartScale {
  kind: 'log' | 'linear'
  low: number
  high: number
  /** Position in per cent, rounded to a hundredth; what lies outside stands at the ends. */
  at: (value: number) => number
  /** True where a value lies outside and was moved to an end. */
  outside: (value: number) => boolean
  ticks: readonly number[]
}

/** A round value of an axis, without the tail that binary fractions leave. */
export const tickText = (value: number): string => String(Number(value.toPrecision(6)))

const rounded = (position: number) => Math.round(position * 100) / 100

/** A linear axis from 0 (or a lower value) to a round end. */
export function linearScale(low: number, high: number, most = 6): ChartScale {
  const scale = scaleLinear([low, high > low ? high : low + 1], [0, 100]).nice(most).clamp(true)
  const [start = low, end = high] = scale.domain()
  return { kind: 'linear', low: start, high: end, at: value => rounded(scale(value)), outside: value => value < start || value > end, ticks: scale.ticks(most) }
}

/** A logarithmic axis that reaches a little past both ends, with ticks at 1, 2 and 5 times a power of ten. */
export function logarithmicScale(low: number, high: number, most = 7): ChartScale {
  const [start, end] = [low / 1.08, high * 1.08]
  const scale = scaleLog([start, end], [0, 100]).clamp(true)
  const ticks = roundValues(start, end, most)
  return {
    kind: 'log', low: start, high: end,
    at: value => value > 0 ? rounded(scale(value)) : 0,
    outside: value => value < start || value > end,
    ticks: ticks.length >= 2 ? ticks : scaleLinear([start, end], [0, 1]).ticks(4),
  }
}

/**
 * The axis that suits some values: logarithmic where the middle ones span more than threefold and none that must be seen is 0, else linear from 0.
 *
 * @param values what has to lie inside; numbers that are not finite are left out
 */
export function suitableScale(values: readonly number[], most = 7): ChartScale {
  const finite = values.filter(Number.isFinite)
  const positive = finite.filter(value => value > 0)
  if (positive.length === 0) return linearScale(0, 1)
  const [low, high] = [Math.min(...positive), Math.max(...positive)]
  return high / low > 3 ? logarithmicScale(low, high, most) : linearScale(0, high * 1.04, most)
}
