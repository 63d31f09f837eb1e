import { mustBeWithin } from '#shared/utils/fieldError'
import { riseOver } from './segment'
import type { RodeInput } from './catenary'

/**
 * Least length of rode, m, that keeps the pull at the shank at or below an angle.
 *
 * A rode of chain alone adds or sheds chain: L = h (T0 + T1) / (V0 + V1), which is sqrt(h^2 + 2 h a) for a flat pull.
 * A rode with rope keeps its chain and adds or sheds rope; where its chain alone is enough, that is the answer.
 *
 * @param input the rode; the length of its last part is not read
 * @param angleRad greatest angle at the shank, rad, 0 to 1.5
 * @returns chain plus rope, m; null where no length gives that angle (a weightless rode is never flat)
 * @throws FieldError outside the allowed interval
 *
 * Source: the catenary; which part is lengthened is ours.
 */
export function leastLength(input: RodeInput, angleRad: number): number | null {
  mustBeWithin('angleRad', angleRad, 0, 1.5)
  mustBeWithin('heightM', input.heightM, 1e-6, 1e4)
  mustBeWithin('horizontalLoadN', input.horizontalLoadN, 1e-6, 1e9)
  const { heightM, horizontalLoadN, chain, rope } = input
  const slope = Math.tan(angleRad)
  if (!rope) return lengthFor(heightM, slope, chain.weightNPerM / horizontalLoadN)
  const join = slope + chain.weightNPerM * chain.lengthM / horizontalLoadN
  const leftM = heightM - riseOver(chain.lengthM, slope, join)
  if (leftM <= 0) return chain.lengthM
  const ropeM = lengthFor(leftM, join, rope.weightNPerM / horizontalLoadN)
  return ropeM === null ? null : chain.lengthM + ropeM
}

/** Length that rises by a height from a slope at its foot; weight per metre over the horizontal load, 1/m. */
function lengthFor(riseM: number, foot: number, pullPerM: number): number | null {
  const low = Math.sqrt(1 + foot * foot)
  const high = low + pullPerM * riseM
  const top = Math.sqrt(foot * foot + pullPerM * riseM * (low + high))
  return top === 0 ? null : riseM * (low + high) / (foot + top)
}
