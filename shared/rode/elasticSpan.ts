import { solveRode, type RodeInput } from './catenary'

/** Stiffness EA of the stretching parts, N; a part left out does not stretch. A snubber has its own length, m. */
export interface Stretch { chainN?: number, ropeN?: number, snubber?: { lengthM: number, stiffnessN: number } }

/**
 * Span of a rode with the lift of its chain and the stretch of chain, rope and snubber in series, m.
 *
 * Each part stretches by its mean tension x length / EA and the stretches are added to the span of the rode that does not
 * stretch: within 0.3 % of the span of an elastic line, as far as the reference cases show; its angles are not claimed.
 *
 * @param input the rode, see solveRode
 * @param stretch stiffnesses, N, over 0
 * @throws FieldError as solveRode
 *
 * Source: Hooke's law in series; the approximation, ours.
 */
export function elasticSpan(input: RodeInput, stretch: Stretch): number {
  const shape = solveRode(input)
  const { chainN, ropeN, snubber } = stretch
  const { tensionAnchorN, tensionJoinN, tensionBowN } = shape
  let spanM = shape.spanM
  if (chainN !== undefined) spanM += (tensionAnchorN + tensionJoinN) / 2 * input.chain.lengthM / chainN
  if (ropeN !== undefined) spanM += (tensionJoinN + tensionBowN) / 2 * (input.rope?.lengthM ?? 0) / ropeN
  if (snubber) spanM += tensionBowN * snubber.lengthM / snubber.stiffnessN
  return spanM
}
