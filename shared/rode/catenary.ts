import { FieldError, mustBeWithin } from '#shared/utils/fieldError'
import type { RodeRegime } from '#shared/types/rode'
import { clearSlope, spareLength, type ScaledRode } from './clear'
import { liftedChain, liftedLength } from './grounded'
import { riseOver, spanOver } from './segment'

/** A uniform part of the rode: length in m (0 or more), submerged weight in N per metre (0 or more). */
export interface RodePart { lengthM: number, weightNPerM: number }

/** Chain at the anchor, rope (if any) above it; height from the seabed to the bow in m, horizontal load in N. */
export interface RodeInput { heightM: number, horizontalLoadN: number, chain: RodePart, rope?: RodePart }

/** How the rode lies. Forces in N, lengths in m, angles in rad above the horizontal. */
export interface RodeShape {
  /** part on the bottom; the whole just lifted; or clear of the bottom with the shank pulled upward */
  regime: RodeRegime
  shankAngleRad: number
  groundedChainM: number
  groundedRopeM: number
  spanM: number
  tensionAnchorN: number
  /** where chain meets rope; at the bow for a rode of chain alone */
  tensionJoinN: number
  tensionBowN: number
  verticalAnchorN: number
  verticalJoinN: number
  verticalBowN: number
  bowAngleRad: number
}

const none: RodePart = { lengthM: 0, weightNPerM: 0 }

/**
 * Shape of a rode on a flat bottom under a horizontal load: where it lifts, how it pulls at shank and bow.
 *
 * Inextensible, no friction on the bottom, no current on the rode. Holds 1e-9 relative against its own equations.
 *
 * @param input heightM 1e-6 to 10 000; horizontalLoadN 1e-6 to 1e9; lengths 0 to 1 000 000; weights 0 to 100 000
 * @throws FieldError (a RangeError) naming the field outside these, and for a rode no longer than the height:
 *   "too short to reach the bottom"
 *
 * Source: the catenary of a uniform line and of two joined ones, any text of statics; weightless rope is straight.
 */
export function solveRode(input: RodeInput): RodeShape {
  checkRode(input)
  const { heightM, horizontalLoadN, chain } = input
  const rope = input.rope ?? none
  const scaled: ScaledRode = {
    heightM,
    chainM: chain.lengthM,
    chainPull: chain.weightNPerM * chain.lengthM / horizontalLoadN,
    ropeM: rope.lengthM,
    ropePull: rope.weightNPerM * rope.lengthM / horizontalLoadN,
  }
  const whole = scaled.chainPull + scaled.ropePull
  const flatRiseM = riseOver(scaled.chainM, 0, scaled.chainPull) + riseOver(scaled.ropeM, scaled.chainPull, whole)
  const { chainM, ropeM } = scaled
  if (Math.abs(flatRiseM - heightM) <= 1e-12 * heightM) return shapeOf('lifting', horizontalLoadN, scaled, 0, chainM, ropeM)
  if (flatRiseM < heightM) return shapeOf('clear', horizontalLoadN, scaled, clearSlope(scaled), chainM, ropeM)
  if (riseOver(ropeM, 0, scaled.ropePull) >= heightM) {
    const hangingM = Math.min(ropeM, liftedLength(heightM, horizontalLoadN / rope.weightNPerM))
    return shapeOf('grounded', horizontalLoadN, scaled, 0, 0, hangingM)
  }
  const hangingM = liftedChain(scaled, horizontalLoadN / chain.weightNPerM)
  return shapeOf('grounded', horizontalLoadN, scaled, 0, hangingM, ropeM)
}

/** The shape from its slope at the shank and the lengths of chain and rope that hang, m: short ones keep their digits. */
function shapeOf(
  regime: RodeRegime, loadN: number, rode: ScaledRode, slope: number, chainM: number, ropeM: number,
): RodeShape {
  const groundedChainM = rode.chainM - chainM
  const groundedRopeM = rode.ropeM - ropeM
  const join = slope + (chainM > 0 ? rode.chainPull * (chainM / rode.chainM) : 0)
  const bow = join + (ropeM > 0 ? rode.ropePull * (ropeM / rode.ropeM) : 0)
  return {
    regime,
    shankAngleRad: Math.atan(slope),
    groundedChainM,
    groundedRopeM,
    spanM: groundedChainM + groundedRopeM + spanOver(chainM, slope, join) + spanOver(ropeM, join, bow),
    tensionAnchorN: loadN * Math.sqrt(1 + slope * slope),
    tensionJoinN: loadN * Math.sqrt(1 + join * join),
    tensionBowN: loadN * Math.sqrt(1 + bow * bow),
    verticalAnchorN: loadN * slope,
    verticalJoinN: loadN * join,
    verticalBowN: loadN * bow,
    bowAngleRad: Math.atan(bow),
  }
}

function checkRode({ heightM, horizontalLoadN, chain, rope }: RodeInput): void {
  mustBeWithin('heightM', heightM, 1e-6, 1e4)
  mustBeWithin('horizontalLoadN', horizontalLoadN, 1e-6, 1e9)
  mustBeWithin('chain.lengthM', chain.lengthM, 0, 1e6)
  mustBeWithin('chain.submergedWeightNPerM', chain.weightNPerM, 0, 1e5)
  if (rope) {
    mustBeWithin('rope.lengthM', rope.lengthM, 0, 1e6)
    mustBeWithin('rope.submergedWeightNPerM', rope.weightNPerM, 0, 1e5)
  }
  const ropeM = rope?.lengthM ?? 0
  if (spareLength(heightM, chain.lengthM, ropeM) <= 0) {
    const lengthM = chain.lengthM + ropeM
    const field = rope ? 'rope.lengthM' : 'chain.lengthM'
    throw new FieldError(field, `too short to reach the bottom: ${lengthM} m of rode, the height is ${heightM} m`)
  }
}
