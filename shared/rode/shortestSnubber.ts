import type { Rode, ShortestSnubber, Snubber } from '#shared/types/rode'
import { ropeBreakingN } from './breaking'
import { breakingLoad } from './breakingLoad'
import { solveRode, type RodeInput } from './catenary'
import { elasticSpan, type Stretch } from './elasticSpan'
import { energyOn } from './energyPeak'
import { forceCurve } from './forceCurve'
import { giveOf } from './give'
import { ropeStiffnessN } from './stiffness'
import { solverInput } from './weights'

/** A rode without its snubber, the snubber's rope, seabed to bow in m, steady horizontal load in N, energy in J. */
export interface ShortestRequest { rode: Rode, snubber: Snubber, heightM: number, steadyN: number, energyJ: number }

/** Greatest stretch of a snubber in a surge, as a share of its length. Source: common practice, no source. */
const mostStretch = 0.15
/** stands among the parts that may break, for the load at which the snubber stretches too far */
const stretching = 'stretch'
const leastM = 0.1
const mostM = 100

/**
 * Shortest length of a snubber of this rope whose stretch at the peak of the surge stays under 15 %, and with which the
 * peak breaks nothing else.
 *
 * Its stretch is 15 % at one load only, whatever its length: the length is what must take up the energy that the rode
 * leaves when it reaches that load. Without a surge none is suggested. Where the steady load alone reaches it, no length
 * helps.
 *
 * @param request steadyN 0 to 1e9; energyJ 0 to 1e12
 * @returns m, rounded up to the centimetre, 0.1 to 100; null with a note where none helps or is known
 * @throws FieldError as surgePeak
 *
 * Source: energy balance, see energyPeak.ts; ours.
 */
export function shortestSnubber({ rode, snubber, heightM, steadyN, energyJ }: ShortestRequest): ShortestSnubber {
  if (energyJ === 0) return { lengthM: null }
  const breakingN = ropeBreakingN(snubber, 'snubber')
  if (breakingN === null) return { lengthM: null, note: 'The strength of the snubber is unknown: give its breaking strength.' }
  const give = giveOf({ ...rode, snubber })
  if ('why' in give) return { lengthM: null, note: `No length can be suggested: ${give.why}.` }
  const input = solverInput(rode, heightM, 1)
  const stiffnessN = ropeStiffnessN(breakingN)
  const { mostN, part } = breakingLoad(input, [...give.breaking, { part: stretching, breakingN: mostStretch * stiffnessN }])
  if (steadyN >= mostN || mostN < 2) {
    return part === stretching
      ? { lengthM: null, note: 'The steady load alone stretches this snubber by 15 %, so no length helps: use a thicker one.' }
      : { lengthM: null, note: `The steady load alone would break the ${part}, so no snubber helps.` }
  }
  const lengthM = lengthFor(input, give.stretch, stiffnessN, mostN, steadyN, energyJ)
  if (lengthM > mostM) return { lengthM: null, note: `Even ${mostM} m of this snubber stretches too far: use a thicker one.` }
  return { lengthM: lengthM < leastM ? leastM : Math.floor(lengthM * 100 + 1) / 100 }
}

/** Length of snubber that takes up what the rest of the rode leaves of the energy between two loads, m; below 0 for none. */
function lengthFor(
  input: RodeInput, stretch: Stretch, stiffnessN: number, peakN: number, steadyN: number, energyJ: number,
): number {
  const slackM = Math.max(0, input.chain.lengthM + (input.rope?.lengthM ?? 0) - input.heightM)
  const rest: Stretch = { ...stretch }
  delete rest.snubber
  const bowN = (loadN: number) => solveRode({ ...input, horizontalLoadN: loadN }).tensionBowN
  const rode = forceCurve(loadN => elasticSpan({ ...input, horizontalLoadN: loadN }, rest), slackM, peakN)
  const perMetre = forceCurve(loadN => bowN(loadN) / stiffnessN, 0, peakN)
  return (energyJ - energyOn(rode, steadyN, peakN)) / energyOn(perMetre, steadyN, peakN)
}
