import type { BoatType } from '#shared/types/words'
import type { Point } from '~/utils/drawing/polyline'

/** An outline in metres: x from the bow aft, y up from the waterline. Drawn by ratios of the length, ours. */
export interface BoatOutline { hull: Point[], below: Point[], house: Point[][], rig: Point[][] }

const scaled = (points: readonly Point[], lengthM: number, bowM: number): Point[] =>
  // y above 0 counts in bow heights, below 0 in lengths
  points.map(([x, y]) => [x * lengthM, y > 0 ? y * bowM : y * lengthM])

const topsides: Record<BoatType, Point[]> = {
  sailMonohull: [[0, 1], [0.2, 0.92], [0.45, 0.85], [0.7, 0.82], [0.97, 0.84], [0.93, 0], [0.09, 0], [0.05, 0.35]],
  sailMultihull: [[0, 1], [0.3, 0.97], [0.7, 0.95], [0.9, 0.93], [0.91, 0.5], [0.98, 0.42], [0.99, 0], [0.03, 0]],
  motor: [[0, 1], [0.2, 0.93], [0.42, 0.8], [0.5, 0.62], [0.98, 0.58], [0.98, 0], [0.12, 0], [0.05, 0.5]],
}

const underwater: Record<BoatType, Point[]> = {
  sailMonohull: [[0.09, 0], [0.2, -0.035], [0.36, -0.05], [0.38, -0.16], [0.52, -0.16], [0.56, -0.052], [0.75, -0.04], [0.82, -0.025], [0.83, -0.12], [0.88, -0.12], [0.9, -0.012], [0.93, 0]],
  sailMultihull: [[0.03, 0], [0.1, -0.04], [0.5, -0.05], [0.52, -0.08], [0.66, -0.08], [0.68, -0.048], [0.86, -0.035], [0.87, -0.075], [0.91, -0.075], [0.92, -0.02], [0.99, 0]],
  motor: [[0.12, 0], [0.2, -0.04], [0.5, -0.055], [0.85, -0.06], [0.92, -0.075], [0.98, -0.04], [0.98, 0]],
}

function superstructure(type: BoatType, lengthM: number, bowM: number): Point[][] {
  const at = (x: number, bows: number, lengths: number): Point => [x * lengthM, bows * bowM + lengths * lengthM]
  if (type === 'motor') {
    return [[at(0.24, 0.9, 0), at(0.31, 0.9, 0.055), at(0.35, 0.9, 0.125), at(0.68, 0.9, 0.125), at(0.72, 0.9, 0.11), at(0.72, 0.62, 0)],
      [at(0.335, 0.9, 0.07), at(0.36, 0.9, 0.11), at(0.64, 0.9, 0.11), at(0.64, 0.9, 0.07), at(0.335, 0.9, 0.07)]]
  }
  if (type === 'sailMultihull') {
    return [[at(0.27, 0.97, 0), at(0.36, 0.97, 0.075), at(0.7, 0.97, 0.085), at(0.76, 0.94, 0)],
      [at(0.35, 0.97, 0.03), at(0.39, 0.97, 0.06), at(0.66, 0.97, 0.066), at(0.66, 0.97, 0.03), at(0.35, 0.97, 0.03)]]
  }
  return [[at(0.28, 0.89, 0), at(0.34, 0.9, 0.035), at(0.6, 0.86, 0.05), at(0.66, 0.84, 0)],
    [at(0.6, 0.86, 0.05), at(0.63, 0.86, 0.1), at(0.72, 0.86, 0.1)]]
}

function rig(type: BoatType, lengthM: number, bowM: number): Point[][] {
  const at = (x: number, bows: number, lengths: number): Point => [x * lengthM, bows * bowM + lengths * lengthM]
  if (type === 'motor') return [[at(0.5, 0.9, 0.125), at(0.54, 0.9, 0.26)]]
  const mast = type === 'sailMultihull' ? 0.42 : 0.4
  return [
    [at(mast, 0.88, 0.02), at(mast, 0.88, 1.3)],
    [at(0.015, 1, 0), at(mast, 0.88, 1.28)],
    [at(0.96, 0.84, 0), at(mast, 0.88, 1.3)],
    [at(mast, 0.88, 0.115), at(0.8, 0.88, 0.125)],
    [at(mast + 0.01, 0.88, 0.14), at(0.6, 0.88, 0.165), at(0.79, 0.88, 0.135)],
  ]
}

/**
 * A plain outline of a boat of its type, to its length and bow height.
 *
 * @param type type of boat
 * @param lengthM length overall, m
 * @param bowM height of the bow above the water, m
 */
export function boatOutline(type: BoatType, lengthM: number, bowM: number): BoatOutline {
  return {
    hull: scaled(topsides[type], lengthM, bowM),
    below: scaled(underwater[type], lengthM, bowM),
    house: superstructure(type, lengthM, bowM),
    rig: rig(type, lengthM, bowM),
  }
}
