import type { Rode, Snubber } from '#shared/types/rode'
import { ropeBreakingN } from './breaking'
import { solveRode } from './catenary'
import { ropeStiffnessN } from './stiffness'
import { surgePeak } from './surge'
import { solverInput } from './weights'

/** Shortest length, m, or null; and why, or what to do instead, in words. */
export interface ShortestSnubber { lengthM: number | null, note?: string }

/** A rode without its snubber, the snubber's rope, seabed to bow in m, steady horizontal load in N, energy in J. */
export interface ShortestRequest { rode: Rode, snubber: Snubber, heightM: number, steadyN: number, energyJ: number }

/** Greatest stretch of a snubber in a surge, as a share of its length. Source: common practice, no source. */
const mostStretch = 0.15
const leastM = 0.1
const mostM = 100
const withinM = 0.01

/**
 * Shortest length of a snubber of this rope whose stretch at the peak of the surge stays under 15 %.
 *
 * Without a surge none is suggested. Where the steady load alone reaches 15 %, no length helps. A peak that the rode cannot
 * bound counts as too great.
 *
 * @param request steadyN 0 to 1e9; energyJ 0 to 1e12
 * @returns m, rounded up to the centimetre, 0.1 to 100; null with a note where none is suggested, helps or is known
 * @throws FieldError as surgePeak
 *
 * Source: ours, by halving the length.
 */
export function shortestSnubber({ rode, snubber, heightM, steadyN, energyJ }: ShortestRequest): ShortestSnubber {
  if (energyJ === 0) return { lengthM: null }
  const breakingN = ropeBreakingN(snubber, 'snubber')
  if (breakingN === null) return { lengthM: null, note: 'The strength of the snubber is unknown: give its breaking strength.' }
  const stiffnessN = ropeStiffnessN(breakingN)
  const stretchAt = (loadN: number) =>
    loadN < 1e-6 ? 0 : solveRode(solverInput(rode, heightM, loadN)).tensionBowN / stiffnessN
  if (stretchAt(steadyN) >= mostStretch) {
    return { lengthM: null, note: 'The steady load alone stretches this snubber by 15 %, so no length helps: use a thicker one.' }
  }
  const serves = (lengthM: number) => {
    const peak = surgePeak({ rode: { ...rode, snubber: { ...snubber, lengthM } }, heightM, steadyN, energyJ })
    if (peak.peakN === null) return { known: peak.field === undefined, ok: false }
    return { known: true, ok: stretchAt(peak.peakN) < mostStretch }
  }
  const longest = serves(mostM)
  if (!longest.known) return { lengthM: null, note: 'The stretch of the rode is unknown, so no length can be suggested.' }
  if (!longest.ok) return { lengthM: null, note: `Even ${mostM} m of this snubber stretches too far: use a thicker one.` }
  if (serves(leastM).ok) return { lengthM: leastM }
  let low = leastM
  let high = mostM
  while (high - low > withinM) {
    const middle = (low + high) / 2
    if (serves(middle).ok) high = middle
    else low = middle
  }
  return { lengthM: Math.ceil(high * 100) / 100 }
}
