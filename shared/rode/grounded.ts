import { riseGain, riseOver } from './segment'
import type { ScaledRode } from './clear'

/**
 * Length of a uniform line that hangs between the bottom, where it lies flat, and a height above it, m.
 *
 * s = sqrt(h^2 + 2 h a), a = H / w.
 *
 * @param heightM height above the bottom, m, over 0
 * @param scaleM a, horizontal load over weight per metre, m, over 0
 */
export function liftedLength(heightM: number, scaleM: number): number {
  return Math.sqrt(heightM * (heightM + 2 * scaleM))
}

/**
 * Chain lifted off the bottom, m, when part of it still lies there and all of the rope is clear.
 *
 * Bracketed between none and what chain alone would lift (the rope only helps); Newton inside, halving where it leaves.
 *
 * @param rode whose rope alone, tangent to the bottom, would not reach the height, and whose whole length would pass it
 * @param scaleM the chain's a, m
 *
 * Source: the catenary with force and height continuous at the join; the search is ours.
 */
export function liftedChain(rode: ScaledRode, scaleM: number): number {
  const { heightM, chainM, ropeM, ropePull } = rode
  const aloneM = Math.min(chainM, liftedLength(heightM, scaleM))
  if (ropeM === 0) return aloneM
  let low = 0
  let high = aloneM / scaleM
  let pull = high
  for (let round = 0; round < 200 && high - low > 1e-15 * high; round += 1) {
    const riseM = riseOver(pull * scaleM, 0, pull) + riseOver(ropeM, pull, pull + ropePull)
    const gainM = scaleM * pull / Math.sqrt(1 + pull * pull) + riseGain(ropeM, pull, pull + ropePull)
    const step = (heightM - riseM) / gainM
    if (step > 0) low = pull
    else high = pull
    const next = pull + step
    const stays = next >= low && next <= high
    if (stays && Math.abs(step) <= 1e-9 * pull) return next * scaleM
    pull = stays ? next : (low + high) / 2
  }
  return pull * scaleM
}
