import { riseGain, riseOver, shortfallOver } from './segment'

/** Chain then rope in the horizontal load's own measure: lengths in m, weights as (w L) / H, no unit. */
export interface ScaledRode {
  heightM: number
  chainM: number
  chainPull: number
  ropeM: number
  ropePull: number
}

/** What a rode is longer than its height, m: exact however little it is, since the longer part is over half the height. */
export function spareLength(heightM: number, chainM: number, ropeM: number): number {
  return Math.max(chainM, ropeM) - heightM + Math.min(chainM, ropeM)
}

/**
 * Slope of the rode at the shank (vertical over horizontal force) when no part of it lies on the bottom.
 *
 * The slope lies between the chord's and the chord's less the rode's own weight over the load, which brackets it; Newton
 * inside the bracket, halving where a step would leave it. Below half of the rode's length the height itself is met,
 * above it what the height is short of the length, so that neither a slack nor a taut rode loses digits.
 *
 * @param rode with chainM + ropeM > heightM, and too short to leave anything on the bottom
 * @returns slope, no unit, 0 or more
 *
 * Source: force and height continuous at the join of chain and rope; the search is ours.
 */
export function clearSlope(rode: ScaledRode): number {
  const { heightM, chainM, chainPull, ropeM, ropePull } = rode
  const spareM = spareLength(heightM, chainM, ropeM)
  const chord = heightM / Math.sqrt(spareM * (chainM + ropeM + heightM))
  let low = Math.max(0, chord - chainPull - ropePull)
  let high = chord
  let slope = low
  for (let round = 0; round < 200 && high - low > 1e-15 * high; round += 1) {
    const step = heightM < spareM ? heightStep(rode, slope) : shortfallStep(rode, slope, spareM)
    if (step > 0) low = slope
    else high = slope
    const next = slope + step
    const stays = next >= low && next <= high
    if (stays && Math.abs(step) <= 1e-9 * slope + 1e-16) return next
    slope = stays ? next : (low + high) / 2
  }
  return slope
}

function gain(rode: ScaledRode, slope: number): number {
  const join = slope + rode.chainPull
  return riseGain(rode.chainM, slope, join) + riseGain(rode.ropeM, join, join + rode.ropePull)
}

function heightStep(rode: ScaledRode, slope: number): number {
  const join = slope + rode.chainPull
  const riseM = riseOver(rode.chainM, slope, join) + riseOver(rode.ropeM, join, join + rode.ropePull)
  return (rode.heightM - riseM) / gain(rode, slope)
}

/** Newton on shortfall^(-1/2), which is almost straight where the rode hangs almost straight. */
function shortfallStep(rode: ScaledRode, slope: number, spareM: number): number {
  const join = slope + rode.chainPull
  const shortM = shortfallOver(rode.chainM, slope, join) + shortfallOver(rode.ropeM, join, join + rode.ropePull)
  return 2 * shortM * (Math.sqrt(shortM / spareM) - 1) / gain(rode, slope)
}
