import { DEG_RAD } from '#shared/units/constants'
import { mustBeWithin } from '#shared/utils/fieldError'
import type { RodeAnswer, RodeRequest } from '#shared/types/rode'
import { solveRode } from './catenary'
import { rodeCurve } from './curve'
import { scopeOf } from './height'
import { leastLength } from './leastLength'
import { strengthOf } from './strength'
import { upliftFactor } from './uplift'
import { solverInput } from './weights'

/**
 * The whole answer about a rode: how it lies, how it pulls on the shank, how long it would have to be, and what it bears.
 *
 * @param request rode, height from seabed to bow in m, horizontal load in N (see the request's own type for ranges)
 * @returns angles in degrees, lengths in m, forces in N
 * @throws FieldError (a RangeError) naming the field: a size, weight or strength missing or out of range, or a rode that is
 *   "too short to reach the bottom"
 *
 * Source: see catenary.ts, leastLength.ts, uplift.ts and strength.ts.
 */
export function answerRode(request: RodeRequest): RodeAnswer {
  if (request.snubber) mustBeWithin('snubber.lengthM', request.snubber.lengthM, 0, 1000)
  const input = solverInput(request, request.heightM, request.horizontalLoadN)
  const shape = solveRode(input)
  const strength = strengthOf(request, shape)
  return {
    regime: shape.regime,
    shankAngleDeg: shape.shankAngleRad / DEG_RAD,
    groundedChainM: shape.groundedChainM,
    groundedRopeM: shape.groundedRopeM,
    spanM: shape.spanM,
    tensionBowN: shape.tensionBowN,
    tensionAnchorN: shape.tensionAnchorN,
    verticalAnchorN: shape.verticalAnchorN,
    scope: scopeOf(input.chain.lengthM + (input.rope?.lengthM ?? 0), request.heightM),
    leastLengthZeroAngleM: leastLength(input, 0),
    leastLength8DegM: leastLength(input, 8 * DEG_RAD),
    upliftFactor: upliftFactor(shape.shankAngleRad),
    curve: rodeCurve(input, shape),
    strength: strength.parts,
    weakest: strength.weakest,
  }
}
